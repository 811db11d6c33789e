import { lognormal, quantileOf, uniform, type Quantity } from '@lydite/valuation';
import { expect, test } from 'vitest';
import { drawPlan } from '../../packages/valuation/src/lot/draw-plan.ts';
import type { LinePlan, Term } from '../../packages/valuation/src/lot/lot-plan.types.ts';
import { createQuantileFinder } from '../../packages/valuation/src/lot/quantile-finder.ts';
import { meanAndVariance } from '../../packages/valuation/src/lot/quantiles.ts';
import { momentOf } from '../../packages/valuation/src/quantity/moment.ts';

/** The 95 % interval that leaves as much out below as above. */
const interval = (values: Float64Array) =>
  createQuantileFinder(values.length)(values, [0.025, 0.975]) as [number, number];

/** Draws of a plain sum of independent quantities, by the sampler that estimates use. */
function drawSum(quantities: Quantity[], seed: number, draws: number): Float64Array {
  const gold = quantities.map((quantity, i): Term => {
    const factors = [{ key: `${i}`, parameter: 'input', quantity, power: 1 }];
    return { id: `${i}`, name: 'input', constant: 1, factors };
  });
  const line = { gold, mass: null } as unknown as LinePlan;
  return drawPlan({ lines: [line], warnings: [] }, { seed, draws }).goldG;
}

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

// Closed form of the lognormal distribution, recomputed.
test('lognormal, median 250, gsd 2: mean 317.884, sd 249.657, 95 % from 64.26 to 972.63', () => {
  const quantity = lognormal(250, 2);
  const mean = momentOf(quantity, 1);
  expect(mean).toBeCloseTo(317.884, 3);
  expect(Math.sqrt(momentOf(quantity, 2) - mean ** 2)).toBeCloseTo(249.657, 3);
  expect(quantileOf(quantity, 0.025)).toBeCloseTo(64.26, 2);
  expect(quantileOf(quantity, 0.975)).toBeCloseTo(972.63, 2);
});

test('the draws of that lognormal have its mean, sd and quantiles', () => {
  const draws = drawSum([lognormal(250, 2)], 11, 10_000);
  const { mean, variance } = meanAndVariance(draws);
  expect(Math.abs(mean / 317.884 - 1)).toBeLessThan(0.001);
  expect(Math.abs(Math.sqrt(variance) / 249.657 - 1)).toBeLessThan(0.01);
  const [low, high] = interval(draws);
  expect(Math.abs(low / 64.26 - 1)).toBeLessThan(0.001);
  expect(Math.abs(high / 972.63 - 1)).toBeLessThan(0.001);
});
