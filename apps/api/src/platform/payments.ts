/** The payment processor as the market sees it. Amounts in minor units; `key` is the idempotency key, decided before the call. */
export interface PaymentGateway {
  createCheckout(order: CheckoutOrder): Promise<{ sessionId: string; url: string }>;
  expireCheckout(sessionId: string): Promise<void>;
  /** What became of a checkout: its payment as it stands now. */
  findPayment(sessionId: string): Promise<ProcessorPayment | null>;
  retrievePayment(intentId: string): Promise<ProcessorPayment>;
  createTransfer(order: TransferOrder): Promise<{ transferId: string }>;
  findTransfer(group: string, key: string): Promise<{ transferId: string } | null>;
  createRefund(order: RefundOrder): Promise<{ refundId: string }>;
  findRefund(intentId: string, key: string): Promise<{ refundId: string } | null>;
  createAccount(order: { memberId: string; email: string; key: string }): Promise<{ accountId: string }>;
  createAccountLink(order: { accountId: string; returnUrl: string; refreshUrl: string }): Promise<{ url: string }>;
  retrieveAccount(accountId: string): Promise<ProcessorAccount>;
  balance(): Promise<{ availableMinor: number; pendingMinor: number }>;
  /** Every balance transaction of the market's own account since then, oldest first. */
  balanceTransactions(since: Date): AsyncIterable<BalanceTransaction>;
  events(since: Date): AsyncIterable<ProcessorEvent>;
  /** @throws AppError request.invalid when the signature does not fit. */
  verifyEvent(raw: Buffer, signature: string): ProcessorEvent;
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

export interface ProcessorPayment {
  intentId: string;
  dealId: string;
  paymentId: string;
  state: 'open' | 'processing' | 'failed' | 'succeeded' | 'cancelled';
  amountMinor: number;
  chargeId: string | null;
  feeMinor: number | null;
  /** Neutral words for the buyer after a decline. */
  message: string;
}

export interface TransferOrder {
  dealId: string;
  amountMinor: number;
  currency: string;
  accountId: string;
  chargeId: string;
  key: string;
}

export interface RefundOrder {
  intentId: string;
  amountMinor: number;
  key: string;
}

export interface ProcessorAccount {
  accountId: string;
  transfersActive: boolean;
  payoutsEnabled: boolean;
  requirements: string[];
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
  accountId: string | null;
  objectId: string;
  at: Date;
  object: Record<string, unknown>;
}
