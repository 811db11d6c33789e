import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { placeBid as bid } from '../../../test/bidding.ts';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { addOpenLot } from '../../../test/open-lot.ts';
import { stepMinor } from './bids.rules.ts';
import { closeLot } from './close-lot.ts';

let market: Market;
let sellerId: string;
let anna: Caller;
let berta: Caller;
beforeAll(async () => {
  market = await openMarket({ env: { LIMITS: 'off' } });
  sellerId = await addMember(market, { roles: ['seller'] });
});
beforeEach(async () => {
  anna = await market.as(await addMember(market));
  berta = await market.as(await addMember(market));
  market.mails.length = 0;
});
afterAll(() => market.close());

const lotRow = async (id: string) => (await market.db.query('select * from lots where id = $1', [id]))[0];
const dealsOf = (lotId: string) =>
  market.db.query('select * from deals where lot_id = $1 order by awarded_at', [lotId]);

describe('placing', () => {
  test('first bid stands at the start price; a higher ceiling takes the lead and the earlier leader is told by mail', async () => {
    const lot = await addOpenLot(market, { sellerId });
    expect((await bid(anna, lot.code, 62_000)).body).toMatchObject({
      standing: 'highest',
      priceMinor: 40_000,
      ceilingMinor: 62_000,
    });
    expect((await bid(berta, lot.code, 50_000)).body).toMatchObject({ standing: 'outbid', priceMinor: 50_500 });
    expect((await bid(berta, lot.code, 70_000)).body).toMatchObject({ standing: 'highest', priceMinor: 62_500 });
    await market.work();
    expect(market.mails.map((mail) => mail.subject)).toEqual([`Outbid on ${lot.code}, Server memory, DDR3 registered`]);
    const mine = (await anna.call('GET /my/bids')).body;
    expect(mine.rows).toMatchObject([
      { lotCode: lot.code, standing: 'outbid', ceilingMinor: 62_000, priceMinor: 62_500, leastNextMinor: 63_000 },
    ]);
    expect(mine.ifAllWonMinor).toBe(0);
  });

  test('the same attempt twice is one bid with one answer', async () => {
    const lot = await addOpenLot(market, { sellerId });
    const attempt = randomUUID();
    const answers = await Promise.all([
      bid(anna, lot.code, 60_000, attempt),
      bid(anna, lot.code, 60_000, attempt),
      bid(anna, lot.code, 60_000, attempt),
    ]);
    expect(answers.map((one) => one.status)).toEqual([201, 201, 201]);
    expect((await lotRow(lot.id)).seq).toBe(1);
  });

  test('an attempt belongs to its lot, with bids and with asking prices', async () => {
    const [one, two] = [await addOpenLot(market, { sellerId }), await addOpenLot(market, { sellerId })];
    const asking = await addOpenLot(market, { sellerId, askingMinor: 90_000 });
    const attempt = randomUUID();
    expect((await bid(anna, one.code, 60_000, attempt)).status).toBe(201);
    expect((await bid(anna, two.code, 60_000, attempt)).problem).toMatchObject({
      code: 'request.invalid',
      fields: [{ path: 'attempt' }],
    });
    const taken = await anna.call('POST /lots/:lotCode/take', {
      params: { lotCode: asking.code },
      body: { priceMinor: 90_000, attempt },
    });
    expect(taken.problem.code).toBe('request.invalid');
    expect((await lotRow(two.id)).seq).toBe(0);
  });

  test('an amount that no payment could carry with freight and fee is refused', async () => {
    const rich = await market.as(await addMember(market, { limitMinor: 99_999_999 }));
    const lot = await addOpenLot(market, { sellerId });
    expect((await bid(rich, lot.code, 99_000_000)).problem).toMatchObject({
      code: 'bid.over_limit',
      context: { mostMinor: 99_999_999 },
    });
    const heavy = await addOpenLot(market, { sellerId, askingMinor: 90_000 });
    await market.db.query('update lots set freight_minor = 99999999 where id = $1', [heavy.id]);
    const taken = await rich.call('POST /lots/:lotCode/take', {
      params: { lotCode: heavy.code },
      body: { priceMinor: 90_000, attempt: randomUUID() },
    });
    expect(taken.problem.code).toBe('bid.over_limit');
  });

  test('refusals name their reason and write nothing', async () => {
    const lot = await addOpenLot(market, { sellerId });
    const closed = await addOpenLot(market, { sellerId, closesIn: '-1 second' });
    const asking = await addOpenLot(market, { sellerId, askingMinor: 90_000 });
    const both = await market.as(await addMember(market, { roles: ['seller', 'buyer'] }));
    const own = await addOpenLot(market, { sellerId: both.memberId! });
    const low = await bid(anna, lot.code, 39_999);
    expect(low.problem).toMatchObject({
      code: 'bid.below_least',
      context: { leastNextMinor: 40_000 },
      fields: [{ path: 'ceilingMinor' }],
    });
    expect((await bid(anna, closed.code, 50_000)).problem.code).toBe('lot.closed');
    expect((await bid(anna, asking.code, 95_000)).problem.code).toBe('lot.wrong_state');
    expect((await bid(both, own.code, 50_000)).problem.code).toBe('lot.own');
    expect((await bid(anna, 'L-999999', 50_000)).problem.code).toBe('lot.not_found');
    expect((await bid(market.visitor(), lot.code, 50_000)).status).toBe(401);
    for (const amount of [-1, 0, 1.5, 100_000_000, 2 ** 53, Number.NaN])
      expect((await bid(anna, lot.code, amount)).status).toBe(400);
    expect((await lotRow(lot.id)).seq).toBe(0);
  });

  test('a ceiling that does not fit the limit is refused; ceilings led and unpaid awards count, an own ceiling replaced does not', async () => {
    const small = await market.as(await addMember(market, { limitMinor: 100_000 }));
    const one = await addOpenLot(market, { sellerId });
    const two = await addOpenLot(market, { sellerId });
    expect((await bid(small, one.code, 70_000)).status).toBe(201);
    expect((await bid(small, two.code, 40_000)).problem).toMatchObject({
      code: 'bid.over_limit',
      status: 403,
      context: { roomMinor: 30_000 },
    });
    expect((await bid(small, one.code, 100_000)).status).toBe(201);
    expect((await small.call('GET /my/bids')).body.roomMinor).toBe(0);
    const parallel = await market.as(await addMember(market, { limitMinor: 100_000 }));
    const lots = await Promise.all(Array.from({ length: 6 }, () => addOpenLot(market, { sellerId })));
    const answers = await Promise.all(lots.map((lot) => bid(parallel, lot.code, 60_000)));
    expect(answers.filter((answer) => answer.status === 201)).toHaveLength(1);
  });

  test('a bid in the last five minutes moves the close, never past two hours after the first', async () => {
    const lot = await addOpenLot(market, { sellerId, closesIn: '3 minutes' });
    await bid(anna, lot.code, 60_000);
    const row = await lotRow(lot.id);
    expect(row.closes_at.getTime() - row.first_closes_at.getTime()).toBeGreaterThan(110_000);
    await market.db.query(`update lots set latest_closes_at = closes_at + interval '1 second' where id = $1`, [lot.id]);
    const capped = await lotRow(lot.id);
    await market.advance('2 minutes');
    await bid(berta, lot.code, 80_000);
    expect((await lotRow(lot.id)).closes_at).toEqual(capped.latest_closes_at);
  });
});

