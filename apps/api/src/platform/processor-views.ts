import type { Stripe } from 'stripe';
import type {
  BalanceTransaction,
  ProcessorAccount,
  ProcessorDispute,
  ProcessorEvent,
  ProcessorPayment,
  ProcessorPayout,
  ProcessorRefund,
  ProcessorTransfer,
} from './payments.ts';

const moment = (seconds: number): Date => new Date(seconds * 1000);

export const idOf = (ref: string | { id: string } | null | undefined): string | null =>
  typeof ref === 'string' ? ref : (ref?.id ?? null);

/** Buyers get short neutral words; what a bank suspects is not theirs to read. */
const declineWords: Record<string, string> = {
  insufficient_funds: 'There is not enough money on the card or account. Use another one.',
  expired_card: 'The card has expired. Use another one.',
  incorrect_cvc: 'The card’s security code is not right. Try again.',
  processing_error: 'The bank could not process the card. Try again in a minute.',
  authentication_required: 'The bank did not get your approval. Try again.',
  payment_intent_authentication_failure: 'The bank did not get your approval. Try again.',
  payment_method_provider_decline: 'The bank returned the debit. Use another account or a card.',
};

function declineMessage(error: Stripe.PaymentIntent.LastPaymentError | null): string {
  if (!error) return '';
  const words = declineWords[error.decline_code ?? ''] ?? declineWords[error.code ?? ''];
  return words ?? 'The bank declined the payment. Use another card, or ask your bank.';
}

function paymentState({ status, last_payment_error: error }: Stripe.PaymentIntent): ProcessorPayment['state'] {
  if (status === 'succeeded') return 'succeeded';
  if (status === 'processing') return 'processing';
  if (status === 'canceled') return 'cancelled';
  return status === 'requires_payment_method' && error ? 'failed' : 'open';
}

/** Wants `latest_charge.balance_transaction` expanded. */
export function toPayment(intent: Stripe.PaymentIntent): ProcessorPayment {
  const charge = intent.latest_charge as Stripe.Charge | null;
  const transaction = charge?.balance_transaction as Stripe.BalanceTransaction | null | undefined;
  const state = paymentState(intent);
  return {
    intentId: intent.id,
    paymentId: intent.metadata.payment_id ?? '',
    state,
    amountMinor: state === 'succeeded' ? intent.amount_received : intent.amount,
    currency: intent.currency.toUpperCase(),
    charge:
      charge && transaction ? { chargeId: charge.id, feeMinor: transaction.fee, transactionId: transaction.id } : null,
    message: state === 'failed' ? declineMessage(intent.last_payment_error) : '',
  };
}

export const toTransfer = (transfer: Stripe.Transfer): ProcessorTransfer => ({
  transferId: transfer.id,
  reference: transfer.metadata.reference ?? '',
  amountMinor: transfer.amount,
  transactionId: idOf(transfer.balance_transaction) ?? '',
  reversals: transfer.reversals.data.map((reversal) => ({
    amountMinor: reversal.amount,
    transactionId: idOf(reversal.balance_transaction) ?? '',
  })),
});

const refundStates: Record<string, ProcessorRefund['state']> = {
  succeeded: 'succeeded',
  failed: 'failed',
  canceled: 'failed',
};

export const toRefund = (refund: Stripe.Refund): ProcessorRefund => ({
  refundId: refund.id,
  reference: refund.metadata?.reference ?? '',
  amountMinor: refund.amount,
  state: refundStates[refund.status ?? ''] ?? 'pending',
  transactionId: idOf(refund.balance_transaction),
  failureTransactionId: idOf(refund.failure_balance_transaction),
});

function disputeState(status: string): ProcessorDispute['state'] {
  if (status.startsWith('warning_')) return 'inquiry';
  return status === 'won' || status === 'lost' ? status : 'open';
}

export const toDispute = (dispute: Stripe.Dispute): ProcessorDispute => ({
  disputeId: dispute.id,
  chargeId: idOf(dispute.charge) ?? '',
  amountMinor: dispute.amount,
  state: disputeState(dispute.status),
  movements: dispute.balance_transactions.map(({ id, amount, fee }) => ({
    amountMinor: amount,
    feeMinor: fee,
    transactionId: id,
  })),
});

export const toAccount = (account: Stripe.Account): ProcessorAccount => ({
  accountId: account.id,
  transfersActive: account.capabilities?.transfers === 'active',
  payoutsEnabled: account.payouts_enabled ?? false,
  requirements: account.requirements?.currently_due ?? [],
});

const payoutStates: Record<string, ProcessorPayout['state']> = {
  pending: 'pending',
  in_transit: 'in_transit',
  paid: 'paid',
  failed: 'failed',
  canceled: 'cancelled',
};

export const toPayout = (payout: Stripe.Payout): ProcessorPayout => ({
  payoutId: payout.id,
  amountMinor: payout.amount,
  state: payoutStates[payout.status] ?? 'pending',
  at: moment(payout.created),
  transactionId: idOf(payout.balance_transaction),
  failureTransactionId: idOf(payout.failure_balance_transaction),
});

export const toBalanceTransaction = (transaction: Stripe.BalanceTransaction): BalanceTransaction => ({
  id: transaction.id,
  kind: transaction.reporting_category,
  amountMinor: transaction.amount,
  feeMinor: transaction.fee,
  netMinor: transaction.net,
  sourceId: idOf(transaction.source) ?? '',
  at: moment(transaction.created),
});

export const toEvent = (event: Stripe.Event): ProcessorEvent => ({
  id: event.id,
  kind: event.type,
  accountId: event.account ?? null,
  objectId: (event.data.object as { id?: string }).id ?? '',
  at: moment(event.created),
});
