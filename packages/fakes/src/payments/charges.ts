import type { Stripe } from 'stripe';
import { post, processingFee } from './balances.ts';
import { emit } from './events.ts';
import { idOf, newId } from './ids.ts';
import { detailsOf, type Outcome, type TestMethod } from './test-methods.ts';
import { schedule, type Work } from './work.ts';

interface ChargeInput {
  intent: Stripe.PaymentIntent;
  method: Stripe.PaymentMethod;
  test: TestMethod;
  status: 'succeeded' | 'pending' | 'failed';
  captured: boolean;
}

/** A new charge of a payment intent. Money moves only in `collect`. */
export function createCharge(work: Work, { intent, method, test, status, captured }: ChargeInput): Stripe.Charge {
  const decline = test.outcome.kind === 'declines' && status === 'failed' ? test.outcome : null;
  const charge: Stripe.Charge = {
    id: newId(test.outcome.kind === 'debits' ? 'py' : 'ch'),
    ...blankCharge(work),
    amount: intent.amount,
    captured,
    currency: intent.currency,
    customer: intent.customer,
    description: intent.description,
    failure_code: decline?.code ?? null,
    failure_message: decline?.message ?? null,
    metadata: intent.metadata,
    outcome: outcomeOf(decline, status),
    paid: status !== 'failed',
    payment_intent: intent.id,
    payment_method: method.id,
    payment_method_details: detailsOf(test) as unknown as Stripe.Charge.PaymentMethodDetails,
    receipt_email: intent.receipt_email,
    status,
    transfer_group: intent.transfer_group,
  };
  return work.store.put('charge', charge, { owner: work.owner, hidden: { test: test.name } });
}

/** The fields of a charge that nothing has happened to yet. */
export function blankCharge(work: Work): Omit<Stripe.Charge, 'id' | 'amount' | 'currency'> {
  return {
    object: 'charge',
    amount_captured: 0,
    amount_refunded: 0,
    application: null,
    application_fee: null,
    application_fee_amount: null,
    balance_transaction: null,
    billing_details: { address: null, email: null, name: null, phone: null, tax_id: null },
    calculated_statement_descriptor: null,
    captured: true,
    created: work.nowS,
    customer: null,
    description: null,
    disputed: false,
    failure_balance_transaction: null,
    failure_code: null,
    failure_message: null,
    fraud_details: {},
    livemode: false,
    metadata: {},
    on_behalf_of: null,
    outcome: null,
    paid: true,
    payment_intent: null,
    payment_method: null,
    payment_method_details: null,
    receipt_email: null,
    receipt_number: null,
    receipt_url: null,
    refunded: false,
    review: null,
    shipping: null,
    source: null,
    source_transfer: null,
    statement_descriptor: null,
    statement_descriptor_suffix: null,
    status: 'succeeded',
    transfer_data: null,
    transfer_group: null,
  };
}

function outcomeOf(decline: Extract<Outcome, { kind: 'declines' }> | null, status: string): Stripe.Charge.Outcome {
  const base = { advice_code: null, network_advice_code: null, network_decline_code: null };
  if (status === 'failed') {
    const reason = decline?.declineCode ?? decline?.code ?? null;
    const seller_message = 'The bank returned the decline code.';
    return { ...base, network_status: 'declined_by_network', reason, seller_message, type: 'issuer_declined' };
  }
  return {
    ...base,
    network_status: 'approved_by_network',
    reason: null,
    seller_message: 'Payment complete.',
    type: 'authorized',
  };
}

/** Takes the money of a succeeded charge: writes its balance transaction, less the processing fee. */
export function collect(
  work: Work,
  charge: Stripe.Charge,
  { amountMinor, test }: { amountMinor: number; test: TestMethod },
) {
  const { outcome } = test;
  const atOnce = outcome.kind === 'succeeds' && outcome.atOnce;
  const transaction = post(work, {
    type: charge.id.startsWith('py_') ? 'payment' : 'charge',
    category: 'charge',
    amountMinor,
    feeMinor: processingFee(amountMinor),
    currency: charge.currency,
    source: charge.id,
    availableOnS: atOnce ? work.nowS : work.nowS + work.settings.fundsDelayS,
    description: charge.description,
  });
  const collected: Stripe.Charge = {
    ...charge,
    amount_captured: amountMinor,
    balance_transaction: transaction.id,
    captured: true,
    paid: true,
    status: 'succeeded',
  };
  if (outcome.kind === 'succeeds' && outcome.then) schedule(work, 'open-dispute', charge.id, 0);
  return work.store.put('charge', collected);
}

/** When the money of a charge turns available, in seconds; now when it already has. */
export function availableOnS(work: Work, charge: Stripe.Charge): number {
  const transaction = work.store.find('balance_transaction', idOf(charge.balance_transaction) ?? '');
  return Math.max(work.nowS, transaction?.available_on ?? work.nowS);
}

/** Writes a charge and tells of it. */
export function saveCharge(work: Work, charge: Stripe.Charge, event: Stripe.Event['type']): Stripe.Charge {
  work.store.put('charge', charge);
  emit(work, event, charge);
  return charge;
}
