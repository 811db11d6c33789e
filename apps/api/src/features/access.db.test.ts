import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { api, type EndpointSpec, type Role, type Route } from '@lydite/contracts';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { addMember } from '../../test/factories.ts';
import { completeDraft } from '../../test/lot-drafts.ts';
import { openMarket, type Caller, type Market } from '../../test/market.ts';
import { addOpenLot } from '../../test/open-lot.ts';
import { bindRoutes } from '../app.ts';

/**
 * The rights of docs/rules.md, walked: every route as a visitor and in each role, and every route about an object as a
 * stranger to it. A route without a row in the table fails.
 */
const roles = ['seller', 'buyer', 'assayer', 'operator'] as const satisfies Role[];
const routes = Object.keys(api) as Route[];
const specOf = (route: Route): EndpointSpec => api[route];

/** The row of the table that each route belongs to. */
const rowOf: Record<Route, string> = {
  'POST /members': 'sign-in',
  'POST /members/confirm': 'sign-in',
  'PUT /members/me': 'sign-in',
  'GET /session': 'sign-in',
  'POST /session': 'sign-in',
  'POST /session/refresh': 'sign-in',
  'POST /session/password': 'sign-in',
  'DELETE /session': 'sign-in',
  'GET /sessions': 'sign-in',
  'DELETE /sessions/:sessionId': 'sign-in',
  'POST /password-resets': 'sign-in',
  'POST /password-resets/complete': 'sign-in',
  'POST /password': 'sign-in',
  'GET /my/totp': 'sign-in',
  'POST /my/totp': 'sign-in',
  'POST /my/totp/confirm': 'sign-in',
  'POST /my/totp/remove': 'sign-in',
  'GET /my/notices': 'sign-in',
  'POST /my/notices/read': 'sign-in',
  'GET /market': 'catalogue',
  'GET /catalogue': 'catalogue',
  'GET /catalogue/:version': 'catalogue',
  'GET /lots': 'open lot',
  'GET /lots/:lotCode': 'open lot',
  'GET /photos/:photoId/:size': 'files',
  'GET /my/lots': 'lot draft',
  'POST /my/lots': 'lot draft',
  'GET /my/lots/:lotCode': 'lot draft',
  'PUT /my/lots/:lotCode': 'lot draft',
  'DELETE /my/lots/:lotCode': 'lot draft',
  'POST /my/lots/:lotCode/list': 'lot draft',
  'POST /my/lots/:lotCode/withdraw': 'open lot',
  'POST /my/lots/:lotCode/copy': 'lot draft',
  'POST /my/lots/:lotCode/photos': 'lot draft',
  'PUT /my/lots/:lotCode/photos': 'lot draft',
  'DELETE /my/lots/:lotCode/photos/:photoId': 'lot draft',
  'POST /lots/:lotCode/bids': 'bid, offered price',
  'POST /lots/:lotCode/take': 'bid, offered price',
  'POST /lots/:lotCode/offer-answer': 'bid, offered price',
  'GET /my/bids': 'bid, offered price',
  'GET /my/terms': 'buying terms',
  'PUT /my/terms': 'buying terms',
  'GET /my/deals': 'deal, timeline',
  'GET /deals/:dealCode': 'deal, timeline',
  'POST /deals/:dealCode/payment': 'deal, timeline',
  'POST /deals/:dealCode/dispatch': 'deal, timeline',
  'POST /deals/:dealCode/ready': 'deal, timeline',
  'POST /deals/:dealCode/receive': 'deal, timeline',
  'POST /deals/:dealCode/photos': 'deal, timeline',
  'POST /deals/:dealCode/weigh-in': 'deal, timeline',
  'POST /deals/:dealCode/accept': 'deal, timeline',
  'POST /deals/:dealCode/claim': 'dispute',
  'POST /deals/:dealCode/countersign': 'deal, timeline',
  'POST /deals/:dealCode/accept-claim': 'dispute',
  'POST /deals/:dealCode/cancel': 'deal, timeline',
  'GET /deals/:dealCode/packing-slip.pdf': 'deal, timeline',
  'GET /deals/:dealCode/statement.pdf': 'settlement',
  'GET /my/payout-account': 'payout account',
  'POST /my/payout-account/link': 'payout account',
  'POST /webhooks/payments': 'webhook',
  'GET /desk/members': 'member',
  'POST /desk/members/:memberId/verify': 'member',
  'GET /desk/lots': 'lot draft',
  'GET /desk/deals': 'deal, timeline',
  'POST /desk/deals/:dealCode/approve': 'settlement',
  'GET /desk/outbox': 'outbox',
  'GET /desk/jobs': 'outbox',
  'GET /desk/ledger': 'outbox',
};

type Column = 'visitor' | Role;

function tableOfRights(): Map<string, Record<Column, string>> {
  const text = readFileSync(new URL('../../../../docs/rules.md', import.meta.url), 'utf8');
  const lines = text
    .slice(text.indexOf('## Who may do what'))
    .split('\n')
    .filter((line) => line.startsWith('|'));
  const cells = (line: string): string[] =>
    line
      .split('|')
      .slice(1, -1)
      .map((cell) => cell.trim());
  const [, ...columns] = cells(lines[0]!);
  return new Map(
    lines.slice(2).map((line) => {
      const [resource, ...rights] = cells(line);
      return [
        resource!,
        Object.fromEntries(columns.map((column, i) => [column, rights[i] ?? ''])) as Record<Column, string>,
      ];
    }),
  );
}