describe('forty bidders and four closers at once', () => {
  test('leave one right winner', async () => {
    const lot = await addOpenLot(market, { sellerId, closesIn: '20 minutes' });
    const bidders = await Promise.all(Array.from({ length: 40 }, async () => market.as(await addMember(market))));
    const rounds = bidders.map(async (bidder, i) => {
      for (const round of [0, 1, 2])
        await bid(bidder, lot.code, 40_000 + ((i * 7919 + round * 104_729) % 90_000) + round * 50_000);
    });
    await Promise.all(rounds);
    await market.advance('3 hours');
    await Promise.all([1, 2, 3, 4].map(() => closeLot(market.world, lot.id)));

    const bids = await market.db.query(
      'select seq, bidder_id, ceiling_minor::int as ceiling, price_after_minor::int as price, leader_after, placed_at, closes_after from bids where lot_id = $1 order by seq',
      [lot.id],
    );
    expect(bids.length).toBeGreaterThan(10);
    expect(bids.map((row: { seq: number }) => row.seq)).toEqual(bids.map((_: unknown, i: number) => i + 1));
    const best = new Map<string, { ceiling: number; seq: number }>();
    let price = 0;
    for (const row of bids) {
      if (row.ceiling > (best.get(row.bidder_id)?.ceiling ?? 0)) best.set(row.bidder_id, row);
      const ranked = [...best].sort(([, a], [, b]) => b.ceiling - a.ceiling || a.seq - b.seq);
      const next = ranked[1]?.[1].ceiling ?? 0;
      expect(row.leader_after).toBe(ranked[0]![0]);
      expect(row.price).toBeGreaterThanOrEqual(price);
      expect(row.price).toBeLessThanOrEqual(ranked[0]![1].ceiling);
      expect(row.price).toBeLessThanOrEqual(Math.max(40_000, next + stepMinor(next)));
      expect(row.placed_at < row.closes_after).toBe(true);
      price = row.price;
    }
    const deals = await dealsOf(lot.id);
    const winner = [...best].sort(([, a], [, b]) => b.ceiling - a.ceiling || a.seq - b.seq)[0]!;
    expect(deals).toHaveLength(1);
    expect(deals[0]).toMatchObject({ buyer_id: winner[0], price_minor: String(price), state: 'awaiting_payment' });
    expect((await lotRow(lot.id)).state).toBe('awarded');
  });
});

