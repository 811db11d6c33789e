import type { Response } from 'express';
import type { Stripe } from 'stripe';
import { html } from '../../pages/html.ts';
import { idOf } from '../ids.ts';
import type { Store } from '../store.ts';
import { testMethods, typeOf, type TestMethod } from '../test-methods.ts';
import { moneyText, sendProcessorPage } from './shell.ts';

type Session = Stripe.Checkout.Session;

/** The address the payer returns to, with the session's id where the market asked for it. */
export function successAddress(session: Session): string {
  return (session.success_url ?? '').replaceAll('{CHECKOUT_SESSION_ID}', session.id);
}

/** The page where a payer picks a test card. `problem` is said first and loudly. */
export function sendPayPage(
  res: Response,
  store: Store,
  { session, problem }: { session: Session; problem?: string | undefined },
): void {
  const items = store.row('checkout.session', session.id)?.hidden.lineItems ?? [];
  const sum = moneyText(session.amount_total ?? 0, session.currency ?? 'usd');
  const offered = testMethods.filter((method) => session.payment_method_types.includes(typeOf(method)));
  const [usual, rare] = [offered.filter(({ isRare }) => !isRare), offered.filter(({ isRare }) => isRare)];
  const body = html` <h1>Pay ${sum}</h1>
    ${problem && html`<div class="alert" role="alert"><strong>Not paid.</strong> ${problem} You can try another way.</div>`}
    ${items.map((item) => html`<p>${item.description}: ${moneyText(item.amount_total, item.currency)}</p>`)}
    ${session.customer_email && html`<p class="quiet">Paid by ${session.customer_email}</p>`}
    <form method="post">
      <fieldset>
        <legend>Test card or bank account</legend>
        ${usual.map((method, index) => choice(method, { isFirst: index === 0 }))}
        <details>
          <summary>Rarer cases</summary>
          ${rare.map((method) => choice(method, { isFirst: false }))}
        </details>
      </fieldset>
      <div class="row">
        <button>Pay ${sum}</button>
        ${session.cancel_url && html`<a class="button second" href="${session.cancel_url}">Back without paying</a>`}
      </div>
    </form>`;
  sendProcessorPage(res, { title: `Pay ${sum}`, body, leadsTo: [session.success_url, session.cancel_url] });
}

function choice(method: TestMethod, { isFirst }: { isFirst: boolean }) {
  return html`<label class="pick"
    ><input type="radio" name="method" value="${method.name}" required ${isFirst && html`checked`} /><span
      >${method.label}<code>${method.number}</code></span
    ></label
  >`;
}

/** What a session that is over says. */
export function sendClosedPage(res: Response, session: Session): void {
  const isPaid = session.status === 'complete';
  const title = isPaid ? 'This payment is done' : 'This payment page has ended';
  const address = isPaid ? successAddress(session) : session.cancel_url;
  const body = html` <h1>${title}</h1>
    <p>${isPaid ? 'Nothing more is needed here.' : 'Go back and ask for a new one; nothing was taken.'}</p>
    ${address && html`<p><a class="button" href="${address}">Go back</a></p>`}`;
  sendProcessorPage(res, { title, body, status: isPaid ? 200 : 410 });
}

/** The bank's own question to the payer. */
export function sendBankPage(
  res: Response,
  intent: Stripe.PaymentIntent,
  leadsTo: (string | null | undefined)[],
): void {
  const sum = moneyText(intent.amount, intent.currency);
  const body = html` <h1>Your bank asks: approve ${sum}?</h1>
    <p>This stands for the step in which a bank makes sure that the payer is the card’s holder.</p>
    <form method="post" class="row">
      <button name="answer" value="approve">Approve</button>
      <button class="second" name="answer" value="refuse">Refuse</button>
    </form>`;
  sendProcessorPage(res, { title: `Approve ${sum}`, body, leadsTo });
}

/** The last decline of a session's intent in the payer's words, if there was one. */
export function lastProblem(store: Store, session: Session): string | undefined {
  const intent = store.find('payment_intent', idOf(session.payment_intent) ?? '');
  return intent?.last_payment_error?.message;
}
