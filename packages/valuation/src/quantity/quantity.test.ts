import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Quantity } from '../types.ts';
import { momentOf } from './moment.ts';
import { quantileOf } from './quantile.ts';
import { about, exact, lognormal, normal, triangular, uniform, within } from './quantity.ts';

const size = fc.double({ min: 0.01, max: 1000, noNaN: true });
const anyQuantity: fc.Arbitrary<Quantity> = fc.oneof(
  size.map(exact),
  fc.tuple(size, size).map(([lo, width]) => uniform(lo, lo + width)),
  fc.tuple(size, size, size).map(([lo, a, b]) => triangular(lo, lo + a, lo + a + b)),
  fc.tuple(size, size).map(([mean, sd]) => normal(mean, sd)),
  fc.tuple(size, fc.double({ min: 1, max: 4, noNaN: true })).map(([median, gsd]) => lognormal(median, gsd)),
);
const probability = fc.double({ min: 0.001, max: 0.999, noNaN: true });

test('quantiles of every kind rise with the probability and are never negative', () => {
  fc.assert(
    fc.property(anyQuantity, probability, probability, (quantity, a, b) => {
      const [low, high] = [quantileOf(quantity, Math.min(a, b)), quantileOf(quantity, Math.max(a, b))];
      expect(low).toBeGreaterThanOrEqual(0);
      expect(high).toBeGreaterThanOrEqual(low);
    }),
  );
});

test('the mean is the integral of the quantiles', () => {
  fc.assert(
    fc.property(anyQuantity, (quantity) => {
      const n = 20_000;
      let sum = 0;
      for (let i = 0; i < n; i += 1) sum += quantileOf(quantity, (i + 0.5) / n);
      expect(momentOf(quantity, 1) / (sum / n)).toBeCloseTo(1, 2);
    }),
    { numRuns: 30 },
  );
});

test('the middle of each kind', () => {
  expect(quantileOf(exact(3), 0.01)).toBe(3);
  expect(quantileOf(uniform(2, 4), 0.25)).toBe(2.5);
  expect(quantileOf(triangular(0, 1, 2), 0.5)).toBe(1);
  expect(quantileOf(triangular(0, 2, 2), 0.25)).toBe(1);
  expect(quantileOf(normal(50, 5), 0.5)).toBeCloseTo(50, 9);
  expect(quantileOf(lognormal(7, 2), 0.5)).toBeCloseTo(7, 12);
});

test('a normal is cut at 0 without a heap of draws there', () => {
  expect(quantileOf(normal(0, 1), 0.5)).toBeCloseTo(0.6744897501960817, 9);
  expect(quantileOf(normal(1, 1), 1e-6)).toBeGreaterThan(0);
});

test('"about 10, give or take 1" holds 95 % between 9 and 11, and "within 5 %" has hard limits', () => {
  expect(quantileOf(about(10, 1), 0.97725)).toBeCloseTo(11, 3);
  expect(within(200, 0.05)).toEqual({ kind: 'uniform', lo: 190, hi: 210 });
  expect(within(200, 0)).toEqual({ kind: 'exact', value: 200 });
});

test('the mean of one over a uniform is the logarithm of its ends over their distance', () => {
  expect(momentOf(uniform(1, 2), -1)).toBeCloseTo(Math.log(2), 5);
});

test.each([
  [() => exact(-1), /value/],
  [() => uniform(2, 1), /uniform\.hi/],
  [() => triangular(1, 0, 2), /triangular\.mode/],
  [() => normal(1, Number.NaN), /normal\.sd/],
  [() => lognormal(0, 2), /lognormal\.median/],
  [() => lognormal(1, 0.9), /lognormal\.gsd/],
  [() => quantileOf(exact(1), 1), /probability/],
] as const)('figures that make no sense are refused by name: %#', (make, name) => {
  expect(make).toThrow(RangeError);
  expect(make).toThrow(name);
});
