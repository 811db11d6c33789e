import { randomUUID } from 'node:crypto';
import { api, type Route } from '@lydite/contracts';
import { Secret } from 'otpauth';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { createPasswords } from './passwords.ts';
import { totpOf } from './totp-codes.ts';

let market: Market;
let passwordHash: string;
const password = 'copper lantern sundial';
beforeAll(async () => {
  market = await openMarket({ env: { TOTP_REQUIRED: 'on' } });
  passwordHash = await createPasswords({ pepper: market.world.settings.PASSWORD_PEPPER }).hash(password);
});
afterAll(() => market.close());

let number = 0;
async function addPerson(role: 'buyer' | 'operator' = 'buyer') {
  const email = `second.step${(number += 1)}@members.example`;
  const memberId = await addMember(market, { email, passwordHash, roles: [role] });
  return { email, memberId, caller: await market.as(memberId) };
}

/** What an app shows at the market's time, so many 30-second steps away. */
async function codeOf(secret: string, steps = 0): Promise<string> {
  const [{ now }]: [{ now: Date }] = await market.db.query('select market_now() as now');
  return totpOf(Secret.fromBase32(secret).bytes).generate({ timestamp: now.getTime() + steps * 30_000 });
}

async function setUp(caller: Caller) {
  const { secret } = (await caller.call('POST /my/totp')).body;
  const confirmed = await caller.call('POST /my/totp/confirm', { body: { code: await codeOf(secret) } });
  expect(confirmed.status).toBe(200);
  return { secret, recoveryCodes: confirmed.body.recoveryCodes };
}

const signIn = (email: string, code?: string, secretWord = password) =>
  market
    .visitor()
    .call('POST /session', { body: { email, password: secretWord, ...(code === undefined ? {} : { code }) } });

test('set up, sign in with a code; the same code counts once', async () => {
  const { email, caller } = await addPerson();
  expect((await caller.call('GET /my/totp')).body).toEqual({ isOn: false, recoveryCodesLeft: 0 });
  const setup = (await caller.call('POST /my/totp')).body;
  expect(setup.uri).toContain(`secret=${setup.secret}`);
  expect(setup.uri).toContain('issuer=Lydite');
  expect(setup.qrSvg).toMatch(/^<svg [^>]*>(<path [^>]*\/>)+<\/svg>\s*$/);
  expect((await signIn(email)).status, 'nothing is asked before it is confirmed').toBe(200);

  const code = await codeOf(setup.secret);
  const confirmed = await caller.call('POST /my/totp/confirm', { body: { code } });
  expect(new Set(confirmed.body.recoveryCodes).size).toBe(10);
  expect((await caller.call('GET /my/totp')).body).toEqual({ isOn: true, recoveryCodesLeft: 10 });

  expect((await signIn(email)).problem.code).toBe('session.code_required');
  expect((await signIn(email, code)).problem, 'used to confirm').toMatchObject({
    status: 401,
    code: 'session.code_wrong',
  });
  await market.advance('30 seconds');
  const next = await codeOf(setup.secret);
  const signedIn = await signIn(email, `${next.slice(0, 3)} ${next.slice(3)}`);
  expect(signedIn.body.member?.email).toBe(email);
  expect((await signIn(email, next)).problem.code, 'replayed in its window').toBe('session.code_wrong');
});

test('of many at once with one code, one signs in', async () => {
  const { email, caller } = await addPerson();
  const { secret } = await setUp(caller);
  await market.advance('30 seconds');
  const code = await codeOf(secret);
  const statuses = await Promise.all(Array.from({ length: 4 }, async () => (await signIn(email, code)).status));
  expect(statuses.filter((status) => status === 200)).toHaveLength(1);
});

test('a step early or late is taken, two are not', async () => {
  const { email, caller } = await addPerson();
  const { secret } = await setUp(caller);
  await market.advance('5 minutes');
  expect((await signIn(email, await codeOf(secret, -3))).problem.code).toBe('session.code_wrong');
  expect((await signIn(email, await codeOf(secret, 3))).problem.code).toBe('session.code_wrong');
  expect((await signIn(email, await codeOf(secret, 1))).status).toBe(200);
  expect((await signIn(email, await codeOf(secret))).problem.code, 'older than the one used').toBe(
    'session.code_wrong',
  );
});

test('wrong codes are slowed down, and asking without a code or a reset by mail does not reset the brake', async () => {
  const { email, memberId, caller } = await addPerson();
  await setUp(caller);
  const failures = async (): Promise<number> => {
    const rows: { n: number }[] = await market.db.query(
      `select count(*)::int as n from sign_in_failures where key = 'account:' || $1`,
      [email],
    );
    return rows[0]!.n;
  };
  for (let i = 1; i <= 4; i += 1) {
    expect((await signIn(email, '000000x')).problem.code).toBe('session.code_wrong');
    expect((await signIn(email)).problem.code).toBe('session.code_required');
    expect(await failures()).toBe(i);
  }
  market.mails.length = 0;
  await market.visitor().call('POST /password-resets', { body: { email } });
  await market.work();
  const token = /token=([\w.-]+)/.exec(market.mails.find(({ to }) => to === email)!.text)![1]!;
  const renewed = 'walnut harbour telescope';
  expect(
    (await market.visitor().call('POST /password-resets/complete', { body: { token, password: renewed } })).status,
  ).toBe(204);
  expect(await failures(), 'after the reset').toBe(4);
  expect((await signIn(email, undefined, renewed)).problem.code, 'the reset keeps the second step').toBe(
    'session.code_required',
  );
  await market.db.query(`insert into sign_in_failures (key) select 'account:' || $1 from generate_series(1, 6)`, [
    email,
  ]);
  expect((await signIn(email, '000000x', renewed)).problem.code).toBe('request.too_many');
  const audited: unknown[] = await market.db.query(
    `select 1 from audit_log where action = 'session.code_refused' and object_id = $1`,
    [memberId],
  );
  expect(audited).toHaveLength(4);
});

