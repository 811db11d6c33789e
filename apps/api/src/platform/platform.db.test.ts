import { afterAll, beforeAll, expect, test } from 'vitest';
import { addMember } from '../../test/factories.ts';
import { openMarket, type Market } from '../../test/market.ts';
import { addToOutbox, createOutboxRunner, HopelessEffect } from './outbox.ts';

let market: Market;
beforeAll(async () => {
  market = await openMarket();
});
afterAll(() => market.close());

test('a rolled-back transaction leaves no effect behind, a committed one exactly one', async () => {
  const seen: string[] = [];
  const runner = createOutboxRunner(market.db, { ping: async ({ key }) => void seen.push(key) }, () => {});
  const order = (key: string) => ({ kind: 'ping', key, payload: {} });
  await market.db.transaction(async (tx) => {
    await addToOutbox(tx, order('a'));
    await addToOutbox(tx, order('a'));
  });
  await market.db
    .transaction(async (tx) => {
      await addToOutbox(tx, order('b'));
      throw new Error('no');
    })
    .catch(() => {});
  expect(await runner.runAll()).toBe(1);
  expect(seen).toEqual(['a']);
  expect(await runner.runAll()).toBe(0);
});

test('a failing effect waits for its next attempt, a hopeless one is set aside', async () => {
  const errors: unknown[] = [];
  const runner = createOutboxRunner(
    market.db,
    {
      flaky: () => Promise.reject(new Error('down')),
      lost: () => Promise.reject(new HopelessEffect('never')),
    },
    (error) => errors.push(error),
  );
  await market.db.transaction(async (tx) => {
    await addToOutbox(tx, { kind: 'flaky', key: 'f', payload: {} });
    await addToOutbox(tx, { kind: 'lost', key: 'l', payload: {} });
  });
  expect(await runner.runAll()).toBe(2);
  const rows = await market.db.query(
    `select key, state, attempts, last_error, next_at > clock_timestamp() as later from outbox where kind in ('flaky', 'lost') order by key`,
  );
  expect(rows).toEqual([
    { key: 'f', state: 'pending', attempts: 1, last_error: 'down', later: true },
    { key: 'l', state: 'dead', attempts: 1, last_error: 'never', later: true },
  ]);
  expect(errors).toHaveLength(2);
});

test('an unknown address and a cross-site call are refused as problems', async () => {
  const visitor = market.visitor();
  const lost = await visitor.fetch('/api/nowhere');
  expect(lost.status).toBe(404);
  expect(await lost.json()).toMatchObject({ code: 'route.not_found', status: 404 });
  expect(lost.headers.get('content-security-policy')).toContain("default-src 'none'");
});

test('refresh tokens rotate: a lost answer is forgiven, reuse after that ends the session', async () => {
  const memberId = await addMember(market);
  const { sessions } = market.world;
  const begun = await market.db.transaction((tx) =>
    sessions.begin(tx, { memberId, roles: ['buyer'], device: 'test', ip: '' }),
  );
  const lostAnswer = await sessions.renew(begun.refresh);
  const second = await sessions.renew(begun.refresh);
  expect(lostAnswer).not.toBeNull();
  expect(second).not.toBeNull();
  expect(await sessions.renew(second!.refresh)).not.toBeNull();
  expect(await sessions.renew(begun.refresh)).toBeNull();
  expect(await sessions.renew(second!.refresh)).toBeNull();
});
