import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { cookieNames } from '../../platform/session-cookies.ts';

let market: Market;
let visitor: Caller;
beforeAll(async () => {
  market = await openMarket();
});
beforeEach(() => {
  visitor = market.visitor();
  market.mails.length = 0;
});
afterAll(() => market.close());

const password = 'copper lantern sundial';
let number = 0;
const person = (extra: object = {}) => ({
  email: `Person${(number += 1)}@Members.example`,
  password,
  name: 'Sallowby Recovery',
  place: 'Sallowby',
  roles: ['buyer' as const],
  ...extra,
});

const tokenIn = (text: string): string => /token=([\w.-]+)/.exec(text)![1]!;

/** Registers somebody, confirms the address and signs in. */
async function join(extra: object = {}) {
  const body = person(extra);
  await visitor.call('POST /members', { body });
  await market.work();
  const mail = market.mails.find((one) => one.to === body.email.toLowerCase())!;
  await visitor.call('POST /members/confirm', { body: { token: tokenIn(mail.text) } });
  const reply = await visitor.call('POST /session', { body: { email: body.email, password } });
  expect(reply.status).toBe(200);
  return { body, caller: visitor };
}

test('register, confirm by mail, sign in, see the session, sign out', async () => {
  const body = person();
  expect((await visitor.call('POST /members', { body })).status).toBe(202);
  const early = await visitor.call('POST /session', { body: { email: body.email, password } });
  expect(early.problem.code).toBe('session.email_unconfirmed');
  await market.work();
  const token = tokenIn(market.mails[0]!.text);
  expect((await visitor.call('POST /members/confirm', { body: { token } })).status).toBe(204);
  expect((await visitor.call('POST /members/confirm', { body: { token } })).problem.code).toBe('member.token_spent');

  const signedIn = await visitor.call('POST /session', { body: { email: body.email, password } });
  expect(signedIn.body.member).toMatchObject({
    email: body.email.toLowerCase(),
    roles: ['buyer'],
    verified: false,
    limitMinor: 200_000,
  });
  expect((await visitor.call('GET /sessions')).body).toHaveLength(1);
  expect((await visitor.call('DELETE /session')).headers.get('clear-site-data')).toContain('storage');
  expect((await visitor.call('GET /session')).body.member).toBeNull();
});

test('cookies are host-bound, secure, unreadable for scripts, and no token stands in a body', async () => {
  const body = person();
  await visitor.call('POST /members', { body });
  await market.work();
  await visitor.call('POST /members/confirm', { body: { token: tokenIn(market.mails[0]!.text) } });
  const reply = await visitor.call('POST /session', { body: { email: body.email, password } });
  const [access, refresh] = reply.headers.getSetCookie();
  expect(access).toMatch(/^__Host-lydite-access=.*; Path=\/; .*HttpOnly; Secure; SameSite=Lax/);
  expect(refresh).toMatch(/^__Host-lydite-refresh=.*; Path=\/; .*HttpOnly; Secure; SameSite=Strict/);
  for (const value of visitor.cookies.values()) expect(reply.bytes.toString()).not.toContain(value);
});

test('registering a known address looks the same from outside; its owner is told', async () => {
  const { body } = await join();
  market.mails.length = 0;
  const again = await market.visitor().call('POST /members', { body: { ...body, name: 'Somebody else' } });
  expect(again.status).toBe(202);
  await market.work();
  expect(market.mails).toMatchObject([{ to: body.email.toLowerCase(), subject: 'You already have an account' }]);
});

test('wrong passwords are slowed down after five, whether the account exists or not; the way by mail stays open', async () => {
  const { body } = await join();
  for (const email of [body.email, 'nobody@members.example']) {
    const codes = [];
    for (let i = 0; i < 6; i += 1)
      codes.push(
        (await market.visitor().call('POST /session', { body: { email, password: 'wrong wrong wrong' } })).problem.code,
      );
    expect(codes.at(-1)).toBe('request.too_many');
  }
  // Five more, so that the wait outlasts this test on a slow machine.
  await market.db.query(
    `insert into sign_in_failures (key) select 'account:' || lower($1) from generate_series(1, 5)`,
    [body.email],
  );
  const slowed = await market.visitor().call('POST /session', { body: { email: body.email, password } });
  expect(slowed.status).toBe(429);
  expect(Number(slowed.headers.get('retry-after'))).toBeGreaterThan(0);
  market.mails.length = 0;
  expect((await market.visitor().call('POST /password-resets', { body: { email: body.email } })).status).toBe(202);
  await market.work();
  const token = tokenIn(market.mails[0]!.text);
  const fresh = 'walnut harbour telescope';
  expect((await visitor.call('POST /password-resets/complete', { body: { token, password: fresh } })).status).toBe(204);
  expect(
    (await visitor.call('POST /password-resets/complete', { body: { token, password: fresh } })).problem.code,
  ).toBe('member.token_spent');
  await market.advance('20 minutes');
  expect((await market.visitor().call('POST /session', { body: { email: body.email, password: fresh } })).status).toBe(
    200,
  );
});

