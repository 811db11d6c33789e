import type { Stripe } from 'stripe';
import { availableMinor, post } from '../balances.ts';
import { availableOnS, blankCharge } from '../charges.ts';
import { missing, refused } from '../errors.ts';
import { emit } from '../events.ts';
import { idOf, newId } from '../ids.ts';
import { listPage } from '../listing.ts';
import { amount, currency, ignored, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { mustFind, schedule, type Work } from '../work.ts';
import { mergeMetadata } from '../metadata.ts';

const createInput = {
  amount: amount(),
  currency: currency(),
  destination: text(),
  description: text().optional(),
  metadata: metadata().optional(),
  source_transaction: text().optional(),
  transfer_group: text().optional(),
  ...ignored('source_type'),
};

const create = route('POST', '/transfers', createInput, (work, params) => {
  const account = work.store.find('account', params.destination);
  if (!account) throw missing('destination', params.destination, 'destination');
  if (account.capabilities?.transfers !== 'active') {
    const message = 'Your destination account needs to have the transfers capability enabled.';
    throw refused('insufficient_capabilities_for_transfer', message, { param: 'destination' });
  }
  const source = params.source_transaction ? sourceCharge(work, params.source_transaction, params) : null;
  if (!source && availableMinor(work, params.currency) < params.amount) {
    const message =
      'You have insufficient available funds in your balance. Name a source_transaction to use pending funds.';
    throw refused('balance_insufficient', message);
  }
  const transfer: Stripe.Transfer = {
    id: newId('tr'),
    object: 'transfer',
    amount: params.amount,
    amount_reversed: 0,
    balance_transaction: null,
    created: work.nowS,
    currency: params.currency,
    description: params.description ?? null,
    destination: params.destination,
    livemode: false,
    metadata: params.metadata ?? {},
    reversals: { object: 'list', data: [], has_more: false, url: '' },
    reversed: false,
    source_transaction: source?.id ?? null,
    source_type: 'card',
    transfer_group: params.transfer_group ?? source?.transfer_group ?? (source ? `group_${source.id}` : null),
  };
  transfer.reversals.url = `/v1/transfers/${transfer.id}/reversals`;
  return send(work, transfer, source ? availableOnS(work, source) : work.nowS);
});

/** The charge a transfer draws on; refuses one that did not succeed or would be overdrawn. */
function sourceCharge(work: Work, id: string, wanted: { amount: number; currency: string }): Stripe.Charge {
  const charge = mustFind(work, 'charge', id, 'source_transaction');
  if (charge.status !== 'succeeded' || !charge.captured || charge.currency !== wanted.currency) {
    throw refused('parameter_invalid', `The charge ${id} cannot be the source of this transfer.`, {
      param: 'source_transaction',
    });
  }
  const drawn = work.store.all('transfer').filter(({ value }) => value.source_transaction === id);
  const drawnMinor = drawn.reduce((sum, { value }) => sum + value.amount - value.amount_reversed, 0);
  if (drawnMinor + wanted.amount > charge.amount_captured) {
    const leftMinor = charge.amount_captured - drawnMinor;
    throw refused('balance_insufficient', `Only ${leftMinor} of the charge ${id} is left to transfer.`, {
      param: 'amount',
    });
  }
  return charge;
}

/** Books a transfer on both sides; pending money stays pending on the connected account until the same moment. */
function send(work: Work, input: Stripe.Transfer, readyS: number): Stripe.Transfer {
  const movement = { category: 'transfer', currency: input.currency, source: input.id, availableOnS: readyS };
  const transaction = post(work, { ...movement, type: 'transfer', amountMinor: -input.amount });
  const destination = idOf(input.destination)!;
  const there: Work = { ...work, owner: destination };
  const paymentId = newId('py');
  const received = post(there, {
    type: 'payment',
    category: 'charge',
    amountMinor: input.amount,
    currency: input.currency,
    source: paymentId,
    availableOnS: readyS,
  });
  const payment: Stripe.Charge = {
    id: paymentId,
    ...blankCharge(work),
    amount: input.amount,
    amount_captured: input.amount,
    balance_transaction: received.id,
    currency: input.currency,
    source_transfer: input.id,
  };
  work.store.put('charge', payment, { owner: destination });
  emit(there, 'payment.created' as Stripe.Event['type'], payment);
  const transfer = { ...input, balance_transaction: transaction.id, destination_payment: paymentId };
  work.store.put('transfer', transfer, { owner: work.owner });
  emit(work, 'transfer.created', transfer);
  schedule(work, 'pay-out', destination, readyS - work.nowS + work.settings.payoutDelayS);
  return transfer;
}

const filter = { ...paging, destination: text().optional(), transfer_group: text().optional() };

const update = route(
  'POST',
  '/transfers/:id',
  { description: text().optional(), metadata: metadata().optional() },
  (work, params, { id = '' }) => {
    const before = mustFind(work, 'transfer', id);
    const description = params.description ?? before.description;
    const transfer = { ...before, description, metadata: mergeMetadata(before.metadata, params.metadata) };
    work.store.put('transfer', transfer);
    emit(work, 'transfer.updated', transfer);
    return transfer;
  },
);

export const transferRoutes = [
  create,
  route('GET', '/transfers', filter, (work, page) => {
    const keep = (transfer: Stripe.Transfer) =>
      (!page.destination || idOf(transfer.destination) === page.destination) &&
      (!page.transfer_group || transfer.transfer_group === page.transfer_group);
    return listPage(work, 'transfer', { url: '/v1/transfers', page, keep });
  }),
  route('GET', '/transfers/:id', {}, (work, _, { id = '' }) => mustFind(work, 'transfer', id)),
  update,
];
