import { randomUUID } from 'node:crypto';
import type { LotQuery } from '@lydite/contracts';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { addDeal, bringToReceipt, passDeadline, weighIn, must, type TestDeal } from '../../../test/deals.ts';
import { addMember } from '../../../test/factories.ts';
import { addDraft, addListedLot, addPrice, addSeller } from '../../../test/listed-lots.ts';
import { completeDraft, lineOf } from '../../../test/lot-drafts.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { jobHandlers } from '../../work.ts';
import { sellerRecord } from './lot-view.queries.ts';

let market: Market;
let seller: Caller;
let buyer: Caller;
/** Memory for 400.00, 1.2 kg; boards for 90.00, 80 kg, closing tomorrow; tops at 5 000.00 asked. */
let [memory, boards, tops] = ['', '', ''];

const sale = completeDraft().sale;
beforeAll(async () => {
  market = await openMarket();
  await addPrice(market);
  seller = await addSeller(market);
  buyer = await market.as(await addMember(market, { name: 'Sallowby Recovery', place: 'Sallowby' }));
  memory = await addListedLot(seller, {
    title: 'Server memory',
    lines: [lineOf({ massG: 1200, pieces: 55 })],
    sale: { ...sale, reserveMinor: 77_777 },
  });
  boards = await addListedLot(seller, {
    title: 'Network boards from racks',
    lines: [lineOf({ classCode: 'network-boards', massG: 80_000, massEvidence: 'stated', pieces: null })],
    sale: { ...sale, startMinor: 9000, days: 1 },
  });
  tops = await addListedLot(seller, {
    title: 'Package tops, clean',
    lines: [lineOf({ classCode: 'package-tops', massG: 3000, pieces: null })],
    sale: { ...sale, form: 'asking-price', startMinor: null, askingMinor: 500_000, days: 10 },
  });
  await addDraft(seller, { title: 'Memory nobody sees' });
});
afterAll(() => market.close());

const list = (query: Partial<Record<keyof LotQuery, string | number>> = {}, caller = market.visitor()) =>
  caller.call('GET /lots', { query: query as LotQuery });
const codes = async (query: Partial<Record<keyof LotQuery, string | number>>, caller?: Caller): Promise<string[]> =>
  (await list(query, caller)).body.rows.map(({ code }) => code);
const view = (lotCode: string, caller = market.visitor()) => caller.call('GET /lots/:lotCode', { params: { lotCode } });
const bid = (lotCode: string, ceilingMinor: number, caller = buyer) =>
  caller.call('POST /lots/:lotCode/bids', { params: { lotCode }, body: { ceilingMinor, attempt: randomUUID() } });

test('a visitor sees the open lots with what a streak is drawn from, and no drafts', async () => {
  const { body } = await list();
  expect(body).toMatchObject({ total: 3, page: 1, pageSize: 25 });
  expect(body.rows.map(({ code }) => code)).toEqual([boards, memory, tops]);
  expect(body.countsByView).toEqual({ all: 3, 'over-10-g': 2, 'closing-today': 0, bid: 0 });
  const row = body.rows[1]!;
  expect(row).toMatchObject({
    title: 'Server memory',
    massG: 1200,
    pieces: 55,
    priceMinor: null,
    startMinor: 40_000,
    you: null,
  });
  expect(row.estimate.density.perG).toHaveLength(96);
  for (const value of row.estimate.density.perG) expect(value).toBe(Number(value.toPrecision(5)));
  expect(Object.keys(row.estimate)).toEqual(['massG', 'goldG', 'gradeGPerT', 'density']);
  expect(body.rows[2]).toMatchObject({ priceMinor: 500_000, startMinor: null, form: 'asking-price' });
});

