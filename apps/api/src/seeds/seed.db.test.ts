import { catalogue20261 } from '@lydite/valuation';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { openDemoMarket } from '../../test/demo-market.ts';
import type { Market } from '../../test/market.ts';
import { checkLedger } from '../features/ledger/ledger-check.ts';
import { pollEvents } from '../features/payments/receive-event.ts';
import type { World } from '../platform/world.ts';
import { photoFiles } from './album.ts';
import { MarketNotEmpty } from './seed-market.ts';
import { demoPassword, firms, type signIns as printedSignIns } from './people.ts';

let demo: Awaited<ReturnType<typeof openDemoMarket>>;
let market: Market;
let world: World;
let signIns: typeof printedSignIns;
let begunAt: Date;

beforeAll(async () => {
  demo = await openDemoMarket();
  ({ market, world } = demo);
  begunAt = new Date();
  signIns = await demo.seed();
}, 120_000);
afterAll(() => demo.close());

const counts = async (sql: string): Promise<Record<string, number>> => {
  const rows: { key: string; n: number }[] = await market.db.query(sql);
  return Object.fromEntries(rows.map(({ key, n }) => [key, n]));
};

test('forty lots and their deals stand in every state of the thin path', async () => {
  expect(await counts('select state as key, count(*)::int as n from lots group by state')).toEqual({
    draft: 3,
    open: 22,
    awarded: 12,
    offered: 1,
    unsold: 1,
    withdrawn: 1,
  });
  expect(await counts('select state as key, count(*)::int as n from deals group by state')).toEqual({
    awaiting_payment: 1,
    held: 1,
    dispatched: 1,
    ready: 1,
    received: 1,
    weighed_in: 1,
    in_dispute: 1,
    settled: 5,
    cancelled: 1,
  });
});

test('every material class of the catalogue is on a lot, and every photo is shown', async () => {
  const rows: { codes: string[] }[] = await market.db.query(
    'select array_agg(distinct class_code) as codes from lot_lines',
  );
  expect(rows[0]!.codes.toSorted()).toEqual(catalogue20261.classes.map(({ code }) => code).toSorted());
  const shown: { n: number }[] = await market.db.query('select count(distinct colour)::int as n from photos');
  expect(shown[0]!.n).toBeGreaterThan(photoFiles.length / 2);
});

test('the ticket of the public scale hangs at the one weigh-in whose masses it names', async () => {
  const masses: unknown[] = await market.db.query(
    `select w.gross_g::float as gross, w.tare_g::float as tare, w.net_g::float as net
       from photos p join weigh_ins w on w.deal_id = p.deal_id where p.description = 'Ticket of the public scale'`,
  );
  expect(masses).toEqual([{ gross: 31_460, tare: 380, net: 31_080 }]);
});

test('the market runs on real time again, and nothing in it lies in the future', async () => {
  const rows: { off: number; late: number; alarms: number }[] = await market.db.query(
    `select extract(epoch from market_now() - clock_timestamp())::int as off,
            (select count(*)::int from deal_events where at > clock_timestamp()) + (select count(*)::int from bids where placed_at > clock_timestamp()) as late,
            (select count(*)::int from outbox where kind = 'alarm' and state = 'pending' and (payload->>'at')::timestamptz < $1) as alarms`,
    [begunAt],
  );
  expect(rows).toEqual([{ off: 0, late: 0, alarms: 0 }]);
});

test('the events of a deal come in the order of time, and so do their codes', async () => {
  const disorder: unknown[] = await market.db.query(
    `select * from (select at < lag(at) over (order by id) as back from deal_events) e where back
     union all select * from (select listed_at < lag(listed_at) over (order by substr(code, 3)::int) as back from lots where listed_at is not null) l where back`,
  );
  expect(disorder).toEqual([]);
});

