import { createHmac, generateKeyPairSync, randomUUID } from 'node:crypto';
import { request as httpRequest } from 'node:http';
import { connect } from 'node:net';
import { api, type Route } from '@lydite/contracts';
import jwt from 'jsonwebtoken';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { addMember } from '../../test/factories.ts';
import { openMarket, type Caller, type Market } from '../../test/market.ts';
import { cookieNames } from './session-cookies.ts';

/** Numbers are those of the checklist in docs/security.md (OWASP ASVS 5.0.0). */
let market: Market;
let member: Caller;
beforeAll(async () => {
  market = await openMarket();
  member = await market.as(await addMember(market));
});
afterAll(() => market.close());

const profile = { name: 'Harrowmere Boards', place: 'Harrowmere', roles: ['buyer' as const] };
const secret = 'a-secret-of-the-tests-that-is-long-enough';
const base64 = (value: object): string => Buffer.from(JSON.stringify(value)).toString('base64url');

async function withAccess(token: string): Promise<Caller> {
  const caller = market.visitor();
  caller.cookies.set(cookieNames.access, token);
  return caller;
}
const isMember = async (token: string): Promise<boolean> =>
  (await (await withAccess(token)).call('GET /sessions')).status === 200;

describe('access tokens (48, 56, 57)', () => {
  const claimsNow = () => {
    const { sub, sid, roles } = jwt.decode(member.cookies.get(cookieNames.access)!) as Record<string, string>;
    return {
      sub,
      sid,
      roles,
      typ: 'access',
      iss: 'lydite',
      aud: 'lydite-market',
      exp: Math.floor(Date.now() / 1000) + 60,
    };
  };
  const signed = (header: object, claims: object, key = secret): string => {
    const body = `${base64(header)}.${base64(claims)}`;
    return `${body}.${createHmac('sha256', key).update(body).digest('base64url')}`;
  };

  test('a token signed by the key in force is taken: the other cases differ from it by one thing each', async () => {
    expect(await isMember(signed({ alg: 'HS256', typ: 'JWT' }, claimsNow()))).toBe(true);
  });

  test.each<[string, () => string]>([
    [
      'edited',
      () =>
        member.cookies
          .get(cookieNames.access)!
          .replace(/\.[^.]+\./, `.${base64({ ...claimsNow(), roles: ['operator'] })}.`),
    ],
    ['without a signature', () => `${base64({ alg: 'none', typ: 'JWT' })}.${base64(claimsNow())}.`],
    ['signed by another key', () => signed({ alg: 'HS256' }, claimsNow(), 'another-secret-that-is-long-enough-too')],
    ['with another hash', () => jwt.sign(claimsNow(), secret, { algorithm: 'HS512' })],
    [
      'signed by an own RSA key',
      () =>
        jwt.sign(claimsNow(), generateKeyPairSync('rsa', { modulusLength: 2048 }).privateKey, { algorithm: 'RS256' }),
    ],
    [
      'naming its own key',
      () =>
        signed(
          { alg: 'HS256', jku: 'https://elsewhere.example/keys' },
          claimsNow(),
          'key-of-elsewhere-that-is-long-enough',
        ),
    ],
    ['that has run out', () => signed({ alg: 'HS256' }, { ...claimsNow(), exp: Math.floor(Date.now() / 1000) - 1 })],
    ['of another issuer', () => signed({ alg: 'HS256' }, { ...claimsNow(), iss: 'elsewhere' })],
    ['for another audience', () => signed({ alg: 'HS256' }, { ...claimsNow(), aud: 'elsewhere' })],
    ['of another kind', () => signed({ alg: 'HS256' }, { ...claimsNow(), typ: 'refresh' })],
    ['that is the refresh token', () => member.cookies.get(cookieNames.refresh)!],
  ])('a token %s opens nothing', async (_, token) => {
    expect(await isMember(token())).toBe(false);
  });

  test('two keys live at once while one is rotated out', async () => {
    const rotated = await openMarket({ env: { JWT_SECRETS: `the-new-secret-that-is-long-enough-too,${secret}` } });
    try {
      const caller = await rotated.as(await addMember(rotated));
      const { sub, sid, roles } = jwt.decode(caller.cookies.get(cookieNames.access)!) as Record<string, string>;
      const claims = {
        sub,
        sid,
        roles,
        typ: 'access',
        iss: 'lydite',
        aud: 'lydite-market',
        exp: Math.floor(Date.now() / 1000) + 60,
      };
      expect((await caller.call('GET /sessions')).status).toBe(200);
      caller.cookies.set(cookieNames.access, signed({ alg: 'HS256' }, claims));
      expect((await caller.call('GET /sessions')).status).toBe(200);
    } finally {
      await rotated.close();
    }
  });
});

describe('calls from elsewhere (22, 24)', () => {
  const change = (headers: Record<string, string>) => member.call('PUT /members/me', { body: profile, headers });

  test('are refused by Sec-Fetch-Site, by Origin, and without the clients’ header', async () => {
    expect((await change({ 'sec-fetch-site': 'same-origin' })).status).toBe(200);
    for (const site of ['cross-site', 'same-site', 'none'])
      expect((await change({ 'sec-fetch-site': site })).problem.code).toBe('request.cross_site');
    expect((await change({ origin: 'https://elsewhere.example' })).problem.code).toBe('request.cross_site');
    expect((await change({ origin: 'http://localhost:4400' })).status).toBe(200);
    const bare = await member.fetch('/api/members/me', {
      method: 'PUT',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(profile),
    });
    expect(bare.status).toBe(403);
  });

  test('JSON dressed as text or as a form is refused', async () => {
    for (const type of ['text/plain', 'application/x-www-form-urlencoded'])
      expect((await change({ 'content-type': type })).status).toBe(415);
  });

  test('no answer allows another origin to read it', async () => {
    const reply = await member.fetch('/api/market', { headers: { origin: 'https://elsewhere.example' } });
    expect([...reply.headers.keys()].filter((name) => name.startsWith('access-control'))).toEqual([]);
  });
});

