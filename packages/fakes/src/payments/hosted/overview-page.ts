import type { Response } from 'express';
import type { Stripe } from 'stripe';
import { html, type Html } from '../../pages/html.ts';
import { asAccount } from '../accounts.ts';
import { balanceOf } from '../balances.ts';
import { idOf } from '../ids.ts';
import type { Kind, Row } from '../kinds.ts';
import type { Work } from '../work.ts';
import { moneyText, sendProcessorPage, timeText } from './shell.ts';

type Cell = string | Html | null;

interface TableInput {
  title: string;
  columns: string[];
  rows: Cell[][];
  empty: string;
}

const SHOWN = 50;

/** A plain table that scrolls sideways by itself; columns called Amount, Available or Pending hold figures. */
function table({ title, columns, rows, empty }: TableInput): Html {
  const isFigure = (column: string) => ['Amount', 'Available', 'Pending', 'Fee'].includes(column);
  if (rows.length === 0)
    return html`<h2>${title}</h2>
      <p class="quiet">${empty}</p>`;
  return html`<h2>${title}</h2>
    <div class="scroll" tabindex="0" role="region" aria-label="${title}">
      <table>
        <thead>
          <tr>
            ${columns.map((column) => html`<th scope="col" ${isFigure(column) && html`class="num"`}>${column}</th>`)}
          </tr>
        </thead>
        <tbody>
          ${rows.map(
            (row) =>
              html`<tr>
                ${row.map((cell, index) => html`<td ${isFigure(columns[index] ?? '') && html`class="num"`}>${cell}</td>`)}
              </tr>`,
          )}
        </tbody>
      </table>
    </div>`;
}

function newest<K extends Kind>(work: Work, kind: K): Row<K>[] {
  return work.store.all(kind).slice(-SHOWN).toReversed();
}

/** A button that does one thing to the processor's world. Addresses are relative, so they survive a path prefix. */
function button(label: string, address: string, result?: string): Html {
  return html`<form class="inline" method="post" action="_control/${address}">
    <button class="small" ${result && html`name="result" value="${result}"`}>${label}</button>
  </form>`;
}

const code = (id: string | null): Html => html`<code>${id ?? '–'}</code>`;

function accountName(work: Work, id: string | null): Html {
  if (!id) return html`The market`;
  const account = work.store.find('account', id);
  return html`${account?.business_profile?.name ?? account?.email ?? ''} <code>${id}</code>`;
}

function balances(work: Work): Html {
  const owners = [null, ...work.store.all('account').map(({ id }) => id)];
  const rows = owners.flatMap((owner) => {
    const sums = [...balanceOf(owner ? asAccount(work, owner) : work)];
    const account = owner ? work.store.find('account', owner) : undefined;
    const state = !account ? '' : account.payouts_enabled ? 'may be paid' : 'set-up not complete';
    const name = html`<span ${owner && html`id="${owner}"`}>${accountName(work, owner)}</span>`;
    if (sums.length === 0) return [[name, state, '–', '–']];
    return sums.map(([currency, sum]) => [
      name,
      state,
      moneyText(sum.availableMinor, currency),
      moneyText(sum.pendingMinor, currency),
    ]);
  });
  return table({ title: 'Balances', columns: ['Account', 'State', 'Available', 'Pending'], rows, empty: '' });
}

function chargeButtons(charge: Stripe.Charge): Html | string {
  if (charge.status === 'pending') {
    const intent = idOf(charge.payment_intent);
    return html`${button('Settle the debit', `payment_intents/${intent}/settle`)}${button('Fail it', `payment_intents/${intent}/fail`)}`;
  }
  return charge.status === 'succeeded' && !charge.disputed
    ? button('Open a dispute', `charges/${charge.id}/dispute`)
    : '';
}

