import { estimateLot, type Estimate, type LotInput } from '@lydite/valuation';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { addMember } from '../../../test/factories.ts';
import { addDraft, addListedLot, addPrice, addSeller } from '../../../test/listed-lots.ts';
import { completeDraft, lineOf } from '../../../test/lot-drafts.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { catalogueVersion } from '../catalogue/catalogue.reads.ts';
import { lineShares, lotHeadline } from './lots.reads.ts';

let market: Market;
let seller: Caller;
beforeAll(async () => {
  market = await openMarket({ env: { LIMITS: 'on' } });
  await addPrice(market);
  seller = await addSeller(market);
});
afterAll(() => market.close());

const list = (lotCode: string, version: number) =>
  seller.call('POST /my/lots/:lotCode/list', { params: { lotCode }, body: { version } });
const movePrices = (by: string) => market.db.query('update reference_prices set at = at + $1::interval', [by]);
const idOf = async (lotCode: string): Promise<string> => {
  const [row] = await market.db.query('select id from lots where code = $1', [lotCode]);
  return row.id;
};

test('nothing is listed while there is no gold price to freeze', async () => {
  await movePrices('1 hour');
  const { lotCode, version } = await addDraft(seller);
  const { status, problem } = await list(lotCode, version);
  expect([status, problem.code]).toEqual([503, 'price.unavailable']);
  await movePrices('-1 hour');
  expect((await list(lotCode, version)).status).toBe(200);
});

test('an incomplete draft stays a draft and says what is missing', async () => {
  const { lotCode, version } = await addDraft(seller, { lines: [lineOf({ massG: null })] });
  const { status, problem } = await list(lotCode, version);
  expect([status, problem.code]).toEqual([422, 'lot.incomplete']);
  expect(problem.fields).toEqual([
    { path: 'lines.0.massG', message: 'Enter the net mass of DDR3 registered, double-sided.' },
  ]);
  expect(problem.context?.missing).toEqual([{ part: 'weight', ...problem.fields[0] }]);
  const { body } = await seller.call('GET /my/lots/:lotCode', { params: { lotCode } });
  expect([body.state, body.version]).toEqual(['draft', version]);
  expect(await market.db.query('select 1 from estimates where lot_id = $1', [await idOf(lotCode)])).toEqual([]);
});

test('only the version the seller has read is listed, and only once', async () => {
  const { lotCode, version } = await addDraft(seller);
  expect((await list(lotCode, version - 1)).problem.code).toBe('lot.changed');
  const twice = await Promise.all([list(lotCode, version), list(lotCode, version)]);
  expect(twice.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 409]);
});

test('listing fixes the lot, sets its close on a full hour and the alarm for it', async () => {
  const { lotCode, version } = await addDraft(seller, {
    lines: [
      lineOf(),
      lineOf({ label: '', classCode: 'network-boards', massG: 600.5, massEvidence: 'stated', pieces: null }),
    ],
    sale: { form: 'open-bids', startMinor: 40_000, reserveMinor: 90_000, askingMinor: 123, days: 3 },
  });
  const { body } = await list(lotCode, version);
  expect(body).toMatchObject({ state: 'open', missing: [], bidders: 0, priceMinor: null, reserveReached: false });
  const closesAt = new Date(body.closesAt!);
  const openedFor = (closesAt.getTime() - new Date(body.listedAt!).getTime()) / 3_600_000;
  expect(closesAt.toISOString()).toMatch(/:00:00\.000Z$/);
  expect(openedFor).toBeGreaterThanOrEqual(71);
  expect(openedFor).toBeLessThan(74);

  const lotId = await idOf(lotCode);
  const [row] = await market.db.query(
    `select mass_g::float8, mass_evidence, pieces, class_codes, asking_minor, first_closes_at, latest_closes_at, cover_photo_id from lots where id = $1`,
    [lotId],
  );
  expect(row).toEqual({
    mass_g: 13_000.5,
    mass_evidence: 'stated',
    pieces: null,
    class_codes: ['memory-modules', 'network-boards'],
    asking_minor: null,
    first_closes_at: closesAt,
    latest_closes_at: new Date(closesAt.getTime() + 2 * 3_600_000),
    cover_photo_id: body.photos[0]!.id,
  });
  expect(
    await market.db.query(`select payload from outbox where key like 'alarm:lot.close:' || $1 || '%'`, [lotId]),
  ).toEqual([{ payload: { job: 'lot.close', objectId: lotId, at: closesAt.toISOString() } }]);
  const shares = await lineShares(market.db.manager, lotId);
  expect(shares.map(({ label, massG }) => [label, massG])).toEqual([
    ['DDR3 registered, double-sided', 12_400],
    ['Network equipment boards', 600.5],
  ]);
  expect(shares.reduce((sum, line) => sum + line.massShareOfGold, 0)).toBeCloseTo(1, 12);
  expect(shares[0]!.massShareOfGold).toBeGreaterThan(0.9);
  expect(await lotHeadline(market.db.manager, lotId)).toMatchObject({
    code: lotCode,
    massG: 13_000.5,
    freightMinor: 1800,
  });
});

