import type { Quantiles, Spread } from '../types.ts';

/**
 * Quantile of ascending values by linear interpolation (type 7).
 * Source: R. J. Hyndman and Y. Fan, Sample quantiles in statistical packages, The American Statistician 50 (1996) 361–365.
 * @param probability 0 … 1
 */
export function sortedQuantile(sorted: Float64Array, probability: number): number {
  const position = (sorted.length - 1) * probability;
  const below = Math.floor(position);
  const low = sorted[below] as number;
  const high = sorted[Math.min(below + 1, sorted.length - 1)] as number;
  return low + (high - low) * (position - below);
}

export function quantilesOf(sorted: Float64Array): Quantiles {
  const at = (percent: number) => sortedQuantile(sorted, percent / 100);
  return {
    p0_15: at(0.15),
    p01: at(1),
    p05: at(5),
    p10: at(10),
    p25: at(25),
    p50: at(50),
    p75: at(75),
    p90: at(90),
    p95: at(95),
    p99: at(99),
    p99_5: at(99.5),
    p99_85: at(99.85),
  };
}

export function spreadOf(sorted: Float64Array): Spread {
  const { mean, variance } = meanAndVariance(sorted);
  return { mean, sd: Math.sqrt(variance), quantiles: quantilesOf(sorted) };
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
