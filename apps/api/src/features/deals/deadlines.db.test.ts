import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { addDeal, bringToReceipt, must, passDeadline, payIn, weighIn, type TestDeal } from '../../../test/deals.ts';
import { openMarket, type Market } from '../../../test/market.ts';
import { freezeDeal, releaseDeal } from './freeze-deal.commands.ts';
import { runDeadline, sweepDeadlines } from './deadlines.service.ts';
import { recordPaymentState } from './deals.commands.ts';

let market: Market;
beforeAll(async () => {
  market = await openMarket();
});
afterAll(() => market.close());
beforeEach(async () => {
  // Each test runs its own deals only.
  await market.db.query('update deals set due_at = null where due_at is not null');
});

const sweep = () => sweepDeadlines(market.world);
const miss = async (deal: TestDeal): Promise<void> => {
  await passDeadline(market, deal);
  await sweep();
};
const view = async (deal: TestDeal, side: 'seller' | 'buyer' = 'buyer') =>
  (await must((await deal[side]()).call('GET /deals/:dealCode', { params: { dealCode: deal.code } }))).body;
const dueAt = async (deal: TestDeal): Promise<Date> =>
  (await market.db.query('select due_at from deals where id = $1', [deal.id]))[0].due_at;
const noticesOf = async (memberId: string, kind: string): Promise<string[]> => {
  const rows: { subject: string }[] = await market.db.query(
    'select subject from notices where member_id = $1 and kind = $2 order by created_at',
    [memberId, kind],
  );
  return rows.map(({ subject }) => subject);
};
const hold = async (deal: TestDeal): Promise<number> => {
  const rows: { balance: number }[] = await market.db.query(
    'select balance::int from ledger_accounts where code = $1',
    [`hold.deal:${deal.code}`],
  );
  return rows[0]!.balance;
};

describe('missed deadlines', () => {
  test('not paid: the deal is cancelled, the lot goes on to the under-bidder or is unsold', async () => {
    const deal = await addDeal(market);
    await miss(deal);
    expect(await view(deal)).toMatchObject({ state: 'cancelled', due: null, actions: [] });
    expect((await view(deal)).chain.map(({ title }) => title)).toEqual(['Awarded', 'Cancelled']);
    expect((await market.db.query('select state from lots where id = $1', [deal.lotId]))[0].state).toBe('unsold');
    expect(await noticesOf(deal.buyerId, 'pay_missed')).toHaveLength(1);
  });

  test('a payment that comes after that goes back whole', async () => {
    const deal = await addDeal(market);
    await miss(deal);
    expect(await payIn(market, deal)).toBe('refunded');
    expect((await view(deal)).counterparty).toBeNull();
    expect((await view(deal, 'seller')).counterparty).toBeNull();
    expect(await hold(deal)).toBe(0);
    const refunds: unknown[] = await market.db.query(
      'select amount_minor::int, state from refunds where deal_id = $1',
      [deal.id],
    );
    expect(refunds).toEqual([{ amount_minor: 93_600, state: 'queued' }]);
  });

  test('not dispatched: the buyer may cancel and has everything back', async () => {
    const deal = await addDeal(market);
    await payIn(market, deal);
    await miss(deal);
    const late = await view(deal);
    expect(late).toMatchObject({ state: 'held', actions: ['cancel_late'], due: null });
    expect((await view(deal, 'seller')).actions).toEqual(['dispatch']);
    const params = { dealCode: deal.code };
    const cancelled = await must((await deal.buyer()).call('POST /deals/:dealCode/cancel', { params }));
    expect(cancelled.body).toMatchObject({ state: 'cancelled', settlement: null });
    expect(await hold(deal)).toBe(0);
    const rows = await market.db.query('select amount_minor::int as minor from refunds where deal_id = $1', [deal.id]);
    expect(rows).toEqual([{ minor: 93_600 }]);
  });

  test('not received: it stays, and the desk takes it up', async () => {
    const deal = await addDeal(market);
    await payIn(market, deal);
    const params = { dealCode: deal.code };
    const body = { carrier: 'Dunnowick Carriers', trackingCode: '1234' };
    await must((await deal.seller()).call('POST /deals/:dealCode/dispatch', { params, body }));
    await miss(deal);
    expect(await view(deal)).toMatchObject({ state: 'dispatched', actions: ['receive'] });
    expect((await view(deal)).events.at(-1)?.title).toBe('Did not arrive in time');
    expect(await noticesOf(deal.sellerId, 'receipt_missed')).toHaveLength(1);
  });

  test('a weigh-in that comes too late is refused, whether or not the clock’s own step has run', async () => {
    const deal = await addDeal(market);
    await bringToReceipt(market, deal);
    await passDeadline(market, deal);
    expect((await weighIn(deal, 11_000)).problem).toMatchObject({
      code: 'deal.wrong_state',
      detail: expect.stringContaining('the declared mass stands'),
    });
    await sweep();
    expect((await view(deal)).weighIn).toMatchObject({ netG: 12_400 });
  });

  test('not weighed in: the declared mass stands, and the claim days end it', async () => {
    const deal = await addDeal(market);
    await bringToReceipt(market, deal);
    await miss(deal);
    const weighed = await view(deal);
    expect(weighed.weighIn).toMatchObject({ netG: 12_400, differenceG: 0, claimableMinor: 0, photos: [] });
    expect(weighed.actions).toEqual(['accept']);
    await miss(deal);
    expect(await view(deal)).toMatchObject({ state: 'settled', settlement: { valueMinor: 90_000 } });
  });

  test('not countersigned and not accepted: the weigh-in stands, then the claim days are over and it settles', async () => {
    const deal = await addDeal(market);
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 11_160));
    await miss(deal);
    expect(await view(deal)).toMatchObject({ state: 'weighed_in', due: { what: 'Accept the delivery, or claim' } });
    await miss(deal);
    const settled = await view(deal);
    expect(settled).toMatchObject({ state: 'settled', settlement: { valueMinor: 90_000, refundMinor: 0 } });
    expect(settled.events.at(-2)?.detail).toBe('The days for a claim are over; the time to countersign is over');
  });

  test('accepted and not countersigned: it settles when the seller’s time is over', async () => {
    const deal = await addDeal(market);
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 12_400));
    const params = { dealCode: deal.code };
    await must((await deal.buyer()).call('POST /deals/:dealCode/accept', { params }));
    await miss(deal);
    expect((await view(deal)).state).toBe('settled');
  });

  test('a claim not answered goes to the desk; the seller may still accept it', async () => {
    const deal = await addDeal(market);
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 11_160));
    const params = { dealCode: deal.code };
    await must((await deal.buyer()).call('POST /deals/:dealCode/claim', { params, body: { ground: 'mass' } }));
    await miss(deal);
    expect(await view(deal, 'seller')).toMatchObject({ state: 'in_dispute', due: null, actions: ['accept_claim'] });
  });
});

