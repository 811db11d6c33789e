import type { Quantiles, Spread } from '../types.ts';
import type { FindQuantiles } from './quantile-finder.ts';

/** The probability of each stored quantile, in per cent. */
export const percentOf: Readonly<Record<keyof Quantiles, number>> = {
  p0_15: 0.15,
  p01: 1,
  p05: 5,
  p10: 10,
  p25: 25,
  p50: 50,
  p75: 75,
  p90: 90,
  p95: 95,
  p99: 99,
  p99_5: 99.5,
  p99_85: 99.85,
};
const names = Object.keys(percentOf) as (keyof Quantiles)[];
const probabilities = names.map((name) => percentOf[name] / 100);

export function quantilesOf(values: Float64Array, find: FindQuantiles): Quantiles {
  const found = find(values, probabilities);
  return Object.fromEntries(names.map((name, i) => [name, found[i]])) as Record<keyof Quantiles, number>;
}

export function spreadOf(values: Float64Array, find: FindQuantiles): Spread {
  const { mean, variance } = meanAndVariance(values);
  return { mean, sd: Math.sqrt(variance), quantiles: quantilesOf(values, find) };
}

export function medianOf(values: Float64Array, find: FindQuantiles): number {
  return find(values, [0.5])[0] as number;
}

/** Mean and variance (divided by one less than the number of values, as in JCGM 101:2008, 7.6). */
export function meanAndVariance(values: Float64Array): { mean: number; variance: number } {
  const { length } = values;
  let sum = 0;
  for (let i = 0; i < length; i += 1) sum += values[i] as number;
  const mean = sum / length;
  let squares = 0;
  for (let i = 0; i < length; i += 1) {
    const off = (values[i] as number) - mean;
    squares += off * off;
  }
  return { mean, variance: squares / (length - 1) };
}