test('many wrong passwords at once do not slip past the brake', async () => {
  const email = 'burst@members.example';
  const statuses = await Promise.all(
    Array.from(
      { length: 20 },
      async () =>
        (await market.visitor().call('POST /session', { body: { email, password: 'wrong and wrong' } })).status,
    ),
  );
  // Five are free; one more may come due while they are worked off.
  expect(statuses.filter((status) => status === 401).length).toBeLessThanOrEqual(7);
  expect(statuses.filter((status) => status === 429).length).toBeGreaterThanOrEqual(13);
});

test('asking again and again fills no mailbox, and a reset makes the other links worthless', async () => {
  const { body } = await join();
  market.mails.length = 0;
  for (let i = 0; i < 8; i += 1) {
    await market.visitor().call('POST /password-resets', { body: { email: body.email } });
    await market.visitor().call('POST /members', { body });
  }
  await market.work();
  const subjects = market.mails.map(({ subject }) => subject);
  expect(subjects.filter((subject) => subject === 'Set a new password')).toHaveLength(5);
  expect(subjects.filter((subject) => subject === 'You already have an account').length).toBeLessThanOrEqual(2);
  const tokens = market.mails
    .filter(({ subject }) => subject === 'Set a new password')
    .map(({ text }) => tokenIn(text));
  const complete = (token: string) =>
    market.visitor().call('POST /password-resets/complete', { body: { token, password: 'walnut harbour telescope' } });
  expect((await complete(tokens[0]!)).status).toBe(204);
  expect((await complete(tokens[1]!)).problem.code).toBe('member.token_spent');
});

test('changing the password needs the old one and ends the other sessions', async () => {
  const { body, caller } = await join();
  const other = market.visitor();
  await other.call('POST /session', { body: { email: body.email, password } });
  const weak = await caller.call('POST /password', {
    body: { currentPassword: password, newPassword: 'password1234' },
  });
  expect(weak.problem).toMatchObject({ code: 'member.password_weak', fields: [{ path: 'newPassword' }] });
  const wrong = await caller.call('POST /password', {
    body: { currentPassword: 'not the old one', newPassword: 'walnut harbour telescope' },
  });
  expect(wrong.problem.code).toBe('session.wrong_credentials');
  expect(
    (
      await caller.call('POST /password', {
        body: { currentPassword: password, newPassword: 'walnut harbour telescope' },
      })
    ).status,
  ).toBe(204);
  expect((await other.call('GET /session')).body.member).toBeNull();
  expect((await caller.call('GET /session')).body.member).not.toBeNull();
});

test('a member sees and ends own sessions; another’s answers 404', async () => {
  const { body, caller } = await join();
  const phone = market.visitor();
  await phone.call('POST /session', { body: { email: body.email, password } });
  const other = (await caller.call('GET /sessions')).body.find((one) => !one.current)!;
  const stranger = await market.as(await addMember(market));
  expect((await stranger.call('DELETE /sessions/:sessionId', { params: { sessionId: other.id } })).status).toBe(404);
  expect((await phone.call('GET /session')).body.member).not.toBeNull();
  expect((await caller.call('DELETE /sessions/:sessionId', { params: { sessionId: other.id } })).status).toBe(204);
  expect((await phone.call('GET /session')).body.member).toBeNull();
});

test('the session view of an ended session is a visitor’s, and unsafe calls answer 401', async () => {
  const { caller } = await join();
  const kept = new Map(caller.cookies);
  await caller.call('DELETE /session');
  for (const [name, value] of kept) caller.cookies.set(name, value);
  const change = { name: 'Sallowby Recovery', place: 'Sallowby', roles: ['buyer' as const] };
  expect((await caller.call('PUT /members/me', { body: change })).status).toBe(401);
  expect((await caller.call('GET /session')).body.member).toBeNull();
});

test('a profile change counts at once: the new role opens its routes', async () => {
  const { caller } = await join();
  expect((await caller.call('GET /my/lots')).status).toBe(403);
  const before = caller.cookies.get(cookieNames.access);
  const reply = await caller.call('PUT /members/me', {
    body: { name: 'Sallowby Recovery', place: 'Sallowby', roles: ['buyer', 'seller'] },
  });
  expect(reply.body.roles).toEqual(['buyer', 'seller']);
  expect(caller.cookies.get(cookieNames.access)).not.toBe(before);
  expect((await caller.call('GET /my/lots')).status).toBe(200);
});

test('idle and absolute limits end a session', async () => {
  const { caller } = await join();
  await market.advance('9 hours');
  expect((await caller.call('GET /session')).body.member).toBeNull();
  expect((await caller.call('POST /session/refresh')).body.member).toBeNull();
});

test('nobody is left without a role; an operator needs neither selling nor buying', async () => {
  const none = { name: 'Sallowby Recovery', place: 'Sallowby', roles: [] };
  const { caller } = await join();
  expect((await caller.call('PUT /members/me', { body: none })).problem).toMatchObject({ fields: [{ path: 'roles' }] });
  expect((await caller.call('GET /session')).body.member!.roles).toEqual(['buyer']);
  const operator = await market.as(await addMember(market, { roles: ['operator'] }));
  expect((await operator.call('PUT /members/me', { body: none })).body.roles).toEqual(['operator']);
});