describe('asking price', () => {
  const take = (caller: Caller, lotCode: string, priceMinor: number, attempt = randomUUID()) =>
    caller.call('POST /lots/:lotCode/take', { params: { lotCode }, body: { priceMinor, attempt } });

  test('the first of many buyers has the lot', async () => {
    const lot = await addOpenLot(market, { sellerId, askingMinor: 90_000 });
    const buyers = await Promise.all(Array.from({ length: 12 }, async () => market.as(await addMember(market))));
    const answers = await Promise.all(buyers.map((buyer) => take(buyer, lot.code, 90_000)));
    expect(answers.filter((answer) => answer.status === 201)).toHaveLength(1);
    expect(answers.filter((answer) => answer.problem?.code === 'lot.closed')).toHaveLength(11);
    expect(await dealsOf(lot.id)).toHaveLength(1);
  });

  test('is taken only at the price the buyer saw, and once per attempt', async () => {
    const lot = await addOpenLot(market, { sellerId, askingMinor: 90_000 });
    expect((await take(anna, lot.code, 89_999)).problem).toMatchObject({
      code: 'lot.price_changed',
      context: { priceMinor: 90_000 },
    });
    const attempt = randomUUID();
    const first = await take(anna, lot.code, 90_000, attempt);
    expect((await take(anna, lot.code, 90_000, attempt)).body).toEqual(first.body);
  });
});

test('terms are kept per buyer', async () => {
  const first = (await anna.call('GET /my/terms')).body;
  const changed = { ...first, recoveryYield: 0.88, batchCostMinor: 4500 };
  expect((await anna.call('PUT /my/terms', { body: changed })).body).toEqual(changed);
  expect((await anna.call('GET /my/terms')).body).toEqual(changed);
  expect((await berta.call('GET /my/terms')).body).toEqual(first);
});

test('more than sixty bids in a minute are slowed down', async () => {
  const braked = await openMarket({ env: { LIMITS: 'on' } });
  try {
    const caller = await braked.as(await addMember(braked));
    const lot = await addOpenLot(braked, { sellerId: await addMember(braked, { roles: ['seller'] }) });
    const statuses = [];
    for (let i = 0; i <= 60; i += 1) statuses.push((await bid(caller, lot.code, 40_000 + i)).status);
    expect(statuses.slice(0, 60).every((status) => status === 201)).toBe(true);
    expect(statuses[60]).toBe(429);
  } finally {
    await braked.close();
  }
});
