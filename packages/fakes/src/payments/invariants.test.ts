import fc from 'fast-check';
import type Stripe from 'stripe';
import { expect, test } from 'vitest';
import { startTestMarket, type TestMarket } from './test-market.ts';

type Step =
  | { do: 'pay'; amount: number; atOnce: boolean }
  | { do: 'transfer' | 'refund' | 'reverse' | 'dispute'; which: number; amount: number }
  | { do: 'wait'; seconds: number };

const amount = fc.integer({ min: 50, max: 20_000 });
const which = fc.nat(9);
const step: fc.Arbitrary<Step> = fc.oneof(
  fc.record({ do: fc.constant('pay' as const), amount, atOnce: fc.boolean() }),
  fc.record({ do: fc.constantFrom('transfer' as const, 'refund' as const), which, amount }),
  fc.record({ do: fc.constantFrom('reverse' as const, 'dispute' as const), which, amount }),
  fc.record({ do: fc.constant('wait' as const), seconds: fc.constantFrom(1, 5, 200_000) }),
);

/** Does one step; what the processor refuses is a right answer too. */
async function take(market: TestMarket, seller: string, taken: Step): Promise<void> {
  const { stripe } = market;
  if (taken.do === 'wait') return void (await market.control('/clock', { advanceSeconds: taken.seconds }));
  if (taken.do === 'pay') {
    return void (await market.payIn(taken.amount, 'deal', taken.atOnce ? 'pm_card_bypassPending' : 'pm_card_visa'));
  }
  const pick = <T extends { id: string }>(list: Stripe.ApiList<T>) =>
    list.data[taken.which % list.data.length]?.id ?? 'none';
  const charge = pick(await stripe.charges.list({ limit: 100 }));
  const order = { amount: taken.amount, currency: 'usd', destination: seller };
  const run = {
    transfer: () => stripe.transfers.create({ ...order, ...(taken.which % 3 > 0 && { source_transaction: charge }) }),
    refund: () => stripe.refunds.create({ charge, amount: taken.amount }),
    reverse: async () =>
      stripe.transfers.createReversal(pick(await stripe.transfers.list({ limit: 100 })), { amount: taken.amount }),
    dispute: () => market.control(`/charges/${charge}/dispute`),
  }[taken.do];
  await run().catch(() => undefined);
}

const sum = (numbers: number[]) => numbers.reduce((total, number) => total + number, 0);

async function assertSound(market: TestMarket, owners: (string | undefined)[]): Promise<void> {
  const { stripe } = market;
  for (const owner of owners) {
    const as = owner ? { stripeAccount: owner } : {};
    const all = await stripe.balanceTransactions.list({ limit: 100 }, as).autoPagingToArray({ limit: 1_000 });
    expect(all.every(({ net, amount: gross, fee }) => net === gross - fee)).toBe(true);
    const balance = await stripe.balance.retrieve({}, as);
    const ofStatus = (status: string) => sum(all.flatMap((item) => (item.status === status ? [item.net] : [])));
    expect(sum(balance.available.map((part) => part.amount))).toBe(ofStatus('available'));
    expect(sum(balance.pending.map((part) => part.amount))).toBe(ofStatus('pending'));
    // Fees and chargebacks may take the market's own balance below nothing; a seller's has none of them.
    const least = owner ? 0 : Number.NEGATIVE_INFINITY;
    expect(sum(balance.available.map((part) => part.amount))).toBeGreaterThanOrEqual(least);
  }
  const transfers = await stripe.transfers.list({ limit: 100 }).autoPagingToArray({ limit: 1_000 });
  const refunds = await stripe.refunds.list({ limit: 100 }).autoPagingToArray({ limit: 1_000 });
  const charges = await stripe.charges.list({ limit: 100 }).autoPagingToArray({ limit: 1_000 });
  for (const charge of charges) {
    const drawn = transfers.filter((transfer) => transfer.source_transaction === charge.id);
    expect(sum(drawn.map((transfer) => transfer.amount - transfer.amount_reversed))).toBeLessThanOrEqual(charge.amount);
    const given = sum(refunds.filter((refund) => refund.charge === charge.id).map((refund) => refund.amount));
    expect(given).toBe(charge.amount_refunded);
    expect(given).toBeLessThanOrEqual(charge.amount_captured);
  }
  for (const transfer of transfers) {
    const { data } = await stripe.transfers.listReversals(transfer.id, { limit: 100 });
    expect(sum(data.map((reversal) => reversal.amount))).toBe(transfer.amount_reversed);
    expect(transfer.amount_reversed).toBeLessThanOrEqual(transfer.amount);
  }
}

test('whatever is asked in whatever order, balances are the sums of their transactions and nothing is overdrawn', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(step, { minLength: 5, maxLength: 25 }), async (steps) => {
      const market = await startTestMarket();
      try {
        const seller = await market.onboarded();
        for (const taken of steps) await take(market, seller, taken);
        await assertSound(market, [undefined, seller]);
        await market.close();
        const reopened = await startTestMarket({ dir: market.dir });
        try {
          await assertSound(reopened, [undefined, seller]);
        } finally {
          await reopened.close();
        }
      } catch (error) {
        await market.close().catch(() => undefined);
        throw error;
      }
    }),
    { numRuns: 12 },
  );
}, 60_000);
