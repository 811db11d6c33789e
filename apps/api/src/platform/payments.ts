import { AppError } from './app-error.ts';

/**
 * The payment processor as the market sees it. Amounts in minor units. `key` is the idempotency key, decided before the call;
 * `reference` is kept with the object, so that it is found again when the key no longer proves anything.
 * Every call @throws AppError processor.unavailable when the processor does not answer, ProcessorRefusal when it says no.
 */
export interface PaymentGateway {
  createCheckout(order: CheckoutOrder): Promise<{ sessionId: string; url: string }>;
  retrieveCheckout(sessionId: string): Promise<ProcessorCheckout>;
  /** Closes the payment page; nothing happens to one that is closed already. */
  expireCheckout(sessionId: string): Promise<void>;
  retrievePayment(intentId: string): Promise<ProcessorPayment>;
  createTransfer(order: TransferOrder): Promise<ProcessorTransfer>;
  retrieveTransfer(transferId: string): Promise<ProcessorTransfer>;
  findTransfer(of: { dealId: string; reference: string }): Promise<ProcessorTransfer | null>;
  createRefund(order: RefundOrder): Promise<ProcessorRefund>;
  retrieveRefund(refundId: string): Promise<ProcessorRefund>;
  findRefund(of: { intentId: string; reference: string }): Promise<ProcessorRefund | null>;
  retrieveDispute(disputeId: string): Promise<ProcessorDispute>;
  createAccount(order: { memberId: string; email: string; key: string }): Promise<{ accountId: string }>;
  /** A link that works once and for minutes: redirect at once, never keep it. */
  createAccountLink(order: { accountId: string; returnUrl: string; refreshUrl: string }): Promise<{ url: string }>;
  retrieveAccount(accountId: string): Promise<ProcessorAccount>;
  /** A payout to a seller's bank, or to the market's own with `accountId` null. */
  retrievePayout(of: { payoutId: string; accountId: string | null }): Promise<ProcessorPayout>;
  /** The market's own balance in its currency. */
  balance(): Promise<{ availableMinor: number; pendingMinor: number }>;
  /** Every balance transaction of the market's own account since then, oldest first. */
  balanceTransactions(since: Date): AsyncIterable<BalanceTransaction>;
  /** Every event of the market's own account, or of a seller's, since then, oldest first; the processor keeps them for 30 days. */
  events(of: { since: Date; accountId: string | null }): AsyncIterable<ProcessorEvent>;
  /** @throws AppError request.invalid when the signature fits none of the secrets, or is too old */
  verifyEvent(raw: Buffer, signature: string): ProcessorEvent;
}

/** The processor understood and said no; no retry changes that. The message is for the log and the desk. */
export class ProcessorRefusal extends Error {
  readonly code: string;

  constructor(code: string, message: string, cause: unknown) {
    super(message, { cause });
    this.name = 'ProcessorRefusal';
    this.code = code;
  }
}

/** The processor failed by itself, and repeats that answer for this key: look the object up, then try with a new key. */
export class ProcessorFailure extends AppError {
  constructor(cause: unknown) {
    super('processor.unavailable', 'The payment processor has a problem. Nothing was changed; try again in a minute.', {
      cause,
    });
  }
}

export interface CheckoutOrder {
  dealId: string;
  dealCode: string;
  paymentId: string;
  amountMinor: number;
  currency: string;
  description: string;
  buyerEmail: string;
  successUrl: string;
  cancelUrl: string;
  key: string;
}

export interface ProcessorCheckout {
  state: 'open' | 'complete' | 'expired';
  url: string | null;
  /** The payment behind it, once the buyer has tried. */
  intentId: string | null;
}

export interface ProcessorPayment {
  intentId: string;
  /** The market's own id of the payment; empty for one that the market did not ask for. */
  paymentId: string;
  state: 'open' | 'processing' | 'failed' | 'succeeded' | 'cancelled';
  amountMinor: number;
  currency: string;
  /** Null until the money has moved. */
  charge: { chargeId: string; feeMinor: number; transactionId: string } | null;
  /** Neutral words for the buyer after a decline. */
  message: string;
}

export interface TransferOrder {
  dealId: string;
  reference: string;
  amountMinor: number;
  currency: string;
  accountId: string;
  chargeId: string;
  key: string;
}

export interface ProcessorTransfer {
  transferId: string;
  reference: string;
  amountMinor: number;
  transactionId: string;
  reversals: { amountMinor: number; transactionId: string }[];
}

export interface RefundOrder {
  intentId: string;
  reference: string;
  amountMinor: number;
  key: string;
}

export interface ProcessorRefund {
  refundId: string;
  reference: string;
  amountMinor: number;
  state: 'pending' | 'succeeded' | 'failed';
  transactionId: string | null;
  /** The movement that brought the money back after a failure. */
  failureTransactionId: string | null;
}

export interface ProcessorDispute {
  disputeId: string;
  chargeId: string;
  amountMinor: number;
  /** `inquiry`: the bank only asks, no money moves. */
  state: 'inquiry' | 'open' | 'won' | 'lost';
  /** Signed as the processor's balance feels them: the withdrawal is negative. */
  movements: { amountMinor: number; feeMinor: number; transactionId: string }[];
}

export interface ProcessorAccount {
  accountId: string;
  transfersActive: boolean;
  payoutsEnabled: boolean;
  /** What the processor still asks for, by its own names. */
  requirements: string[];
}

export interface ProcessorPayout {
  payoutId: string;
  amountMinor: number;
  state: 'pending' | 'in_transit' | 'paid' | 'failed' | 'cancelled';
  at: Date;
  transactionId: string | null;
  failureTransactionId: string | null;
}

export interface BalanceTransaction {
  id: string;
  kind: string;
  amountMinor: number;
  feeMinor: number;
  netMinor: number;
  sourceId: string;
  at: Date;
}

export interface ProcessorEvent {
  id: string;
  kind: string;
  /** The seller's account it happened on; null for the market's own. */
  accountId: string | null;
  objectId: string;
  at: Date;
}
