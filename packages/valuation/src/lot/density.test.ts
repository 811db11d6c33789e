import { expect, test } from 'vitest';
import { quantileOf } from '../quantity/quantile.ts';
import { lognormal } from '../quantity/quantity.ts';
import { densityOf } from './density.ts';
import { createQuantileFinder } from './quantile-finder.ts';
import { spreadOf } from './quantiles.ts';

const n = 10_000;
const find = createQuantileFinder(n);
const drawn = Float64Array.from({ length: n }, (_, i) => quantileOf(lognormal(50, 1.6), (i + 0.5) / n));

test('96 bins from p0.15 to p99.85 that hold 99.7 % of the probability', () => {
  const { fromG, toG, perG } = densityOf(drawn, spreadOf(drawn, find));
  expect(perG).toHaveLength(96);
  expect(fromG).toBeCloseTo(quantileOf(lognormal(50, 1.6), 0.0015), 0);
  const width = (toG - fromG) / 96;
  expect(perG.reduce((sum, density) => sum + density * width, 0)).toBeCloseTo(0.997, 3);
});

test('the peak stands at the mode of the lognormal, at its height', () => {
  const { fromG, toG, perG } = densityOf(drawn, spreadOf(drawn, find));
  const sigma = Math.log(1.6);
  const mode = 50 * Math.exp(-(sigma ** 2));
  const height = (1 / (mode * sigma * Math.sqrt(2 * Math.PI))) * Math.exp(-(sigma ** 2) / 2);
  const peak = perG.indexOf(Math.max(...perG));
  const width = (toG - fromG) / 96;
  expect(Math.abs(fromG + (peak + 0.5) * width - mode)).toBeLessThan(2 * width);
  expect((perG[peak] as number) / height).toBeCloseTo(1, 1);
});

test('draws without spread have no density to draw', () => {
  const same = new Float64Array(n).fill(3);
  expect(densityOf(same, spreadOf(same, find))).toEqual({ fromG: 3, toG: 3, perG: new Array(96).fill(0) });
});