/** Whoever has no entry in the row may do nothing with it. */
const mayTouch = (rights: Record<Column, string>, column: Column): boolean => !['', '–'].includes(rights[column]);

describe('the table of rights', () => {
  const table = tableOfRights();
  test.each(routes)('%s is open only to whom its row names', (route) => {
    const row = [...table].find(([resource]) => resource.startsWith(rowOf[route]));
    expect(row, 'the row of the table').toBeDefined();
    const { access } = specOf(route);
    const wanted: Column[] = access === 'public' ? ['visitor'] : access === 'signed-in' ? [...roles] : [...access];
    expect(wanted.filter((column) => !mayTouch(row![1], column))).toEqual([]);
  });
});

let market: Market;
let callers: Record<Role, Caller>;
/** Somebody else's objects, by kind. */
let foreign: Record<string, string>;

beforeAll(async () => {
  market = await openMarket();
  const entries = await Promise.all(
    roles.map(async (role) => [role, await market.as(await addMember(market, { roles: [role] }))] as const),
  );
  callers = Object.fromEntries(entries) as Record<Role, Caller>;
  foreign = await addForeignObjects();
});
afterAll(() => market.close());

async function addForeignObjects(): Promise<Record<string, string>> {
  const sellerId = await addMember(market, { roles: ['seller'] });
  const other = await market.as(sellerId);
  const buyer = await market.as(await addMember(market));
  const draft = (await other.call('POST /my/lots')).body.code;
  const photoId = randomUUID();
  await market.db.query(
    `insert into photos (id, owner_id, lot_id, width, height, colour) select $1, $2, id, 10, 10, '#808080' from lots where code = $3`,
    [photoId, sellerId, draft],
  );
  const lot = await addOpenLot(market, { sellerId, askingMinor: 90_000 });
  const deal = await buyer.call('POST /lots/:lotCode/take', {
    params: { lotCode: lot.code },
    body: { priceMinor: 90_000, attempt: randomUUID() },
  });
  return {
    lotCode: draft,
    photoId,
    dealCode: deal.body.dealCode,
    sessionId: (await other.call('GET /sessions')).body[0]!.id,
  };
}

const unknown: Record<string, string> = {
  lotCode: 'L-999999999',
  photoId: randomUUID(),
  dealCode: 'D-999999999',
  sessionId: randomUUID(),
};
const fillers: Record<string, string> = { size: 'page', version: '2026.1', memberId: randomUUID() };

/** Bodies that pass their schema, so that only the right to the object is left to refuse. */
const bodies: Partial<Record<Route, () => unknown>> = {
  'PUT /my/lots/:lotCode': () => ({ version: 1, draft: completeDraft() }),
  'POST /my/lots/:lotCode/list': () => ({ version: 1 }),
  'PUT /my/lots/:lotCode/photos': () => ({ photos: [] }),
  'POST /lots/:lotCode/bids': () => ({ ceilingMinor: 50_000, attempt: randomUUID() }),
  'POST /lots/:lotCode/take': () => ({ priceMinor: 90_000, attempt: randomUUID() }),
  'POST /lots/:lotCode/offer-answer': () => ({ accept: true }),
  'POST /deals/:dealCode/dispatch': () => ({ carrier: 'Wendlesea carriers', trackingCode: 'W 1001' }),
  'POST /deals/:dealCode/weigh-in': () => ({
    grossG: 12_900,
    tareG: 500,
    scaleResolutionG: 10,
    scaleSerial: '',
    note: '',
    photoIds: [randomUUID()],
  }),
  'POST /deals/:dealCode/claim': () => ({ ground: 'mass' }),
};

function send(caller: Caller, route: Route, ids: Record<string, string>) {
  const names = [...route.matchAll(/:(\w+)/g)].map(([, name]) => name!);
  const params = Object.fromEntries(names.map((name) => [name, ids[name] ?? fillers[name] ?? unknown[name]]));
  return caller.call(route as 'GET /lots', { params: params as never, body: bodies[route]?.() as never });
}

test('every route of the contracts has a handler', () => {
  expect(bindRoutes(market.world).missing()).toEqual([]);
});

describe('visitors and roles', () => {
  const closed = routes.filter((route) => specOf(route).access !== 'public');
  test.each(closed)('%s answers 401 to a visitor and 403 to other roles', async (route) => {
    const { access } = specOf(route);
    expect((await send(market.visitor(), route, foreign)).problem.code).toBe('session.required');
    for (const role of roles) {
      if (access === 'signed-in' || access.includes(role)) continue;
      expect((await send(callers[role], route, foreign)).problem, role).toMatchObject({
        status: 403,
        code: 'member.role_missing',
      });
    }
  });
});

describe('objects of others', () => {
  const owned = routes.filter((route) => specOf(route).owned);
  test.each(owned)('%s answers 404 to a stranger, as for an object that does not exist', async (route) => {
    const { access } = specOf(route);
    const strangers = access === 'public' || access === 'signed-in' ? roles : access;
    const asked = strangers.map((role): [string, Caller] => [role, callers[role]]);
    if (access === 'public') asked.push(['visitor', market.visitor()]);
    for (const [who, caller] of asked) {
      const there = await send(caller, route, foreign);
      const nowhere = await send(caller, route, unknown);
      expect(there.status, `${who}: ${there.problem?.detail}`).toBe(404);
      expect(nowhere.problem).toMatchObject({ status: 404, code: there.problem.code, detail: there.problem.detail });
    }
  });
});
