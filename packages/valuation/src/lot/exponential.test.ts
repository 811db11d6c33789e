import fc from 'fast-check';
import { expect, test } from 'vitest';
import { exponentials, mostExponent } from './exponential.ts';

const exponentialOf = (x: number, scale = 1): number => {
  const one = Float64Array.of(x);
  exponentials(one, scale);
  return one[0] as number;
};

test('agrees with Math.exp to 14 digits wherever it may be used', () => {
  fc.assert(
    fc.property(fc.double({ min: -mostExponent, max: mostExponent, noNaN: true }), (x) => {
      expect(Math.abs(exponentialOf(x) / Math.exp(x) - 1)).toBeLessThan(1e-14);
    }),
    { numRuns: 5000 },
  );
});

test('is exact at 0 and scales what it finds', () => {
  expect(exponentialOf(0)).toBe(1);
  expect(exponentialOf(1, 250)).toBeCloseTo(250 * Math.E, 11);
});

test('turns sums into products', () => {
  const some = fc.double({ min: -50, max: 50, noNaN: true });
  fc.assert(
    fc.property(some, some, (a, b) => {
      expect(exponentialOf(a + b) / (exponentialOf(a) * exponentialOf(b))).toBeCloseTo(1, 12);
    }),
  );
});