test('the books balance, and still do when every event comes again', async () => {
  const before = await checkLedger(world);
  expect(before.checks.filter(({ ok }) => !ok)).toEqual([]);
  const entries = () => market.db.query('select count(*)::int as n from ledger_entries');
  const posted = await entries();
  await market.db.query('delete from inbox');
  await pollEvents(world);
  await market.work();
  expect(await entries()).toEqual(posted);
  expect((await checkLedger(world)).balanced).toBe(true);
});

test('an accepted claim gave part of a hold back, and a seller without papers waits', async () => {
  expect(await counts('select state as key, count(*)::int as n from refunds group by state')).toEqual({ sent: 1 });
  expect(await counts('select state as key, count(*)::int as n from transfers group by state')).toEqual({
    sent: 4,
    waiting: 1,
  });
});

test('nothing that was ordered outside is left undone or failed', async () => {
  expect(
    await counts('select state as key, count(*)::int as n from outbox where last_error is not null group by state'),
  ).toEqual({});
  expect(
    await counts(
      `select kind as key, count(*)::int as n from outbox where state <> 'done' and kind <> 'alarm' group by kind`,
    ),
  ).toEqual({});
  const waiting: unknown[] = await market.db.query('select 1 from inbox where processed_at is null');
  expect(waiting).toEqual([]);
});

test('there is a sign-in for each role, and it works', async () => {
  expect(signIns.map(({ role }) => role)).toEqual(['seller', 'buyer', 'operator', 'assayer']);
  for (const { role, email, password } of signIns) {
    const { status, body } = await market.visitor().call('POST /session', { body: { email, password } });
    expect(status).toBe(200);
    expect(body.member?.roles).toContain(role);
  }
  expect(demoPassword.length).toBeGreaterThanOrEqual(12);
});

test('the list, the demo members’ pages and the desk can be read', async () => {
  const { body } = await market.visitor().call('GET /lots');
  expect(body.total).toBe(22);
  const as = (role: string) => {
    const { email, password } = signIns.find((one) => one.role === role)!;
    const caller = market.visitor();
    return caller.call('POST /session', { body: { email, password } }).then(() => caller);
  };
  const buyer = await as('buyer');
  const bids = (await buyer.call('GET /my/bids')).body;
  expect(new Set(bids.rows.map(({ standing }) => standing))).toEqual(new Set(['highest', 'outbid']));
  expect(bids.rows.filter(({ offer }) => offer)).toHaveLength(1);
  expect((await buyer.call('GET /my/deals')).body.length).toBeGreaterThanOrEqual(5);
  const notices = (await buyer.call('GET /my/notices')).body;
  expect(notices.some(({ readAt }) => readAt)).toBe(true);
  expect(notices.some(({ readAt }) => !readAt)).toBe(true);
  const seller = await as('seller');
  const lots = (await seller.call('GET /my/lots')).body;
  expect(lots.filter(({ state }) => state === 'draft')).toHaveLength(3);
  expect((await (await as('operator')).call('GET /desk/ledger')).body.balanced).toBe(true);
});

test('names are a place of Wendlesea and a plain trade word', async () => {
  const places = [
    'Harrowmere',
    'Sallowby',
    'Thrennaby',
    'Ossenmere',
    'Dunnowick',
    'Vennaby',
    'Pellandsea',
    'Ullerthwick',
  ];
  const trades =
    /^(Repairs|Recovery|Dismantling|Office Clearance|Server Disposal|Salvage|Collectors|Reclaim|Refining|Trading|Works|Assay Laboratory)$/;
  for (const { name, place } of Object.values(firms)) {
    expect(places).toContain(place);
    if (name !== `Market desk, ${place}`) {
      expect(name.startsWith(`${place} `)).toBe(true);
      expect(name.slice(place.length + 1)).toMatch(trades);
    }
  }
});

test('a second run is refused and changes nothing', async () => {
  const members = () => market.db.query('select count(*)::int as n from members');
  const before = await members();
  await expect(demo.seed()).rejects.toBeInstanceOf(MarketNotEmpty);
  expect(await members()).toEqual(before);
});