describe('a deadline', () => {
  test('rung early, late or twice is run once', async () => {
    const deal = await addDeal(market);
    await payIn(market, deal);
    await runDeadline(market.world, deal.id);
    expect((await view(deal)).events).toHaveLength(2);
    await passDeadline(market, deal);
    await Promise.all([1, 2, 3].map(() => runDeadline(market.world, deal.id)));
    await sweep();
    expect((await view(deal)).events.map(({ title }) => title)).toEqual([
      'Awarded',
      'Paid into hold',
      'Not handed over in time',
    ]);
  });

  test('reminds whose duty it is at half time and a day before, once each', async () => {
    const deal = await addDeal(market);
    await payIn(market, deal);
    const ends = await dueAt(deal);
    const goTo = async (before: string): Promise<void> => {
      await market.owner.query(
        `update market_clock set shift = shift + ($1::timestamptz - $2::interval) - market_now() + interval '1 second'`,
        [ends, before],
      );
      await runDeadline(market.world, deal.id);
      await runDeadline(market.world, deal.id);
    };
    await runDeadline(market.world, deal.id);
    expect(await noticesOf(deal.sellerId, 'deadline')).toEqual([]);
    await goTo('30 hours');
    expect(await noticesOf(deal.sellerId, 'deadline')).toHaveLength(1);
    await goTo('24 hours');
    expect(await noticesOf(deal.sellerId, 'deadline')).toEqual([
      expect.stringContaining(`${deal.code}: hand the lot over for delivery by`),
      expect.stringContaining('18:00'),
    ]);
    expect(await noticesOf(deal.buyerId, 'deadline')).toEqual([]);
  });

  test('stands still while a bank debit is on its way, and goes on with what was left', async () => {
    const deal = await addDeal(market);
    const before = await dueAt(deal);
    const tell = (state: 'processing' | 'failed') =>
      market.db.transaction((tx) => recordPaymentState(tx, { dealId: deal.id, state }));
    await tell('processing');
    await market.advance('6 days');
    await sweep();
    expect(await view(deal)).toMatchObject({ state: 'awaiting_payment', due: null });
    await tell('failed');
    const after = await dueAt(deal);
    expect(Math.round((after.getTime() - before.getTime()) / 60_000)).toBe(6 * 24 * 60);
    await miss(deal);
    expect((await view(deal)).state).toBe('cancelled');
  });

  test('stands still while the deal is frozen, the claim days too', async () => {
    const deal = await addDeal(market);
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 11_160));
    await market.db.transaction((tx) => freezeDeal(tx, { dealId: deal.id }));
    await market.advance('30 days');
    await sweep();
    expect((await view(deal)).state).toBe('weighed_in');
    await market.db.transaction((tx) => releaseDeal(tx, { dealId: deal.id }));
    expect((await view(deal)).actions).toEqual(['accept', 'claim_mass']);
  });

  test('never ends later than day 80 of the hold', async () => {
    const deal = await addDeal(market);
    await bringToReceipt(market, deal);
    await market.db.query(`update deals set paid_at = market_now() - interval '79 days' where id = $1`, [deal.id]);
    await must(weighIn(deal, 12_400));
    const rows = await market.db.query(
      `select claim_ends_at < market_now() + interval '4 days 12 hours' as capped, claim_ends_at = countersign_ends_at as together from weigh_ins where deal_id = $1`,
      [deal.id],
    );
    expect(rows).toEqual([{ capped: true, together: true }]);
  });
});
