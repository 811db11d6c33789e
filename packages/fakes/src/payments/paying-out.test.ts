import type Stripe from 'stripe';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { failure, startTestMarket, until, type TestMarket } from './test-market.ts';

let market: TestMarket;
beforeAll(async () => void (market = await startTestMarket()));
afterAll(() => market.close());

const usd = (destination: string, amount: number, more: object = {}) => ({
  amount,
  currency: 'usd',
  destination,
  ...more,
});

describe('accounts', () => {
  test('wait for their set-up before transfers and payouts', async () => {
    const account = await market.stripe.accounts.create({
      controller: { stripe_dashboard: { type: 'express' } },
      capabilities: { transfers: { requested: true } },
      email: 'loft@sallowby.example',
      metadata: { member: 'm1' },
    });
    expect(account).toMatchObject({
      payouts_enabled: false,
      details_submitted: false,
      capabilities: { transfers: 'inactive' },
      metadata: { member: 'm1' },
    });
    expect(account.requirements?.currently_due).not.toEqual([]);
    const { charge } = await market.payIn(5_000, 'deal_early');
    const early = await failure(
      market.stripe.transfers.create(usd(account.id, 100, { source_transaction: charge.id })),
    );
    expect(early).toMatchObject({ statusCode: 400, code: 'insufficient_capabilities_for_transfer' });
    await market.control(`/accounts/${account.id}/complete`);
    const ready = await market.stripe.accounts.retrieve(account.id);
    expect(ready).toMatchObject({ payouts_enabled: true, capabilities: { transfers: 'active' } });
    expect(ready.requirements?.currently_due).toEqual([]);
    const capability = await market.stripe.accounts.retrieveCapability(account.id, 'transfers');
    expect(capability).toMatchObject({ object: 'capability', status: 'active', account: account.id });
    expect((await market.stripe.accounts.listCapabilities(account.id)).data).toHaveLength(1);
  });

  test('are complete at once with a bank account and accepted terms', async () => {
    const account = await market.stripe.accounts.create({
      type: 'custom',
      country: 'US',
      capabilities: { transfers: { requested: true } },
      external_account: {
        object: 'bank_account',
        country: 'US',
        currency: 'usd',
        routing_number: '110000000',
        account_number: '000123456789',
      },
      tos_acceptance: { date: 1_790_000_000, ip: '127.0.0.1' },
    });
    expect(account).toMatchObject({ payouts_enabled: true, capabilities: { transfers: 'active' } });
    expect(account.external_accounts?.data[0]).toMatchObject({ last4: '6789', routing_number: '110000000' });
  });
});

describe('a transfer', () => {
  test('draws on pending money of its charge and never on more than the charge', async () => {
    const seller = await market.onboarded();
    const { charge } = await market.payIn(90_500, 'deal_draw');
    const transfer = await market.stripe.transfers.create(
      usd(seller, 72_527, { source_transaction: charge.id, metadata: { settlement: 's1' } }),
    );
    expect(transfer).toMatchObject({
      object: 'transfer',
      destination: seller,
      source_transaction: charge.id,
      transfer_group: 'deal_draw',
      reversed: false,
      metadata: { settlement: 's1' },
    });
    const balance = await market.stripe.balance.retrieve({}, { stripeAccount: seller });
    expect(balance.pending).toMatchObject([{ amount: 72_527, currency: 'usd' }]);
    const more = await failure(
      market.stripe.transfers.create(usd(seller, 90_500 - 72_527 + 1, { source_transaction: charge.id })),
    );
    expect(more).toMatchObject({ statusCode: 400, code: 'balance_insufficient' });
    const found = await market.stripe.transfers.list({ transfer_group: 'deal_draw' });
    expect(found.data.map(({ id }) => id)).toEqual([transfer.id]);
    const payment = await market.stripe.charges.retrieve(
      transfer.destination_payment as string,
      {},
      { stripeAccount: seller },
    );
    expect(payment).toMatchObject({ amount: 72_527, source_transfer: transfer.id });
  });

  test('without a charge needs money that is available', async () => {
    const seller = await market.onboarded();
    const before = (await market.stripe.balance.retrieve()).available[0]!.amount;
    const error = await failure(market.stripe.transfers.create(usd(seller, before + 1)));
    expect(error.code).toBe('balance_insufficient');
    await market.payIn(10_000, 'deal_free', 'pm_card_bypassPending');
    const transfer = await market.stripe.transfers.create(usd(seller, before + 9_680));
    expect(transfer.source_transaction).toBeNull();
  });

  test('is taken back while the account still holds the money, not after its payout', async () => {
    const seller = await market.onboarded();
    const { charge } = await market.payIn(20_000, 'deal_back', 'pm_card_bypassPending');
    const transfer = await market.stripe.transfers.create(usd(seller, 15_000, { source_transaction: charge.id }));
    const reversal = await market.stripe.transfers.createReversal(transfer.id, { amount: 5_000 });
    expect(reversal).toMatchObject({ object: 'transfer_reversal', amount: 5_000, transfer: transfer.id });
    const after = await market.stripe.transfers.retrieve(transfer.id);
    expect(after).toMatchObject({ amount_reversed: 5_000, reversed: false });
    expect(after.reversals.data.map(({ id }) => id)).toEqual([reversal.id]);
    const tooMuch = await failure(market.stripe.transfers.createReversal(transfer.id, { amount: 10_001 }));
    expect(tooMuch.statusCode).toBe(400);
    await market.control('/clock', { advanceSeconds: 5 });
    expect((await market.stripe.payouts.list({}, { stripeAccount: seller })).data[0]?.amount).toBe(10_000);
    const gone = await failure(market.stripe.transfers.createReversal(transfer.id, {}));
    expect(gone.code).toBe('balance_insufficient');
    expect((await market.stripe.transfers.listReversals(transfer.id)).data).toHaveLength(1);
    expect(await market.stripe.transfers.retrieveReversal(transfer.id, reversal.id)).toMatchObject({ amount: 5_000 });
  });
});