test.each<[Partial<Record<keyof LotQuery, string | number>>, () => string[]]>([
  [{ sort: '-gold' }, () => [tops, boards, memory]],
  [{ sort: '-grade' }, () => [tops, memory, boards]],
  [{ sort: '-mass' }, () => [boards, tops, memory]],
  [{ sort: 'price' }, () => [boards, memory, tops]],
  [{ sort: '-listed' }, () => [tops, boards, memory]],
  [{ form: 'asking-price' }, () => [tops]],
  [{ class: 'network-boards' }, () => [boards]],
  [{ goldG: 10 }, () => [boards, tops]],
  [{ massKg: 3 }, () => [boards, tops]],
  [{ closing: '3-days' }, () => [boards]],
  [{ closing: 'week' }, () => [boards]],
  [{ q: 'network' }, () => [boards]],
  [{ q: 'rack board' }, () => [boards]],
  [{ q: 'nothing like it' }, () => []],
  [{ mine: 'bid' }, () => []],
  [{ page: 2 }, () => []],
])('filter and sort %j', async (query, expected) => expect(await codes(query)).toEqual(expected()));

test('a lot code finds the lot, however it is typed', async () => {
  expect(await codes({ q: memory })).toEqual([memory]);
  expect(await codes({ q: ` ${memory.toLowerCase().replace('-', '')} ` })).toEqual([memory]);
});

test('SQL in a filter or a sort is a bad request or finds nothing', async () => {
  const attack = `' OR 1=1--`;
  for (const name of ['q', 'class', 'form', 'goldG', 'massKg', 'closing', 'mine', 'sort', 'page'] as const) {
    const { status, body } = await list({ [name]: attack });
    if (status === 200) expect([name, body.rows]).toEqual([name, []]);
    else expect([name, status]).toEqual([name, 400]);
  }
  expect((await market.visitor().fetch(`/api/lots/${encodeURIComponent(attack)}`)).status).toBe(400);
  expect((await market.visitor().fetch('/api/lots?owner=1')).status).toBe(400);
});

test('a search that would trouble a pattern matcher is answered at once', async () => {
  const begun = performance.now();
  expect(await codes({ q: `(a+)+$ ${'a'.repeat(60)}` })).toEqual([]);
  expect(performance.now() - begun).toBeLessThan(1000);
});

test('a bidder sees the own standing; nobody ever sees a ceiling or the reserve', async () => {
  const rival = await market.as(await addMember(market));
  expect((await bid(memory, 61_111)).status).toBe(201);
  expect((await bid(memory, 52_222, rival)).body).toMatchObject({ standing: 'outbid' });
  const [mine] = (await list({ mine: 'bid' }, buyer)).body.rows;
  expect(mine).toMatchObject({ code: memory, bidders: 2, you: { standing: 'highest', ceilingMinor: 61_111 } });
  expect((await list({}, buyer)).body.countsByView.bid).toBe(1);

  const [own, others, public_, sellers] = [
    await view(memory, buyer),
    await view(memory, rival),
    await view(memory),
    await view(memory, seller),
  ];
  expect(own.body.you).toMatchObject({ seller: false, standing: 'highest', ceilingMinor: 61_111, dealCode: null });
  expect(own.body.leastNextMinor).toBe(61_112);
  expect(own.body.you!.roomMinor).toBe(5_000_000);
  expect(others.body.you).toMatchObject({ standing: 'outbid', ceilingMinor: 52_222 });
  expect(others.body.leastNextMinor).toBe(public_.body.leastNextMinor);
  expect(public_.body).toMatchObject({ you: null, reserve: 'not-reached', bidders: 2, priceMinor: 52_722 });
  expect(public_.body.bids.map(({ alias, own: isOwn }) => [alias, isOwn])).toEqual([
    ['Buyer 2', false],
    ['Buyer 1', false],
  ]);
  expect(sellers.body.you).toMatchObject({ seller: true, standing: null, roomMinor: null });
  for (const { body } of [others, public_, sellers, await list(), await list({}, rival)])
    expect(JSON.stringify(body)).not.toContain('61111');
  for (const { body } of [own, others, public_, sellers, await list({}, seller)])
    expect(JSON.stringify(body)).not.toContain('77777');
  const ownLot = await seller.call('GET /my/lots/:lotCode', { params: { lotCode: memory } });
  expect(ownLot.body).toMatchObject({ reserveReached: false, priceMinor: 52_722, bidders: 2 });
  expect(ownLot.body.draft.sale.reserveMinor).toBe(77_777);
});

