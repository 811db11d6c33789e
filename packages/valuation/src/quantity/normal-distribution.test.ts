import fc from 'fast-check';
import { expect, test } from 'vitest';
import { normalProbability, normalQuantile } from './normal-distribution.ts';

// Table 26.1 and 26.5 values of Abramowitz and Stegun's handbook, and symmetry.
test.each([
  [0.5, 0],
  [0.9, 1.2815515655446004],
  [0.975, 1.959963984540054],
  [0.995, 2.5758293035489004],
  [0.9999, 3.719016485455709],
])('the %s quantile is %s', (probability, z) => {
  expect(normalQuantile(probability)).toBeCloseTo(z, 13);
  expect(normalQuantile(1 - probability)).toBeCloseTo(-z, 11);
  expect(normalProbability(z)).toBeCloseTo(probability, 13);
});

test('far tails are followed: one in a thousand million lies above 5.998', () => {
  expect(normalQuantile(1e-9)).toBeCloseTo(-5.9978070150076865, 11);
  expect(normalProbability(-8) / 6.220960574271785e-16).toBeCloseTo(1, 6);
});

test('the quantile undoes the probability', () => {
  fc.assert(
    fc.property(fc.double({ min: -6, max: 5, noNaN: true }), (z) => {
      expect(normalQuantile(normalProbability(z))).toBeCloseTo(z, 8);
    }),
  );
});

test('a probability of 0 or 1 is refused', () => {
  expect(() => normalQuantile(0)).toThrow(RangeError);
  expect(() => normalQuantile(1)).toThrow(RangeError);
});
