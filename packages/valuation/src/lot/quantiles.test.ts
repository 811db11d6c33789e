import { expect, test } from 'vitest';
import { createQuantileFinder } from './quantile-finder.ts';
import { meanAndVariance, medianOf, quantilesOf, spreadOf } from './quantiles.ts';

const eight = Float64Array.of(9, 4, 2, 5, 4, 7, 4, 5);

test('mean and variance of 2, 4, 4, 4, 5, 5, 7, 9', () => {
  const { mean, variance } = meanAndVariance(eight);
  expect(mean).toBe(5);
  expect(variance).toBeCloseTo(32 / 7, 12);
  expect(spreadOf(eight, createQuantileFinder(8)).sd).toBeCloseTo(Math.sqrt(32 / 7), 12);
});

test('each quantile stands under its own name', () => {
  const values = Float64Array.from({ length: 2001 }, (_, i) => i / 20);
  const find = createQuantileFinder(values.length);
  expect(quantilesOf(values, find)).toMatchObject({ p0_15: 0.15, p01: 1, p10: 10, p50: 50, p95: 95, p99_85: 99.85 });
  expect(medianOf(values, find)).toBe(50);
});
