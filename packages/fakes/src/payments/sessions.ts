import type { Stripe } from 'stripe';
import { emit } from './events.ts';
import { idOf } from './ids.ts';
import { attempt, failDebit, refuseAtBank, succeed } from './attempts.ts';
import { cancelIntent, createIntent } from './intents.ts';
import { testMethod } from './test-methods.ts';
import { mustFind, type Work } from './work.ts';

type Session = Stripe.Checkout.Session;

export type PayResult = { step: 'done' | 'ask' } | { step: 'declined'; message: string };

/** The payer presses Pay on the hosted page. The intent is made at the first try and kept for the next ones. */
export function pay(work: Work, session: Session, method: string): PayResult {
  const before = session.payment_intent
    ? mustFind(work, 'payment_intent', idOf(session.payment_intent)!)
    : startIntent(work, session);
  const withIntent: Session = work.store.put('checkout.session', { ...session, payment_intent: before.id });
  const returnUrl = `${work.settings.publicUrl}/pay/${session.id}`;
  const { intent, decline } = attempt(work, before, { method, returnUrl });
  if (decline) return { step: 'declined', message: decline.message };
  if (intent.status === 'requires_action') return { step: 'ask' };
  complete(work, withIntent, intent);
  return { step: 'done' };
}

function startIntent(work: Work, session: Session): Stripe.PaymentIntent {
  const data = work.store.row('checkout.session', session.id)?.hidden.intentData ?? {};
  return createIntent(work, {
    amount: session.amount_total ?? 0,
    currency: session.currency ?? 'usd',
    customer: session.customer,
    payment_method_types: session.payment_method_types,
    ...(data as Partial<Stripe.PaymentIntent>),
  });
}

/** The payer approves or refuses at the bank. Returns the session of the intent, if it has one. */
export function answerAtBank(
  work: Work,
  intent: Stripe.PaymentIntent,
  answer: 'approve' | 'refuse',
): Session | undefined {
  const session = sessionOf(work, intent.id);
  if (answer === 'refuse') {
    refuseAtBank(work, intent);
    return session;
  }
  const { intent: after } = attempt(work, intent, { method: idOf(intent.payment_method)!, approved: true });
  if (session) complete(work, session, after);
  return session && work.store.find('checkout.session', session.id);
}

function complete(work: Work, session: Session, intent: Stripe.PaymentIntent): void {
  const payment_status = intent.status === 'processing' ? 'unpaid' : 'paid';
  const done: Session = { ...session, payment_status, status: 'complete', url: null };
  work.store.put('checkout.session', done);
  emit(work, 'checkout.session.completed', done);
}

/** Closes an open session for good; its intent, if any, can no longer be paid. */
export function expireSession(work: Work, session: Session): Session {
  const expired: Session = { ...session, status: 'expired', url: null };
  work.store.put('checkout.session', expired);
  const intent = session.payment_intent && work.store.find('payment_intent', idOf(session.payment_intent)!);
  if (intent && intent.status.startsWith('requires_')) cancelIntent(work, intent, 'automatic');
  emit(work, 'checkout.session.expired', expired);
  return expired;
}

/** A bank debit in processing ends: the money arrives, or the bank sends it back. */
export function endDebit(work: Work, intentId: string, result: 'settled' | 'failed'): void {
  const intent = mustFind(work, 'payment_intent', intentId);
  if (intent.status !== 'processing') return;
  const row = work.store.row('charge', idOf(intent.latest_charge) ?? '')!;
  const session = sessionOf(work, intentId);
  if (result === 'failed') {
    failDebit(work, intent, row.value);
    if (session) emit(work, 'checkout.session.async_payment_failed', session);
    return;
  }
  succeed(work, intent, row.value, { test: testMethod(row.hidden.test ?? '')! });
  if (!session) return;
  const paid = work.store.put('checkout.session', { ...session, payment_status: 'paid' });
  emit(work, 'checkout.session.async_payment_succeeded', paid);
}

function sessionOf(work: Work, intentId: string): Session | undefined {
  return work.store.all('checkout.session').find(({ value }) => value.payment_intent === intentId)?.value;
}
