import fc from 'fast-check';
import { expect, test } from 'vitest';
import { compareAssays, splittingLimitShare } from './compare-assays.ts';
import { resolveByUmpire, umpireFee } from './resolve-by-umpire.ts';

const grade = fc.integer({ min: 0, max: 20_000 }).map((tenths) => tenths / 10);

test('the limit depends on the grade', () => {
  expect([1000, 999.9, 200, 199.9, 0].map(splittingLimitShare)).toEqual([0.06, 0.08, 0.08, 0.1, 0.1]);
});

test('a difference of just the limit is within it, in decimals that binary numbers miss', () => {
  // Mean 500, limit 8 % = 40.
  expect(compareAssays(480, 520).withinLimit).toBe(true);
  expect(compareAssays(479.9, 520).withinLimit).toBe(false);
  // 0.1 + 0.2 and its like: 100.1 and 100.3 have the mean 100.2 exactly.
  expect(compareAssays(100.1, 100.3).meanGPerT).toBe(100.2);
});

test('does not mind the order, and nothing against nothing agrees', () => {
  fc.assert(
    fc.property(grade, grade, (a, b) => {
      expect(compareAssays(a, b)).toEqual(compareAssays(b, a));
    }),
  );
  expect(compareAssays(0, 0)).toMatchObject({ differenceShare: 0, withinLimit: true });
});

test.each([
  [
    'between the two, nearer to the buyer',
    { buyerGPerT: 500, sellerGPerT: 600, umpireGPerT: 530 },
    530,
    'umpire',
    'seller',
  ],
  ['below both', { buyerGPerT: 500, sellerGPerT: 600, umpireGPerT: 450 }, 500, 'buyer', 'seller'],
  ['above both', { buyerGPerT: 500, sellerGPerT: 600, umpireGPerT: 640 }, 600, 'seller', 'buyer'],
  ['just in the middle', { buyerGPerT: 0.1, sellerGPerT: 0.3, umpireGPerT: 0.2 }, 0.2, 'umpire', 'both'],
] as const)('an umpire %s', (_words, grades, settledGPerT, settledBy, feeOwedBy) => {
  expect(resolveByUmpire(grades)).toEqual({ settledGPerT, settledBy, feeOwedBy });
});

test('the settled grade is one of the three and lies between the other two', () => {
  fc.assert(
    fc.property(grade, grade, grade, (buyerGPerT, sellerGPerT, umpireGPerT) => {
      const { settledGPerT } = resolveByUmpire({ buyerGPerT, sellerGPerT, umpireGPerT });
      expect(settledGPerT).toBe([buyerGPerT, sellerGPerT, umpireGPerT].toSorted((a, b) => a - b)[1]);
    }),
  );
});

test('a fee that both owe is halved half to even, and the seller pays the rest', () => {
  expect(umpireFee(9001, 'both')).toEqual({ buyerMinor: 4500, sellerMinor: 4501 });
  expect(umpireFee(9003, 'both')).toEqual({ buyerMinor: 4502, sellerMinor: 4501 });
  expect(umpireFee(9001, 'buyer')).toEqual({ buyerMinor: 9001, sellerMinor: 0 });
  expect(umpireFee(9001, 'seller')).toEqual({ buyerMinor: 0, sellerMinor: 9001 });
});

test('a grade that is none is refused by name', () => {
  expect(() => compareAssays(-1, 5)).toThrow('buyerGPerT');
  expect(() => resolveByUmpire({ buyerGPerT: 1, sellerGPerT: 1, umpireGPerT: 'x' })).toThrow('umpireGPerT');
});