test('a recovery code signs in once, and another member’s does not', async () => {
  const { email, caller } = await addPerson();
  const { recoveryCodes } = await setUp(caller);
  const other = await addPerson();
  const { recoveryCodes: foreign } = await setUp(other.caller);
  expect((await signIn(email, foreign[0])).problem.code).toBe('session.code_wrong');
  expect((await signIn(email, recoveryCodes[0]!.toUpperCase().replaceAll('-', ' '))).status).toBe(200);
  expect((await signIn(email, recoveryCodes[0])).problem.code).toBe('session.code_wrong');
  expect((await caller.call('GET /my/totp')).body.recoveryCodesLeft).toBe(9);
});

test('neither secret nor recovery codes stand in the tables, and a secret opens for its member alone', async () => {
  const { email, memberId, caller } = await addPerson();
  const { secret, recoveryCodes } = await setUp(caller);
  const [stored]: { secret: Buffer; all: string }[] = await market.db.query(
    `select secret, member_totp::text || (select string_agg(recovery_codes::text, ' ') from recovery_codes where member_id = $1) as all
       from member_totp where member_id = $1`,
    [memberId],
  );
  const bytes = Buffer.from(Secret.fromBase32(secret).bytes);
  expect(stored!.secret.includes(bytes)).toBe(false);
  for (const plain of [secret, bytes.toString('hex'), ...recoveryCodes, recoveryCodes[0]!.replaceAll('-', '')])
    expect(stored!.all.toLowerCase()).not.toContain(plain.toLowerCase());

  const thief = await addPerson();
  const own = await setUp(thief.caller);
  await market.db.query('update member_totp set secret = $2 where member_id = $1', [
    memberId,
    await sealedOf(thief.memberId),
  ]);
  await market.advance('30 seconds');
  expect((await signIn(email, await codeOf(own.secret))).status).toBe(500);
});

async function sealedOf(memberId: string): Promise<Buffer> {
  const rows: { secret: Buffer }[] = await market.db.query('select secret from member_totp where member_id = $1', [
    memberId,
  ]);
  return rows[0]!.secret;
}

test('setting up and removing want a fresh password; removing wants a code too', async () => {
  const { email, caller } = await addPerson();
  const { secret } = await setUp(caller);
  expect((await caller.call('POST /my/totp')).problem.code, 'no second secret in place of the first').toBe(
    'member.totp_state',
  );
  expect((await caller.call('POST /my/totp/confirm', { body: { code: await codeOf(secret) } })).problem.code).toBe(
    'member.totp_state',
  );
  expect((await caller.call('POST /my/totp/remove', { body: { code: '000000x' } })).problem.code).toBe(
    'session.code_wrong',
  );
  await market.advance('11 minutes');
  for (const route of ['POST /my/totp', 'POST /my/totp/remove'] as const)
    expect((await caller.call(route, { body: { code: '123456' } as never })).problem.code).toBe('session.stale');
  await caller.call('POST /session/password', { body: { password } });
  expect((await caller.call('POST /my/totp/remove', { body: { code: await codeOf(secret) } })).status).toBe(204);
  expect((await caller.call('GET /my/totp')).body).toEqual({ isOn: false, recoveryCodesLeft: 0 });
  expect((await signIn(email)).status).toBe(200);
});

test('setting up ends the other sessions', async () => {
  const { memberId, caller } = await addPerson();
  const other = await market.as(memberId);
  await setUp(caller);
  expect((await other.call('GET /session')).body.member).toBeNull();
  expect((await caller.call('GET /session')).body.member).not.toBeNull();
});

test('where the setting wants it, the desk opens to operators with a second step only', async () => {
  const { caller } = await addPerson('operator');
  const desk = (Object.keys(api) as Route[]).filter((route) => route.includes(' /desk/'));
  expect(desk.length).toBeGreaterThan(5);
  const params = { memberId: randomUUID(), dealCode: 'D-1' } as never;
  const ask = (who: Caller, route: Route) => who.call(route as 'GET /desk/lots', { params });
  for (const route of desk)
    expect((await ask(caller, route)).problem, route).toMatchObject({ status: 403, code: 'session.totp_missing' });
  const buyer = await addPerson();
  expect((await ask(buyer.caller, 'GET /desk/lots')).problem.code).toBe('member.role_missing');

  const { secret } = await setUp(caller);
  expect((await ask(caller, 'GET /desk/lots')).status).toBe(200);
  await market.advance('30 seconds');
  expect((await caller.call('POST /my/totp/remove', { body: { code: await codeOf(secret) } })).status).toBe(204);
  expect((await ask(caller, 'GET /desk/lots')).problem.code).toBe('session.totp_missing');
});

test('where the setting is off, operators need none', async () => {
  const demo = await openMarket();
  try {
    const operator = await demo.as(await addMember(demo, { roles: ['operator'] }));
    expect((await operator.call('GET /desk/lots')).status).toBe(200);
  } finally {
    await demo.close();
  }
});