describe('headers (21, 23, 27, 76)', () => {
  const gets = (Object.keys(api) as Route[])
    .filter((route) => route.startsWith('GET ') && !route.includes(':'))
    .map((route) => `/api${route.slice(4)}`);

  test.each([...gets, '/api/nowhere', '/healthz', '/nowhere'])('%s', async (path) => {
    const { headers } = await member.fetch(path);
    expect(headers.get('content-security-policy')).toMatch(/default-src 'none'.*frame-ancestors 'none'/);
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('referrer-policy')).toBe('no-referrer');
    expect(headers.get('strict-transport-security')).toMatch(/max-age=31536000/);
    expect(headers.get('x-powered-by')).toBeNull();
    expect(headers.get('content-type')).toMatch(/charset=utf-8/);
    if (path.startsWith('/api')) expect(headers.get('cache-control')).toBe('no-store');
  });
});

describe('input (8, 12, 29, 30, 63, 86)', () => {
  test('unknown, missing and wrong fields are all named', async () => {
    const reply = await member.call('PUT /members/me', {
      body: { name: 7, roles: ['operator'], limitMinor: 1 } as never,
    });
    expect(reply.status).toBe(400);
    expect(reply.problem.fields.map((field) => field.path).toSorted()).toEqual([
      'limitMinor',
      'name',
      'place',
      'roles.0',
    ]);
  });

  test('a body that reaches for the prototype changes nothing', async () => {
    const text = `{"name":"Harrowmere Boards","place":"Harrowmere","roles":["buyer"],"__proto__":{"verified":true}}`;
    await member.fetch('/api/members/me', {
      method: 'PUT',
      headers: { 'content-type': 'application/json', 'x-lydite-client': 'test' },
      body: text,
    });
    expect(({} as { verified?: boolean }).verified).toBeUndefined();
    expect((await member.call('GET /session')).body.member!.roles).toEqual(['buyer']);
  });

  test('a name cannot add a mail header', async () => {
    const reply = await member.call('PUT /members/me', { body: { ...profile, name: 'A\r\nBcc: all@members.example' } });
    expect(reply.problem.fields).toMatchObject([{ path: 'name' }]);
  });

  test('broken and oversized bodies are refused in words', async () => {
    const send = (body: string) =>
      member.fetch('/api/members/me', {
        method: 'PUT',
        headers: { 'content-type': 'application/json', 'x-lydite-client': 'test' },
        body,
      });
    expect(await (await send('{"name":')).json()).toMatchObject({ code: 'request.invalid' });
    expect(await (await send(JSON.stringify({ name: 'x'.repeat(300_000) }))).json()).toMatchObject({
      code: 'request.too_large',
    });
  });

  test('a parameter given twice is refused', async () => {
    expect((await member.fetch('/api/lots?page=1&page=2')).status).toBe(400);
  });

  test('a request of two lengths is refused', async () => {
    const { hostname, port } = new URL(market.origin);
    const answer = await new Promise<string>((resolve, reject) => {
      const socket = connect(Number(port), hostname, () =>
        socket.end(
          'POST /api/session HTTP/1.1\r\nHost: x\r\nContent-Length: 5\r\nTransfer-Encoding: chunked\r\n\r\n0\r\n\r\n',
        ),
      );
      socket.once('data', (data) => resolve(data.toString()));
      socket.once('error', reject);
    });
    expect(answer).toMatch(/^HTTP\/1\.1 400 /);
  });

  test('a client’s own X-Forwarded-For does not change the address on record', async () => {
    const caller = await market.as(await addMember(market));
    await caller.call('POST /session', {
      body: { email: 'nobody@members.example', password: randomUUID() },
      headers: { 'x-forwarded-for': '203.0.113.9' },
    });
    const rows = await market.db.query(`select key from sign_in_failures where key like 'address:%'`);
    expect(rows.map((row: { key: string }) => row.key)).not.toContain('address:203.0.113.9');
  });

  test('an error nobody expected is masked, and found again by its number', async () => {
    const { db } = market.world;
    const query = db.manager.query;
    db.manager.query = () => Promise.reject(new Error('secret detail of the database'));
    try {
      const reply = await member.call('GET /my/notices');
      expect(reply.status).toBe(500);
      expect(reply.bytes.toString()).not.toContain('secret detail');
      expect(reply.problem.detail).toContain(reply.problem.requestId);
    } finally {
      db.manager.query = query;
    }
  });
});

test('TRACE answers nothing (72)', async () => {
  const status = await new Promise<number>((resolve, reject) => {
    const url = new URL(market.origin);
    httpRequest({ host: url.hostname, port: url.port, path: '/api/market', method: 'TRACE' }, (res) =>
      resolve(res.statusCode!),
    )
      .on('error', reject)
      .end();
  });
  expect(status).toBe(404);
});

test('the role of the application may not touch what is append only, nor make tables (70)', async () => {
  for (const sql of [
    'update audit_log set reason = 1::text',
    'delete from ledger_entries',
    'truncate ledger_transfers',
    'update market_clock set shift = shift',
    'create table t (id int)',
    'update ledger_accounts set balance = 0',
  ])
    await expect(market.db.query(sql), sql).rejects.toThrow(/permission denied/);
});
