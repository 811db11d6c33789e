import fc from 'fast-check';
import { quantileSorted } from 'simple-statistics';
import { expect, test } from 'vitest';
import { meanAndVariance, quantilesOf, sortedQuantile, spreadOf } from './quantiles.ts';

test('type 7 interpolates between the neighbours, as in Hyndman and Fan’s definition', () => {
  const sorted = Float64Array.of(1, 2, 3, 4);
  expect(sortedQuantile(sorted, 0)).toBe(1);
  expect(sortedQuantile(sorted, 1)).toBe(4);
  expect(sortedQuantile(sorted, 0.25)).toBe(1.75);
  expect(sortedQuantile(sorted, 0.9)).toBeCloseTo(3.7, 12);
});

test('the median is the one simple-statistics finds', () => {
  fc.assert(
    fc.property(fc.float64Array({ min: 0, max: 1e6, noNaN: true, minLength: 1, maxLength: 200 }), (values) => {
      const sorted = values.toSorted();
      expect(sortedQuantile(sorted, 0.5)).toBeCloseTo(quantileSorted([...sorted], 0.5), 6);
    }),
  );
});

test('quantiles are in order and within the values', () => {
  fc.assert(
    fc.property(fc.float64Array({ min: 0, max: 1e6, noNaN: true, minLength: 2, maxLength: 200 }), (values) => {
      const sorted = values.toSorted();
      const quantiles = Object.values(quantilesOf(sorted));
      expect(quantiles).toEqual(quantiles.toSorted((a, b) => a - b));
      expect(quantiles[0]).toBeGreaterThanOrEqual(sorted[0] as number);
      expect(quantiles.at(-1)).toBeLessThanOrEqual(sorted.at(-1) as number);
    }),
  );
});

test('mean and variance of 2, 4, 4, 4, 5, 5, 7, 9', () => {
  const { mean, variance } = meanAndVariance(Float64Array.of(2, 4, 4, 4, 5, 5, 7, 9));
  expect(mean).toBe(5);
  expect(variance).toBeCloseTo(32 / 7, 12);
  expect(spreadOf(Float64Array.of(2, 4, 4, 4, 5, 5, 7, 9)).sd).toBeCloseTo(Math.sqrt(32 / 7), 12);
});
