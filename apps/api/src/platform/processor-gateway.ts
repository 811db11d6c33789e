import { randomUUID } from 'node:crypto';
import Stripe from 'stripe';
import type { Settings } from '../settings.ts';
import { AppError } from './app-error.ts';
import type { PaymentGateway, ProcessorEvent } from './payments.ts';
import { checkouts } from './processor-checkouts.ts';
import { asked, oldestFirst } from './processor-errors.ts';
import {
  toAccount,
  toBalanceTransaction,
  toDispute,
  toEvent,
  toPayout,
  toRefund,
  toTransfer,
} from './processor-views.ts';

type GatewaySettings = Pick<
  Settings,
  'PAYMENTS_SECRET_KEY' | 'PAYMENTS_API_URL' | 'PAYMENTS_WEBHOOK_SECRETS' | 'MARKET_CURRENCY'
>;

function createClient({ PAYMENTS_SECRET_KEY: secretKey, PAYMENTS_API_URL: apiUrl }: GatewaySettings): Stripe {
  // Few and short tries: a caller waits for them, and the outbox tries again by itself.
  const options = { telemetry: false, timeout: 10_000, maxNetworkRetries: 1 };
  if (!apiUrl) return new Stripe(secretKey, options);
  const { hostname, port, protocol } = new URL(apiUrl);
  const scheme = protocol === 'http:' ? 'http' : 'https';
  return new Stripe(secretKey, {
    ...options,
    host: hostname,
    port: port || (scheme === 'http' ? 80 : 443),
    protocol: scheme,
  });
}

/** The one implementation of the gateway, on the processor's own client. */
export function createProcessorGateway(settings: GatewaySettings): PaymentGateway {
  const stripe = createClient(settings);
  const currency = settings.MARKET_CURRENCY.toLowerCase();
  const sumIn = (amounts: { amount: number; currency: string }[]): number =>
    amounts.filter((one) => one.currency === currency).reduce((sum, one) => sum + one.amount, 0);

  return {
    ...checkouts(stripe),
    ...transfersAndRefunds(stripe),
    ...accounts(stripe),
    async balance() {
      const { available, pending } = await asked(stripe.balance.retrieve());
      return { availableMinor: sumIn(available), pendingMinor: sumIn(pending) };
    },
    async *balanceTransactions(since) {
      const created = { gte: Math.floor(since.getTime() / 1000) };
      for await (const one of oldestFirst(stripe.balanceTransactions.list({ created, limit: 100 })))
        yield toBalanceTransaction(one);
    },
    async *events({ since, accountId }) {
      const created = { gte: Math.floor(since.getTime() / 1000) };
      for await (const one of oldestFirst(stripe.events.list({ created, limit: 100 }, asAccount(accountId))))
        yield { ...toEvent(one), accountId };
    },
    verifyEvent: (raw, signature) => verifyEvent(stripe, settings.PAYMENTS_WEBHOOK_SECRETS, { raw, signature }),
  };
}

const asAccount = (accountId: string | null): Stripe.RequestOptions => (accountId ? { stripeAccount: accountId } : {});

function verifyEvent(
  stripe: Stripe,
  secrets: string[],
  { raw, signature }: { raw: Buffer; signature: string },
): ProcessorEvent {
  for (const secret of secrets) {
    try {
      return toEvent(stripe.webhooks.constructEvent(raw, signature, secret));
    } catch (error) {
      if (!(error instanceof Stripe.errors.StripeSignatureVerificationError)) throw error;
    }
  }
  throw new AppError('request.invalid', 'The signature of this event is not right.');
}

type Sending = Pick<
  PaymentGateway,
  | 'createTransfer'
  | 'retrieveTransfer'
  | 'findTransfer'
  | 'createRefund'
  | 'retrieveRefund'
  | 'findRefund'
  | 'retrieveDispute'
>;

const transfersAndRefunds = (stripe: Stripe): Sending => ({
  async createTransfer({ dealId, reference, amountMinor, currency, accountId, chargeId, key }) {
    const params: Stripe.TransferCreateParams = {
      amount: amountMinor,
      currency: currency.toLowerCase(),
      destination: accountId,
      source_transaction: chargeId,
      transfer_group: dealId,
      metadata: { reference },
    };
    return toTransfer(await asked(stripe.transfers.create(params, { idempotencyKey: key })));
  },
  retrieveTransfer: async (transferId) => toTransfer(await asked(stripe.transfers.retrieve(transferId))),
  async findTransfer({ dealId, reference }) {
    const { data } = await asked(stripe.transfers.list({ transfer_group: dealId, limit: 100 }));
    return data.map(toTransfer).find((transfer) => transfer.reference === reference) ?? null;
  },
  async createRefund({ intentId, reference, amountMinor, key }) {
    const params = { payment_intent: intentId, amount: amountMinor, metadata: { reference } };
    return toRefund(await asked(stripe.refunds.create(params, { idempotencyKey: key })));
  },
  retrieveRefund: async (refundId) => toRefund(await asked(stripe.refunds.retrieve(refundId))),
  async findRefund({ intentId, reference }) {
    const { data } = await asked(stripe.refunds.list({ payment_intent: intentId, limit: 100 }));
    return data.map(toRefund).find((refund) => refund.reference === reference) ?? null;
  },
  retrieveDispute: async (disputeId) => toDispute(await asked(stripe.disputes.retrieve(disputeId))),
});

type Accounts = Pick<PaymentGateway, 'createAccount' | 'createAccountLink' | 'retrieveAccount' | 'retrievePayout'>;

const accounts = (stripe: Stripe): Accounts => ({
  async createAccount({ memberId, email, key }) {
    const params: Stripe.AccountCreateParams = {
      email,
      capabilities: { transfers: { requested: true } },
      controller: {
        stripe_dashboard: { type: 'express' },
        fees: { payer: 'application' },
        losses: { payments: 'application' },
      },
      metadata: { member_id: memberId },
    };
    const account = await asked(stripe.accounts.create(params, { idempotencyKey: key }));
    return { accountId: account.id };
  },
  async createAccountLink({ accountId, returnUrl, refreshUrl }) {
    const params: Stripe.AccountLinkCreateParams = {
      account: accountId,
      type: 'account_onboarding',
      return_url: returnUrl,
      refresh_url: refreshUrl,
    };
    // A link works once, so each press wants a new one.
    const { url } = await asked(
      stripe.accountLinks.create(params, { idempotencyKey: `account:${accountId}:link:${randomUUID()}` }),
    );
    return { url };
  },
  retrieveAccount: async (accountId) => toAccount(await asked(stripe.accounts.retrieve(accountId))),
  retrievePayout: async ({ payoutId, accountId }) =>
    toPayout(await asked(stripe.payouts.retrieve(payoutId, {}, asAccount(accountId)))),
});
