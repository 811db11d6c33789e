import type { Stripe } from 'stripe';

/** A link to the hosted set-up page: it opens once, within minutes, and gives way to a longer visit. */
export interface SetupVisit {
  id: string;
  account: string;
  returnUrl: string;
  refreshUrl: string;
  expiresAtS: number;
  step: 'link' | 'visit' | 'used';
}

/** Something that happens later by the processor's own clock, such as a payout reaching the bank. */
export interface Task {
  id: string;
  name: TaskName;
  subject: string;
  dueAtS: number;
}

export type TaskName =
  | 'open-dispute'
  | 'expire-session'
  | 'fail-refund'
  | 'settle-refund'
  | 'pay-out'
  | 'land-payout'
  | 'settle-debit'
  | 'fail-debit';

/** One event on its way to one endpoint. */
export interface Delivery {
  id: string;
  event: string;
  endpoint: string;
  attempts: number;
  dueAtS: number;
  state: 'waiting' | 'delivered' | 'given-up' | 'dropped';
  lastAnswer: string | null;
}

/** The first answer to an idempotency key, kept at least 24 hours. */
export interface KeyedAnswer {
  id: string;
  fingerprint: string;
  status: number;
  body: string;
  requestId: string;
  createdAtS: number;
}

export const requestFaults = ['lose_answer', 'fail_before_commit', 'unavailable', 'rate_limit', 'slow'] as const;
export const webhookFaults = ['webhook_drop', 'webhook_duplicate', 'webhook_delay', 'webhook_reorder'] as const;

/** A planned failure; it wears out after `times` hits. */
export interface Fault {
  id: string;
  kind: (typeof requestFaults)[number] | (typeof webhookFaults)[number] | 'payout_fail';
  method: string | null;
  path: string | null;
  event: string | null;
  times: number;
  delayMs: number;
}

/** Fields of an object that its API form does not show. */
export interface Hidden {
  secret?: string;
  connect?: boolean;
  test?: string;
  lineItems?: Stripe.LineItem[];
  intentData?: Record<string, unknown>;
}

/** Every kind of object the store keeps, by the name in its `object` field where it has one. */
export interface Kinds {
  account: Stripe.Account;
  bank_account: Stripe.BankAccount;
  customer: Stripe.Customer;
  payment_method: Stripe.PaymentMethod;
  'checkout.session': Stripe.Checkout.Session;
  payment_intent: Stripe.PaymentIntent;
  charge: Stripe.Charge;
  balance_transaction: Stripe.BalanceTransaction;
  transfer: Stripe.Transfer;
  transfer_reversal: Stripe.TransferReversal;
  refund: Stripe.Refund;
  payout: Stripe.Payout;
  dispute: Stripe.Dispute;
  event: Stripe.Event;
  webhook_endpoint: Stripe.WebhookEndpoint;
  visit: SetupVisit;
  task: Task;
  delivery: Delivery;
  answer: KeyedAnswer;
  fault: Fault;
  clock: { id: string; aheadS: number };
}

export type Kind = keyof Kinds;

/** One stored object. `owner` is the connected account it belongs to, or null for the market itself. */
export interface Row<K extends Kind = Kind> {
  kind: K;
  id: string;
  owner: string | null;
  value: Kinds[K];
  hidden: Hidden;
}