test('a lot page tells lines, cautions, delivery, price and what is to come', async () => {
  const { body } = await view(boards);
  expect(body).toMatchObject({
    state: 'open',
    basis: 'outright',
    place: 'Harrowmere',
    delivery: { way: 'seller-sends', freightMinor: 1800, hours: '' },
    price: { perGramMinor: 13_000, stale: false },
    reserve: 'none',
    leastNextMinor: 9000,
    sellerRecord: { deliveredLots: 0, medianMassDifference: null },
  });
  expect(body.lines[0]).toMatchObject({
    className: 'Network equipment boards',
    hazards: expect.stringContaining('lead'),
  });
  expect(body.lines[0]!.id).toBe(body.estimate.lines[0]!.id);
  expect(body.chain.map(({ key, state }) => [key, state])).toEqual([
    ['listed', 'done'],
    ['sale', 'now'],
    ['hold', 'todo'],
    ['dispatch', 'todo'],
    ['weigh_in', 'todo'],
    ['settlement', 'todo'],
  ]);
  expect(body.chain[1]!.note).toMatch(/^Closes \w{3} \d+ \w{3}, \d\d:00 CES?T$/);
  expect((await view(tops)).body).toMatchObject({ leastNextMinor: null, priceMinor: 500_000 });
  expect((await view('L-1')).problem.code).toBe('lot.not_found');
});

test('a withdrawn lot keeps its page but is off the list', async () => {
  const lotCode = await addListedLot(seller);
  await seller.call('POST /my/lots/:lotCode/withdraw', { params: { lotCode } });
  expect(await codes({ q: lotCode })).toEqual([]);
  const { body } = await view(lotCode);
  expect(body.state).toBe('withdrawn');
  expect(body.chain.map(({ title, note }) => [title, note])).toEqual([
    ['Listed', ''],
    ['Bidding', 'Withdrawn by the seller'],
  ]);
});

test('an awarded lot shows its two sides the deal, everybody else only that it is awarded', async () => {
  const lotCode = await addListedLot(seller, { sale: { ...sale, form: 'asking-price', askingMinor: 100_000 } });
  const body = { priceMinor: 100_000, attempt: randomUUID() };
  const { body: taken } = await buyer.call('POST /lots/:lotCode/take', { params: { lotCode }, body });
  for (const side of [buyer, seller]) {
    const { body: lot } = await view(lotCode, side);
    expect(lot.you).toMatchObject({ dealCode: taken.dealCode });
    expect(lot.chain.find(({ state }) => state === 'now')).toMatchObject({ key: 'hold' });
  }
  const { body: lot } = await view(lotCode, await addSeller(market));
  expect(lot.you?.dealCode).toBeNull();
  expect(JSON.stringify(lot)).not.toContain(taken.dealCode);
  expect(lot.chain[1]).toMatchObject({ state: 'done', note: 'Awarded' });
  const { body: rows } = await seller.call('GET /my/lots');
  expect(rows.find(({ code }) => code === lotCode)).toMatchObject({
    dealCode: taken.dealCode,
    dealState: 'awaiting_payment',
    duty: '',
  });
});

test('a lot whose close has passed is off the list before any job has closed it', async () => {
  await market.advance('2 days');
  expect(await codes({})).toEqual([memory, tops]);
  const { body } = await view(boards);
  expect(body).toMatchObject({ state: 'open', leastNextMinor: null });
  expect(body.chain[1]).toMatchObject({ state: 'now', note: 'Closed, the result is being worked out' });
  expect((await list({ closing: 'today' })).body.total).toBe(0);
});

test('a seller’s record tells of masses that were weighed, not of a declared mass that stood', async () => {
  const record = ({ sellerId }: TestDeal) => sellerRecord(market.db.manager, sellerId);
  const ring = async (deal: TestDeal): Promise<void> => {
    await passDeadline(market, deal);
    await jobHandlers(market.world)['deal.deadline'](deal.id);
  };
  const weighed = await addDeal(market);
  await bringToReceipt(market, weighed);
  await must(weighIn(weighed, 12_276));
  await ring(weighed);
  await ring(weighed);
  expect(await record(weighed)).toEqual({ deliveredLots: 1, medianMassDifference: expect.closeTo(0.01, 6) });
  const stood = await addDeal(market);
  await bringToReceipt(market, stood);
  await ring(stood);
  await ring(stood);
  expect(await record(stood)).toEqual({ deliveredLots: 1, medianMassDifference: null });
});