describe('a payout', () => {
  test('follows by itself once the money is available, and lands', async () => {
    const seller = await market.onboarded();
    const { charge } = await market.payIn(20_000, 'deal_payout');
    await market.stripe.transfers.create(usd(seller, 15_000, { source_transaction: charge.id }));
    expect((await market.stripe.payouts.list({}, { stripeAccount: seller })).data).toEqual([]);
    await market.control('/clock', { advanceSeconds: 172_802 });
    const [payout] = (await market.stripe.payouts.list({}, { stripeAccount: seller })).data;
    expect(payout).toMatchObject({ object: 'payout', amount: 15_000, automatic: true, type: 'bank_account' });
    await market.control('/clock', { advanceSeconds: 2 });
    const landed = await market.stripe.payouts.retrieve(payout!.id, {}, { stripeAccount: seller });
    expect(landed.status).toBe('paid');
    const balance = await market.stripe.balance.retrieve({}, { stripeAccount: seller });
    expect(balance).toMatchObject({ available: [{ amount: 0 }], pending: [{ amount: 0 }] });
  });

  test('that the bank sends back returns the money', async () => {
    const seller = await market.onboarded();
    const { charge } = await market.payIn(20_000, 'deal_failing', 'pm_card_bypassPending');
    await market.control('/faults', { kind: 'payout_fail' });
    await market.stripe.transfers.create(usd(seller, 15_000, { source_transaction: charge.id }));
    await market.control('/clock', { advanceSeconds: 2 });
    await market.control('/clock', { advanceSeconds: 2 });
    const [payout] = (await market.stripe.payouts.list({}, { stripeAccount: seller })).data;
    expect(payout).toMatchObject({ status: 'failed', failure_code: 'account_closed' });
    const balance = await market.stripe.balance.retrieve({}, { stripeAccount: seller });
    expect(balance.available[0]?.amount).toBe(15_000);
  });

  test('of the market itself takes no more than is available and can be cancelled', async () => {
    await market.payIn(10_000, 'deal_fees', 'pm_card_bypassPending');
    const payout = await market.stripe.payouts.create({ amount: 1_000, currency: 'usd' });
    expect(payout).toMatchObject({ automatic: false, status: 'in_transit' });
    const { available } = await market.stripe.balance.retrieve();
    const error = await failure(market.stripe.payouts.create({ amount: available[0]!.amount + 1, currency: 'usd' }));
    expect(error.code).toBe('balance_insufficient');
    expect(await market.stripe.payouts.cancel(payout.id)).toMatchObject({ status: 'canceled' });
    expect((await market.stripe.balance.retrieve()).available[0]!.amount).toBe(available[0]!.amount + 1_000);
  });
});

