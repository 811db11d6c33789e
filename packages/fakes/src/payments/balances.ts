import type { Stripe } from 'stripe';
import { newId } from './ids.ts';
import type { Work } from './work.ts';

/** What moves a balance. `amountMinor` and `feeMinor` are signed minor units; net = amount − fee. */
export interface Movement {
  type: Stripe.BalanceTransaction['type'];
  category: string;
  amountMinor: number;
  feeMinor?: number;
  currency: string;
  source: string;
  availableOnS: number;
  description?: string | null;
}

/** The processing fee of a payment: 2.9 % rounded half up, and 30 minor units. */
export function processingFee(amountMinor: number): number {
  return Math.floor((amountMinor * 29 + 500) / 1000) + 30;
}

/** Writes one balance transaction for the account acted for. */
export function post(work: Work, movement: Movement): Stripe.BalanceTransaction {
  const feeMinor = movement.feeMinor ?? 0;
  const fee: Stripe.BalanceTransaction.FeeDetail = {
    amount: feeMinor,
    application: null,
    currency: movement.currency,
    description: movement.type === 'adjustment' ? 'Dispute fee' : 'Processing fee',
    type: 'stripe_fee',
  };
  const transaction: Stripe.BalanceTransaction = {
    id: newId('txn'),
    object: 'balance_transaction',
    amount: movement.amountMinor,
    available_on: movement.availableOnS,
    balance_type: 'payments',
    created: work.nowS,
    currency: movement.currency,
    description: movement.description ?? null,
    exchange_rate: null,
    fee: feeMinor,
    fee_details: feeMinor === 0 ? [] : [fee],
    net: movement.amountMinor - feeMinor,
    reporting_category: movement.category,
    source: movement.source,
    status: movement.availableOnS > work.nowS ? 'pending' : 'available',
    type: movement.type,
  };
  return work.store.put('balance_transaction', transaction, { owner: work.owner });
}

/** A transaction's form at this moment: its status follows the clock. */
export function transactionNow(transaction: Stripe.BalanceTransaction, nowS: number): Stripe.BalanceTransaction {
  return { ...transaction, status: transaction.available_on > nowS ? 'pending' : 'available' };
}

/** Net sums of the account acted for by currency; `total` is what it would hold once all is available. */
export function balanceOf(work: Work): Map<string, { availableMinor: number; pendingMinor: number }> {
  const sums = new Map<string, { availableMinor: number; pendingMinor: number }>();
  for (const { owner, value } of work.store.all('balance_transaction')) {
    if (owner !== work.owner) continue;
    const sum = sums.get(value.currency) ?? { availableMinor: 0, pendingMinor: 0 };
    if (value.available_on > work.nowS) sum.pendingMinor += value.net;
    else sum.availableMinor += value.net;
    sums.set(value.currency, sum);
  }
  return sums;
}

/** Available net sum of one currency in minor units. */
export function availableMinor(work: Work, currency: string): number {
  return balanceOf(work).get(currency)?.availableMinor ?? 0;
}

/** Available and pending net sum of one currency in minor units. */
export function totalMinor(work: Work, currency: string): number {
  const sum = balanceOf(work).get(currency);
  return sum ? sum.availableMinor + sum.pendingMinor : 0;
}
