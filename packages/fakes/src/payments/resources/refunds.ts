import type { Stripe } from 'stripe';
import { post } from '../balances.ts';
import { availableOnS } from '../charges.ts';
import { badParameter, refused } from '../errors.ts';
import { emit } from '../events.ts';
import { idOf, newId } from '../ids.ts';
import { listPage } from '../listing.ts';
import { amount, flag, ignored, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { testMethod } from '../test-methods.ts';
import { mustFind, schedule, type Work } from '../work.ts';
import { mergeMetadata } from '../metadata.ts';
import { reverseTransfer } from './reversals.ts';
import { z } from 'zod';

const createInput = {
  charge: text().optional(),
  payment_intent: text().optional(),
  amount: amount().optional(),
  metadata: metadata().optional(),
  reason: z.enum(['duplicate', 'fraudulent', 'requested_by_customer']).optional(),
  reverse_transfer: flag().optional(),
  ...ignored('refund_application_fee', 'currency', 'instructions_email'),
};

const create = route('POST', '/refunds', createInput, (work, params) => {
  const charge = chargeToRefund(work, params);
  const leftMinor = charge.amount_captured - charge.amount_refunded;
  if (charge.disputed)
    throw refused('charge_disputed', `Charge ${charge.id} has been charged back; cannot issue a refund.`);
  if (leftMinor === 0) throw refused('charge_already_refunded', `Charge ${charge.id} has already been refunded.`);
  const amountMinor = params.amount ?? leftMinor;
  if (amountMinor > leftMinor) {
    const message = `Refund amount (${amountMinor}) is greater than unrefunded amount on charge (${leftMinor})`;
    throw refused('amount_too_large', message, { param: 'amount' });
  }
  return refund(work, charge, {
    amountMinor,
    reason: params.reason ?? null,
    metadata: params.metadata ?? {},
    alsoTransfer: params.reverse_transfer,
  });
});

function chargeToRefund(
  work: Work,
  params: { charge?: string | undefined; payment_intent?: string | undefined },
): Stripe.Charge {
  const intent = params.payment_intent
    ? mustFind(work, 'payment_intent', params.payment_intent, 'payment_intent')
    : null;
  const id = params.charge ?? idOf(intent?.latest_charge);
  if (!id && intent)
    throw refused(
      'payment_intent_unexpected_state',
      `The PaymentIntent ${intent.id} has no successful charge to refund.`,
    );
  if (!id)
    throw badParameter(
      'parameter_missing',
      'One of the following params should be provided: charge, payment_intent.',
      'charge',
    );
  const charge = mustFind(work, 'charge', id, 'charge');
  if (charge.status !== 'succeeded' || !charge.captured) {
    throw refused('charge_not_refundable', `Charge ${charge.id} has not succeeded; there is nothing to refund.`);
  }
  return charge;
}

interface RefundInput {
  amountMinor: number;
  reason: Stripe.Refund.Reason | null;
  metadata: Record<string, string>;
  alsoTransfer?: boolean | undefined;
}

function refund(work: Work, charge: Stripe.Charge, input: RefundInput): Stripe.Refund {
  const { outcome } = testMethod(work.store.row('charge', charge.id)?.hidden.test ?? '') ?? {};
  const later = outcome?.kind === 'succeeds' ? outcome.refunds : undefined;
  const id = newId('re');
  const transaction = post(work, {
    type: charge.id.startsWith('py_') ? 'payment_refund' : 'refund',
    category: 'refund',
    amountMinor: -input.amountMinor,
    currency: charge.currency,
    source: id,
    // A refund of pending money is taken from that pending money, so that the available sum never falls for it.
    availableOnS: availableOnS(work, charge),
  });
  const made: Stripe.Refund = {
    id,
    object: 'refund',
    amount: input.amountMinor,
    balance_transaction: transaction.id,
    charge: charge.id,
    created: work.nowS,
    currency: charge.currency,
    customer: charge.customer,
    customer_account: null,
    metadata: input.metadata,
    payment_intent: charge.payment_intent,
    payment_method: charge.payment_method,
    reason: input.reason,
    receipt_number: null,
    source_transfer_reversal: null,
    status: later === 'wait' ? 'pending' : 'succeeded',
    transfer_reversal: input.alsoTransfer
      ? takeBackTransfer(work, charge, { refund: id, amountMinor: input.amountMinor })
      : null,
  };
  work.store.put('refund', made, { owner: work.owner });
  const refundedMinor = charge.amount_refunded + input.amountMinor;
  const after = { ...charge, amount_refunded: refundedMinor, refunded: refundedMinor === charge.amount_captured };
  work.store.put('charge', after);
  emit(work, 'refund.created', made);
  emit(work, 'charge.refunded', after);
  if (later) schedule(work, later === 'fail' ? 'fail-refund' : 'settle-refund', id, 2);
  return made;
}

function takeBackTransfer(
  work: Work,
  charge: Stripe.Charge,
  { refund, amountMinor }: { refund: string; amountMinor: number },
) {
  const transfer = work.store.all('transfer').find(({ value }) => value.source_transaction === charge.id)?.value;
  if (!transfer)
    throw refused('parameter_invalid', 'This charge has no transfer to reverse.', { param: 'reverse_transfer' });
  return reverseTransfer(work, transfer, { amountMinor, refund }).id;
}

/** A refund the bank sends back: the money returns to the market, and the charge counts as less refunded. */
export function failRefund(work: Work, id: string): void {
  const before = mustFind(work, 'refund', id);
  if (before.status === 'failed' || before.status === 'canceled') return;
  const charge = mustFind(work, 'charge', idOf(before.charge) ?? '');
  const movement = { currency: before.currency, source: id, availableOnS: work.nowS, amountMinor: before.amount };
  const transaction = post(work, { ...movement, type: 'refund_failure', category: 'refund_failure' });
  const failed: Stripe.Refund = {
    ...before,
    failure_balance_transaction: transaction.id,
    failure_reason: 'expired_or_canceled_card',
    status: 'failed',
  };
  work.store.put('refund', failed);
  work.store.put('charge', { ...charge, amount_refunded: charge.amount_refunded - before.amount, refunded: false });
  emit(work, 'refund.updated', failed);
  emit(work, 'refund.failed', failed);
}

/** A refund that waited reaches the payer. */
export function settleRefund(work: Work, id: string): void {
  const before = mustFind(work, 'refund', id);
  if (before.status !== 'pending') return;
  const settled: Stripe.Refund = { ...before, status: 'succeeded' };
  work.store.put('refund', settled);
  emit(work, 'refund.updated', settled);
}

const filter = { ...paging, charge: text().optional(), payment_intent: text().optional() };

export const refundRoutes = [
  create,
  route('GET', '/refunds', filter, (work, page) => {
    const keep = (item: Stripe.Refund) =>
      (!page.charge || idOf(item.charge) === page.charge) &&
      (!page.payment_intent || idOf(item.payment_intent) === page.payment_intent);
    return listPage(work, 'refund', { url: '/v1/refunds', page, keep });
  }),
  route('GET', '/refunds/:id', {}, (work, _, { id = '' }) => mustFind(work, 'refund', id)),
  route('POST', '/refunds/:id', { metadata: metadata().optional() }, (work, params, { id = '' }) => {
    const before = mustFind(work, 'refund', id);
    const after = work.store.put('refund', { ...before, metadata: mergeMetadata(before.metadata, params.metadata) });
    emit(work, 'refund.updated', after);
    return after;
  }),
];
