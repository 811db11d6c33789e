import type { Stripe } from 'stripe';
import { collect, createCharge, saveCharge } from './charges.ts';
import { ProcessorError, type ErrorBody } from './errors.ts';
import { emit } from './events.ts';
import { idOf } from './ids.ts';
import { assertStatus, saveIntent } from './intents.ts';
import { toPaymentMethod, type TestMethod } from './test-methods.ts';
import type { Work } from './work.ts';

type Intent = Stripe.PaymentIntent;

interface Attempt {
  /** An id or the name of a test method. */
  method: string;
  /** The payer is not there, so a bank that asks counts as a decline. */
  offSession?: boolean;
  /** The payer has approved at the bank. */
  approved?: boolean;
  returnUrl?: string | null;
}

/** Confirms an intent with a method. A decline is returned, not thrown: the hosted page shows it and stays open. */
export function attempt(work: Work, intent: Intent, how: Attempt): { intent: Intent; decline?: ErrorBody } {
  assertStatus(intent, 'confirm', ['requires_payment_method', 'requires_confirmation', 'requires_action']);
  const { method, test } = toPaymentMethod(work, how.method);
  const tried: Intent = { ...intent, payment_method: method.id, last_payment_error: null, next_action: null };
  const { outcome } = test;
  if (outcome.kind === 'declines') return decline(work, tried, { method, test });
  if (outcome.kind === 'asks' && !how.approved) {
    if (how.offSession) return decline(work, tried, { method, test });
    return { intent: askPayer(work, tried, how.returnUrl ?? null) };
  }
  if (outcome.kind === 'debits') {
    const charge = createCharge(work, { intent: tried, method, test, status: 'pending', captured: true });
    emit(work, 'charge.pending', charge);
    return {
      intent: saveIntent(
        work,
        { ...tried, latest_charge: charge.id, status: 'processing' },
        'payment_intent.processing',
      ),
    };
  }
  const isManual = tried.capture_method === 'manual';
  const charge = createCharge(work, { intent: tried, method, test, status: 'succeeded', captured: !isManual });
  if (!isManual) return { intent: succeed(work, { ...tried, latest_charge: charge.id }, charge, { test }) };
  emit(work, 'charge.succeeded', charge);
  const held: Intent = {
    ...tried,
    amount_capturable: tried.amount,
    latest_charge: charge.id,
    status: 'requires_capture',
  };
  return { intent: saveIntent(work, held, 'payment_intent.amount_capturable_updated') };
}

/** Collects the money of an intent's charge and marks both succeeded. */
export function succeed(
  work: Work,
  intent: Intent,
  charge: Stripe.Charge,
  { test, amountMinor = intent.amount }: { test: TestMethod; amountMinor?: number },
): Intent {
  const wasCaptured = intent.status !== 'requires_capture';
  saveCharge(work, collect(work, charge, { amountMinor, test }), wasCaptured ? 'charge.succeeded' : 'charge.captured');
  const done: Intent = {
    ...intent,
    amount_capturable: 0,
    amount_received: amountMinor,
    next_action: null,
    status: 'succeeded',
  };
  return saveIntent(work, done, 'payment_intent.succeeded');
}

function askPayer(work: Work, intent: Intent, returnUrl: string | null): Intent {
  const url = `${work.settings.publicUrl}/authenticate/${intent.id}`;
  const next_action: Stripe.PaymentIntent.NextAction = {
    type: 'redirect_to_url',
    redirect_to_url: { return_url: returnUrl, url },
  };
  return saveIntent(work, { ...intent, next_action, status: 'requires_action' }, 'payment_intent.requires_action');
}

/** The payer refused at the bank: back to waiting for a method. */
export function refuseAtBank(work: Work, intent: Intent): Intent {
  assertStatus(intent, 'refuse', ['requires_action']);
  const message = 'The provided payment method has failed authentication. Use another one to try again.';
  const error = { code: 'payment_intent_authentication_failure', message, type: 'card_error' };
  return backToWaiting(work, intent, error as Stripe.PaymentIntent.LastPaymentError);
}

/** Fails the charge of an intent that was in processing. */
export function failDebit(work: Work, intent: Intent, charge: Stripe.Charge): Intent {
  const message = 'The bank returned the debit: not enough money on the account.';
  saveCharge(
    work,
    { ...charge, failure_code: 'insufficient_funds', failure_message: message, paid: false, status: 'failed' },
    'charge.failed',
  );
  const error = { charge: charge.id, code: 'payment_method_provider_decline', message, type: 'invalid_request_error' };
  return backToWaiting(work, intent, error as unknown as Stripe.PaymentIntent.LastPaymentError);
}

function backToWaiting(work: Work, intent: Intent, error: Stripe.PaymentIntent.LastPaymentError): Intent {
  const payment_method = work.store.find('payment_method', idOf(intent.payment_method) ?? '');
  const last_payment_error = { ...error, ...(payment_method && { payment_method }) };
  const waiting: Intent = {
    ...intent,
    last_payment_error,
    next_action: null,
    payment_method: null,
    status: 'requires_payment_method',
  };
  return saveIntent(work, waiting, 'payment_intent.payment_failed');
}

function decline(work: Work, intent: Intent, how: { method: Stripe.PaymentMethod; test: TestMethod }) {
  const charge = createCharge(work, { intent, ...how, status: 'failed', captured: false });
  emit(work, 'charge.failed', charge);
  const { outcome } = how.test;
  const fields =
    outcome.kind === 'declines'
      ? {
          code: outcome.code,
          message: outcome.message,
          ...(outcome.declineCode && { decline_code: outcome.declineCode }),
        }
      : {
          code: 'authentication_required',
          decline_code: 'authentication_required',
          message: 'The payer has to approve this payment.',
        };
  const error = { type: 'card_error' as const, charge: charge.id, ...fields };
  const waiting = backToWaiting(
    work,
    { ...intent, latest_charge: charge.id },
    error as Stripe.PaymentIntent.LastPaymentError,
  );
  return { intent: waiting, decline: { ...error, payment_intent: waiting } };
}

/** The 402 of a decline; what the decline wrote stays. */
export function declined(body: ErrorBody): ProcessorError {
  return new ProcessorError(402, body, { keepsChanges: true });
}