test('a frozen estimate can be computed again from what is kept with it', async () => {
  const lotCode = await addListedLot(seller);
  const [row]: {
    input: LotInput;
    result: Estimate;
    seed: number;
    draws: number;
    catalogueVersion: string;
    price: string;
  }[] = await market.db.query(
    `select input, result, seed, draws, catalogue_version as "catalogueVersion", p.per_gram_minor::text as price
         from estimates e join reference_prices p on p.id = e.reference_price_id where lot_id = $1`,
    [await idOf(lotCode)],
  );
  const { input, result, seed, draws, catalogueVersion: version, price } = row!;
  const catalogue = await catalogueVersion(market.db.manager, version);
  const again = estimateLot(input, catalogue!, { seed, draws });
  expect(again).toEqual(result);
  expect(result.goldG.quantiles.p50).toBeGreaterThan(1);
  expect(price).toBe('13000.0000');
  const { body } = await market.visitor().call('GET /lots/:lotCode', { params: { lotCode } });
  expect(body.estimate).toEqual(again);
});

test('an unlikely mass per piece and a declared hazard do not stop a lot; the desk finds a note', async () => {
  const lotCode = await addListedLot(seller, {
    lines: [lineOf({ massG: 124_000 })],
    declarations: { ...completeDraft().declarations, mercuryOrBeryllium: 'present', hazardNote: 'Line 1, relays' },
  });
  const [row] = await market.db.query('select state, review_reason from lots where code = $1', [lotCode]);
  expect(row.state).toBe('open');
  expect(row.review_reason).toMatch(/each\..*Declared hazard: Line 1, relays/);
});

test('a lot is withdrawn before its first bid, not after it, nor after its close', async () => {
  const one = await addSeller(market);
  const withdraw = (lotCode: string) => one.call('POST /my/lots/:lotCode/withdraw', { params: { lotCode } });
  const lotCode = await addListedLot(one);
  expect((await withdraw(lotCode)).body).toMatchObject({ state: 'withdrawn', code: lotCode });
  expect((await withdraw(lotCode)).problem.code).toBe('lot.wrong_state');

  const closed = await addListedLot(one);
  await market.db.query('update lots set closes_at = market_now() where code = $1', [closed]);
  expect((await withdraw(closed)).problem.code).toBe('lot.wrong_state');

  const bidOn = await addListedLot(one);
  const buyer = await market.as(await addMember(market));
  const bid = { ceilingMinor: 50_000, attempt: '5f0d2c86-0a55-4b3c-9d0e-0d4e6a3d7f11' };
  const placed = await buyer.call('POST /lots/:lotCode/bids', { params: { lotCode: bidOn }, body: bid });
  expect(placed.status).toBe(201);
  const refused = await withdraw(bidOn);
  expect([refused.status, refused.problem.code]).toEqual([409, 'lot.wrong_state']);
});

test('the eleventh lot within an hour is refused, and can be listed later', async () => {
  const one = await addSeller(market);
  for (let n = 0; n < 10; n += 1) await addListedLot(one);
  const { lotCode, version } = await addDraft(one);
  const order = { params: { lotCode }, body: { version } };
  const eleventh = await one.call('POST /my/lots/:lotCode/list', order);
  expect([eleventh.status, eleventh.problem.code]).toEqual([429, 'request.too_many']);
  expect(eleventh.headers.get('retry-after')).toBe('3600');
  await market.db.query(`update lots set listed_at = listed_at - interval '61 minutes' where seller_id = $1`, [
    one.memberId,
  ]);
  expect((await one.call('POST /my/lots/:lotCode/list', order)).status).toBe(200);
});
