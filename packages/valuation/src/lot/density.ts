import type { Estimate } from '../types.ts';
import { meanAndVariance, quantilesOf, sortedQuantile } from './quantiles.ts';

const bins = 96;

/**
 * Density of the draws on 96 equal bins from p0.15 to p99.85, smoothed by a normal kernel of Silverman's width.
 * Source: B. W. Silverman, Density Estimation for Statistics and Data Analysis, 1986, eq. 3.31.
 * @param sorted ascending draws in grams
 * @returns probability per gram; all zero when the draws have no spread
 */
export function densityOf(sorted: Float64Array): Estimate['density'] {
  const { p0_15: fromG, p99_85: toG } = quantilesOf(sorted);
  const widthG = (toG - fromG) / bins;
  if (!(widthG > 0)) return { fromG, toG, perG: new Array<number>(bins).fill(0) };
  const counts = countBins(sorted, fromG, widthG);
  const smooth = smoothed(counts, bandwidthOf(sorted) / widthG);
  return { fromG, toG, perG: smooth.map((count) => count / (sorted.length * widthG)) };
}

function countBins(sorted: Float64Array, fromG: number, widthG: number): number[] {
  const counts = new Array<number>(bins).fill(0);
  for (const value of sorted) {
    const bin = Math.floor((value - fromG) / widthG);
    if (bin >= 0 && bin < bins) counts[bin] = (counts[bin] as number) + 1;
  }
  return counts;
}

function bandwidthOf(sorted: Float64Array): number {
  const { variance } = meanAndVariance(sorted);
  const quartiles = (sortedQuantile(sorted, 0.75) - sortedQuantile(sorted, 0.25)) / 1.34;
  return 0.9 * Math.min(Math.sqrt(variance), quartiles || Infinity) * sorted.length ** -0.2;
}

/** What the kernel carries over an end is reflected back, so no probability is lost. */
function smoothed(counts: readonly number[], bandwidthBins: number): number[] {
  const reach = Math.min(bins - 1, Math.ceil(3 * bandwidthBins));
  const kernel = Array.from({ length: 2 * reach + 1 }, (_, i) => Math.exp(-(((i - reach) / bandwidthBins) ** 2) / 2));
  const weight = kernel.reduce((sum, value) => sum + value, 0);
  const smooth = new Array<number>(bins).fill(0);
  counts.forEach((count, bin) => {
    kernel.forEach((value, i) => {
      const to = reflected(bin + i - reach);
      smooth[to] = (smooth[to] as number) + (count * value) / weight;
    });
  });
  return smooth;
}

function reflected(bin: number): number {
  if (bin < 0) return -1 - bin;
  return bin < bins ? bin : 2 * bins - 1 - bin;
}
