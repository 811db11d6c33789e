import type { Quantiles } from '@lydite/valuation';
import { normalCdf } from './normal-cdf.ts';
import type { StreakEstimate } from './streak-types.ts';

function normalQuantile(probability: number): number {
  let [low, high] = [-8, 8];
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (normalCdf(middle) < probability) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

const levels: [keyof Quantiles, number][] = [
  ['p0_15', 0.0015],
  ['p01', 0.01],
  ['p05', 0.05],
  ['p10', 0.1],
  ['p25', 0.25],
  ['p50', 0.5],
  ['p75', 0.75],
  ['p90', 0.9],
  ['p95', 0.95],
  ['p99', 0.99],
  ['p99_5', 0.995],
  ['p99_85', 0.9985],
];

/** An exact lognormal estimate for tests: median in grams, sigma of the log, net mass in grams. */
export function lognormalEstimate(medianG: number, sigma: number, massG = 86_400): StreakEstimate {
  const quantile = (probability: number) => medianG * Math.exp(sigma * normalQuantile(probability));
  const quantiles = Object.fromEntries(levels.map(([name, p]) => [name, quantile(p)])) as unknown as Quantiles;
  const fromG = quantiles.p0_15;
  const toG = quantiles.p99_85;
  const binG = (toG - fromG) / 96;
  const perG = Array.from({ length: 96 }, (_, i) => {
    const g = fromG + (i + 0.5) * binG;
    return Math.exp(-((Math.log(g / medianG) / sigma) ** 2) / 2) / (g * sigma * Math.sqrt(2 * Math.PI));
  });
  const beadsG = Array.from({ length: 50 }, (_, i) => quantile((i + 0.5) / 50));
  return { massG, goldG: { quantiles }, beadsG, density: { fromG, toG, perG } };
}