describe('a refund', () => {
  test('gives back in parts, up to the charge and no further', async () => {
    const { intent, charge } = await market.payIn(10_000, 'deal_refund');
    const first = await market.stripe.refunds.create({ charge: charge.id, amount: 4_000, metadata: { deal: 'd' } });
    expect(first).toMatchObject({ object: 'refund', status: 'succeeded', amount: 4_000, payment_intent: intent.id });
    const tooMuch = await failure(market.stripe.refunds.create({ payment_intent: intent.id, amount: 6_001 }));
    expect(tooMuch.statusCode).toBe(400);
    await market.stripe.refunds.create({ payment_intent: intent.id });
    const after = await market.stripe.charges.retrieve(charge.id);
    expect(after).toMatchObject({ amount_refunded: 10_000, refunded: true });
    const again = await failure(market.stripe.refunds.create({ charge: charge.id }));
    expect(again.code).toBe('charge_already_refunded');
    const listed = await market.stripe.refunds.list({ payment_intent: intent.id });
    expect(listed.data.map(({ amount }) => amount)).toEqual([6_000, 4_000]);
    const transaction = await market.stripe.balanceTransactions.retrieve(first.balance_transaction as string);
    expect(transaction).toMatchObject({ amount: -4_000, fee: 0, net: -4_000, type: 'refund' });
  });

  test('that the bank sends back counts as not given', async () => {
    const { charge } = await market.payIn(10_000, 'deal_refund_fails', 'pm_card_refundFail');
    const refund = await market.stripe.refunds.create({ charge: charge.id, amount: 4_000 });
    await market.control('/clock', { advanceSeconds: 3 });
    const failed = await market.stripe.refunds.retrieve(refund.id);
    expect(failed).toMatchObject({ status: 'failed', failure_reason: 'expired_or_canceled_card' });
    expect(await market.stripe.charges.retrieve(charge.id)).toMatchObject({ amount_refunded: 0, refunded: false });
  });

  test('can take the transfer back with it', async () => {
    const seller = await market.onboarded();
    const { charge } = await market.payIn(10_000, 'deal_both');
    const transfer = await market.stripe.transfers.create(usd(seller, 8_000, { source_transaction: charge.id }));
    const refund = await market.stripe.refunds.create({ charge: charge.id, amount: 5_000, reverse_transfer: true });
    expect(refund.transfer_reversal).toMatch(/^trr_/);
    expect((await market.stripe.transfers.retrieve(transfer.id)).amount_reversed).toBe(5_000);
  });
});

describe('a dispute', () => {
  const disputeOf = async (charge: Stripe.Charge) => (await market.stripe.disputes.list({ charge: charge.id })).data[0];

  test('takes the amount and a fee; won gives back the amount', async () => {
    const { charge } = await market.payIn(10_000, 'deal_dispute', 'pm_card_createDispute');
    await until(async () => Boolean(await disputeOf(charge)));
    const dispute = (await disputeOf(charge))!;
    expect(dispute).toMatchObject({ status: 'needs_response', amount: 10_000, reason: 'fraudulent' });
    expect(dispute.balance_transactions[0]).toMatchObject({ amount: -10_000, fee: 1_500, net: -11_500 });
    const refund = await failure(market.stripe.refunds.create({ charge: charge.id }));
    expect(refund.code).toBe('charge_disputed');
    const evidence = { uncategorized_text: 'winning_evidence' };
    const won = await market.stripe.disputes.update(dispute.id, { evidence, submit: true });
    expect(won.status).toBe('won');
    expect(won.balance_transactions[1]).toMatchObject({ amount: 10_000, fee: 0 });
  });

  test('opened by hand and given up is lost', async () => {
    const { charge } = await market.payIn(10_000, 'deal_dispute_lost');
    await market.control(`/charges/${charge.id}/dispute`);
    const lost = await market.stripe.disputes.close((await disputeOf(charge))!.id);
    expect(lost.status).toBe('lost');
    expect(lost.balance_transactions).toHaveLength(1);
  });

  test('that is only an inquiry moves no money', async () => {
    const { charge } = await market.payIn(10_000, 'deal_inquiry', 'pm_card_createDisputeInquiry');
    await until(async () => Boolean(await disputeOf(charge)));
    const inquiry = (await disputeOf(charge))!;
    expect(inquiry).toMatchObject({ status: 'warning_needs_response', balance_transactions: [] });
    expect((await market.stripe.charges.retrieve(charge.id)).disputed).toBe(false);
  });
});