function charges(work: Work): Html {
  const rows = newest(work, 'charge').flatMap(({ value, owner }) => {
    if (owner) return [];
    const refunded = value.amount_refunded > 0 ? `, ${moneyText(value.amount_refunded, value.currency)} refunded` : '';
    const state = `${value.status}${value.failure_code ? ` (${value.failure_code})` : ''}${refunded}${value.disputed ? ', disputed' : ''}`;
    const amount = moneyText(value.amount, value.currency);
    return [
      [timeText(value.created), code(value.id), value.transfer_group ?? '–', amount, state, chargeButtons(value)],
    ];
  });
  const columns = ['Time', 'Charge', 'Group', 'Amount', 'State', 'Do'];
  return table({ title: 'Charges', columns, rows, empty: 'No charge yet.' });
}

function transfers(work: Work): Html {
  const rows = newest(work, 'transfer').map(({ value }) => [
    timeText(value.created),
    code(value.id),
    accountName(work, idOf(value.destination)),
    value.transfer_group ?? '–',
    moneyText(value.amount, value.currency),
    value.amount_reversed > 0 ? `${moneyText(value.amount_reversed, value.currency)} reversed` : 'sent',
  ]);
  const columns = ['Time', 'Transfer', 'To', 'Group', 'Amount', 'State'];
  return table({ title: 'Transfers', columns, rows, empty: 'No transfer yet.' });
}

function refunds(work: Work): Html {
  const rows = newest(work, 'refund').map(({ value }) => [
    timeText(value.created),
    code(value.id),
    code(idOf(value.charge)),
    moneyText(value.amount, value.currency),
    value.status ?? '',
  ]);
  return table({
    title: 'Refunds',
    columns: ['Time', 'Refund', 'Charge', 'Amount', 'State'],
    rows,
    empty: 'No refund yet.',
  });
}

function payouts(work: Work): Html {
  const rows = newest(work, 'payout').map(({ value, owner }) => [
    timeText(value.created),
    code(value.id),
    accountName(work, owner),
    moneyText(value.amount, value.currency),
    `${value.status}${value.failure_code ? ` (${value.failure_code})` : ''}`,
    value.status === 'in_transit' || value.status === 'paid' ? button('Send it back', `payouts/${value.id}/fail`) : '',
  ]);
  const columns = ['Time', 'Payout', 'From the balance of', 'Amount', 'State', 'Do'];
  return table({ title: 'Payouts to banks', columns, rows, empty: 'No payout yet.' });
}

function disputes(work: Work): Html {
  const rows = newest(work, 'dispute').map(({ value }) => {
    const isOpen = !['won', 'lost', 'warning_closed'].includes(value.status);
    const address = `disputes/${value.id}/close`;
    const buttons = html`${button('Market wins', address, 'won')}${button('Market loses', address, 'lost')}`;
    const amount = moneyText(value.amount, value.currency);
    return [
      timeText(value.created),
      code(value.id),
      code(idOf(value.charge)),
      amount,
      value.status,
      isOpen ? buttons : '',
    ];
  });
  const columns = ['Time', 'Dispute', 'Charge', 'Amount', 'State', 'Do'];
  return table({ title: 'Disputes', columns, rows, empty: 'No dispute.' });
}

function undelivered(work: Work): Html {
  const open = work.store.all('delivery').filter(({ value }) => value.state !== 'delivered');
  const rows = open
    .slice(-SHOWN)
    .map(({ value }) => [
      work.store.find('event', value.event)?.type ?? '',
      work.store.find('webhook_endpoint', value.endpoint)?.url ?? '',
      value.state,
      `${value.attempts} tries${value.lastAnswer ? `, last: ${value.lastAnswer}` : ''}`,
    ]);
  return table({
    title: 'Events not delivered',
    columns: ['Event', 'To', 'State', 'Tries'],
    rows,
    empty: 'All events were taken.',
  });
}

/** Everything the processor holds, in plain tables: who has what, who paid, who was paid. */
export function sendOverview(res: Response, work: Work): void {
  const body = html` <h1>What the processor holds</h1>
    <p class="quiet">
      By its own clock it is ${timeText(work.nowS)}. The newest ${SHOWN} of each kind are shown.
      <a href="">Read again</a>
    </p>
    ${balances(work)}${payouts(work)}${transfers(work)}${charges(work)}${refunds(work)}${disputes(work)}${undelivered(work)}`;
  sendProcessorPage(res, { title: 'What the processor holds', body, wide: true });
}
