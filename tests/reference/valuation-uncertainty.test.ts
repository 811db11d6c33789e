import { lognormal, uniform } from '@lydite/valuation';
import { expect, test } from 'vitest';
import { meanAndVariance } from '../../packages/valuation/src/lot/quantiles.ts';
import { drawSum, interval } from './published/draw-sum.ts';

/*
 * JCGM 101:2008, 9.2.3: four rectangular inputs of mean 0 and standard deviation 1, with a million trials as there. Shifted
 * here by √3 each, since quantities are not negative.
 */
test.each([1, 2, 3])('four rectangles: u(y) = 2.00 and the 95 % interval is ±3.88 (seed %i)', (seed) => {
  const shift = Math.sqrt(3);
  const rectangles = [1, 2, 3, 4].map(() => uniform(0, 2 * shift));
  const centred = drawSum(rectangles, seed, 1_000_000).map((value) => value - 4 * shift);
  const { mean, variance } = meanAndVariance(centred);
  expect(mean).toBeCloseTo(0, 9);
  expect(Math.sqrt(variance)).toBeCloseTo(2, 2);
  const exactHalfWidth = 2 * Math.sqrt(3) * (2 - (3 / 5) ** 0.25);
  expect(exactHalfWidth).toBeCloseTo(3.8794, 4);
  const [low, high] = interval(centred);
  expect(high).toBeCloseTo(exactHalfWidth, 2);
  expect(low).toBeCloseTo(-exactHalfWidth, 2);
});

test('the draws of a lognormal, median 250, gsd 2, have its mean, sd and quantiles', () => {
  const draws = drawSum([lognormal(250, 2)], 11, 10_000);
  const { mean, variance } = meanAndVariance(draws);
  expect(Math.abs(mean / 317.884 - 1)).toBeLessThan(0.001);
  expect(Math.abs(Math.sqrt(variance) / 249.657 - 1)).toBeLessThan(0.01);
  const [low, high] = interval(draws);
  expect(Math.abs(low / 64.26 - 1)).toBeLessThan(0.001);
  expect(Math.abs(high / 972.63 - 1)).toBeLessThan(0.001);
});
