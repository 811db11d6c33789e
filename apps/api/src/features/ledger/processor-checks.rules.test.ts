import { expect, test } from 'vitest';
import type { BalanceTransaction } from '../../platform/payments.ts';
import { compareMovements } from './processor-checks.rules.ts';

const now = new Date('2026-03-02T12:00:00Z');
const movement = (id: string, ageS: number, netMinor = 100): BalanceTransaction => ({
  id,
  kind: 'charge',
  amountMinor: netMinor,
  feeMinor: 0,
  netMinor,
  sourceId: 'x',
  at: new Date(now.getTime() - ageS * 1000),
});
const compare = (seen: BalanceTransaction[], posted: string[], postedAgeS = 60) =>
  compareMovements({
    seen,
    posted: posted.map((transactionId) => ({ transactionId, at: new Date(now.getTime() - postedAgeS * 1000) })),
    now,
    patienceMs: 120_000,
  });

test('what is on both sides is no difference', () => {
  expect(compare([movement('a', 900)], ['a'])).toEqual({ missing: [], unknown: [], onItsWayMinor: 0 });
});

test('an old movement that is not posted is missing, a young one is on its way', () => {
  const old = movement('old', 900);
  const young = movement('young', 5, -70);
  expect(compare([old, young], [])).toEqual({ missing: [old], unknown: [], onItsWayMinor: -70 });
});

test('a posting that the processor does not know is told', () => {
  expect(compare([movement('a', 900)], ['a', 'b']).unknown).toEqual(['b']);
});

test('a posting older than the matched days is left to the balance', () => {
  expect(compare([], ['a'], 31 * 86_400).unknown).toEqual([]);
});
