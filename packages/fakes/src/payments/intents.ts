import type { Stripe } from 'stripe';
import { refused } from './errors.ts';
import { emit } from './events.ts';
import { newId } from './ids.ts';
import type { Work } from './work.ts';

type Intent = Stripe.PaymentIntent;

export type NewIntent = Pick<Intent, 'amount' | 'currency'> & Partial<Intent>;

/** A payment intent that waits for a payment method. */
export function createIntent(work: Work, input: NewIntent): Intent {
  const id = newId('pi');
  const intent: Intent = {
    id,
    object: 'payment_intent',
    allowed_payment_method_types: null,
    amount_capturable: 0,
    amount_details: { tip: {} },
    amount_received: 0,
    application: null,
    application_fee_amount: null,
    automatic_payment_methods: null,
    canceled_at: null,
    cancellation_reason: null,
    capture_method: 'automatic_async',
    client_secret: newId(`${id}_secret`),
    confirmation_method: 'automatic',
    created: work.nowS,
    customer: null,
    customer_account: null,
    description: null,
    excluded_payment_method_types: null,
    last_payment_error: null,
    latest_charge: null,
    livemode: false,
    managed_payments: null,
    metadata: {},
    next_action: null,
    on_behalf_of: null,
    payment_details: { customer_reference: null, order_reference: null },
    payment_method: null,
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_method_types: ['card', 'us_bank_account'],
    payment_record: null,
    processing: null,
    receipt_email: null,
    review: null,
    setup_future_usage: null,
    shipping: null,
    source: null,
    statement_descriptor: null,
    statement_descriptor_suffix: null,
    status: 'requires_payment_method',
    transfer_data: null,
    transfer_group: null,
    ...input,
  };
  work.store.put('payment_intent', intent, { owner: work.owner });
  emit(work, 'payment_intent.created', intent);
  return intent;
}

/** Writes an intent and, where one is named, tells of it. */
export function saveIntent(work: Work, intent: Intent, event?: Stripe.Event['type']): Intent {
  work.store.put('payment_intent', intent);
  if (event) emit(work, event, intent);
  return intent;
}

/** Refuses an action the intent's status does not allow. */
export function assertStatus(intent: Intent, action: string, allowed: string[]): void {
  if (allowed.includes(intent.status)) return;
  const message = `You cannot ${action} this PaymentIntent because it has a status of ${intent.status}.`;
  throw refused('payment_intent_unexpected_state', message, { payment_intent: intent });
}

/** Cancels an intent that has taken no money yet. */
export function cancelIntent(
  work: Work,
  intent: Intent,
  reason: Stripe.PaymentIntent.CancellationReason | null,
): Intent {
  const canceled: Intent = {
    ...intent,
    amount_capturable: 0,
    canceled_at: work.nowS,
    cancellation_reason: reason,
    next_action: null,
    status: 'canceled',
  };
  return saveIntent(work, canceled, 'payment_intent.canceled');
}
