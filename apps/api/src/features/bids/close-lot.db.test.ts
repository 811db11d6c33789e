import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { placeBid as bid } from '../../../test/bidding.ts';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { addOpenLot } from '../../../test/open-lot.ts';
import { lapseAward } from './bids.commands.ts';
import { closeLot, sweepLots } from './close-lot.ts';

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

describe('closing', () => {
  test('waits for its time, sells at or above the reserve only, and tells the seller when nothing was sold', async () => {
    const early = await addOpenLot(market, { sellerId });
    await closeLot(market.world, early.id);
    expect((await lotRow(early.id)).state).toBe('open');
    const short = await addOpenLot(market, { sellerId, reserveMinor: 80_000, closesIn: '10 minutes' });
    const met = await addOpenLot(market, { sellerId, reserveMinor: 80_000, closesIn: '10 minutes' });
    await bid(anna, short.code, 79_999);
    await bid(anna, met.code, 85_000);
    await market.advance('11 minutes');
    await sweepLots(market.world);
    expect((await lotRow(short.id)).state).toBe('unsold');
    expect(await dealsOf(met.id)).toMatchObject([{ price_minor: '80000', buyer_id: anna.memberId }]);
    await market.work();
    expect(market.mails.map((mail) => mail.subject)).toContain(`${short.code} closed without a sale`);
  });
});

test('a lot that cannot be closed keeps no other from closing', async () => {
  const stuck = await addOpenLot(market, { sellerId, closesIn: '10 minutes' });
  const fine = await addOpenLot(market, { sellerId, closesIn: '11 minutes' });
  await bid(anna, stuck.code, 60_000);
  await bid(berta, fine.code, 60_000);
  await market.db.query('update lots set freight_minor = 99999999 where id = $1', [stuck.id]);
  await market.advance('12 minutes');
  await sweepLots(market.world);
  expect((await lotRow(fine.id)).state).toBe('awarded');
  await market.db.query('update lots set freight_minor = 0 where id = $1', [stuck.id]);
  await sweepLots(market.world);
  expect((await lotRow(stuck.id)).state).toBe('awarded');
});

describe('a winner who does not pay', () => {
  async function unpaid() {
    const lot = await addOpenLot(market, { sellerId, closesIn: '10 minutes' });
    const clara = await market.as(await addMember(market));
    await bid(clara, lot.code, 45_000);
    await bid(berta, lot.code, 60_000);
    await bid(anna, lot.code, 90_000);
    await market.advance('11 minutes');
    await closeLot(market.world, lot.id);
    await market.db.transaction(async (tx) => {
      await tx.query(`update deals set state = 'cancelled' where lot_id = $1`, [lot.id]);
      await lapseAward(tx, { lotId: lot.id });
    });
    return lot;
  }
  const answer = (caller: Caller, lotCode: string, accept: boolean) =>
    caller.call('POST /lots/:lotCode/offer-answer', { params: { lotCode }, body: { accept } });

  test('the under-bidder is offered the lot at the price without the defaulter, and may take it', async () => {
    const lot = await unpaid();
    expect((await berta.call('GET /my/bids')).body.rows[0]!.offer).toMatchObject({ priceMinor: 45_500 });
    expect((await answer(anna, lot.code, true)).status).toBe(404);
    const taken = await answer(berta, lot.code, true);
    expect(taken.body.dealCode).toMatch(/^D-/);
    expect(await dealsOf(lot.id)).toMatchObject([
      { state: 'cancelled' },
      { buyer_id: berta.memberId, price_minor: '45500', state: 'awaiting_payment' },
    ]);
    expect((await answer(berta, lot.code, true)).body).toEqual(taken.body);
    expect((await berta.call('GET /my/bids')).body.rows[0]).toMatchObject({ standing: 'highest', priceMinor: 45_500 });
    expect((await anna.call('GET /my/bids')).body.rows[0]).toMatchObject({ standing: 'outbid' });
  });

  test('refused or left for a day, the lot is unsold', async () => {
    const refused = await unpaid();
    expect((await answer(berta, refused.code, false)).body.dealCode).toBeNull();
    expect((await lotRow(refused.id)).state).toBe('unsold');
    await market.work();
    expect(market.mails.find(({ subject }) => subject.startsWith(`${refused.code} closed`))?.text).toContain(
      'The next bidder did not take it either.',
    );
    const left = await unpaid();
    await market.advance('25 hours');
    await sweepLots(market.world);
    expect((await lotRow(left.id)).state).toBe('unsold');
    const later = await market.as(berta.memberId!);
    expect((await answer(later, left.code, true)).status).toBe(404);
  });
});
