import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Market } from '../../../test/market.ts';
import { nameFirstOperators } from './operators-first.ts';

let market: Market;
beforeAll(async () => void (market = await openMarket()));
afterAll(() => market.close());

beforeEach(() => market.db.query(`delete from member_roles where role = 'operator'`));

let count = 0;
/** The addresses of so many new members, in their order. */
async function addresses(wanted: number): Promise<string[]> {
  const all = Array.from({ length: wanted }, () => `desk-${100 + (count += 1)}@members.example`);
  for (const email of all) await addMember(market, { email, roles: ['buyer'] });
  return all;
}

const operators = async (): Promise<string[]> => {
  const rows: { email: string }[] = await market.db.query(
    `select email from members m join member_roles r on r.member_id = m.id where role = 'operator' order by email`,
  );
  return rows.map(({ email }) => email);
};

test('two members become operators, keep their other roles, and the audit log says so', async () => {
  const pair = await addresses(2);
  await nameFirstOperators(
    market,
    pair.map((email) => email.toUpperCase()),
  );
  expect(await operators()).toEqual(pair);
  const log: { action: string; email: string }[] = await market.db.query(
    `select a.action, m.email from audit_log a join members m on m.id::text = a.object_id where m.email = any($1) order by m.email`,
    [pair],
  );
  expect(log).toEqual(pair.map((email) => ({ action: 'member.grant_operator', email })));
  const roles: { role: string }[] = await market.db.query(
    'select role from member_roles r join members m on m.id = r.member_id where email = $1 order by role',
    [pair[0]],
  );
  expect(roles.map(({ role }) => role)).toEqual(['buyer', 'operator']);
});

test('it is refused once two operators exist, even for the same two', async () => {
  const [first, others] = [await addresses(2), await addresses(2)];
  await nameFirstOperators(market, first);
  for (const pair of [others, [first[0]!, others[0]!], first])
    await expect(nameFirstOperators(market, pair)).rejects.toMatchObject({ code: 'member.role_missing' });
  expect(await operators()).toEqual(first);
});

test('of two runs at once one is refused', async () => {
  const pairs = [await addresses(2), await addresses(2)];
  const runs = await Promise.allSettled(pairs.map((pair) => nameFirstOperators(market, pair)));
  expect(new Set(runs.map(({ status }) => status))).toEqual(new Set(['fulfilled', 'rejected']));
  expect(await operators()).toHaveLength(2);
});

test('unknown, unconfirmed and repeated addresses are refused, and nobody gets the role', async () => {
  const [known, unconfirmed] = await addresses(2);
  await market.db.query('update members set email_confirmed_at = null where email = $1', [unconfirmed]);
  const codeOf = (emails: (string | undefined)[]): Promise<unknown> =>
    nameFirstOperators(market, emails as string[]).catch((error: { code: string }) => error.code);
  expect(await codeOf([known, 'nobody@members.example'])).toBe('member.not_found');
  expect(await codeOf([known, unconfirmed])).toBe('session.email_unconfirmed');
  expect(await codeOf([known, known])).toBe('request.invalid');
  expect(await codeOf([known])).toBe('request.invalid');
  expect(await operators()).toEqual([]);
});
