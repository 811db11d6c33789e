import type { Estimate, Spread } from '../types.ts';

const bins = 96;

/**
 * Density of the draws on 96 equal bins from p0.15 to p99.85, smoothed by a normal kernel of Silverman's width.
 * Source: B. W. Silverman, Density Estimation for Statistics and Data Analysis, 1986, eq. 3.31.
 * @param goldG draws in grams, in any order
 * @param spread of the same draws
 * @returns probability per gram; all zero when the draws have no spread
 */
export function densityOf(goldG: Float64Array, spread: Spread): Estimate['density'] {
  const { p0_15: fromG, p99_85: toG } = spread.quantiles;
  const widthG = (toG - fromG) / bins;
  if (!(widthG > 0)) return { fromG, toG, perG: new Array<number>(bins).fill(0) };
  const smooth = smoothed(countBins(goldG, fromG, widthG), bandwidthOf(spread, goldG.length) / widthG);
  return { fromG, toG, perG: smooth.map((count) => count / (goldG.length * widthG)) };
}

function countBins(goldG: Float64Array, fromG: number, widthG: number): number[] {
  const counts = new Array<number>(bins).fill(0);
  for (let i = 0; i < goldG.length; i += 1) {
    const bin = Math.floor(((goldG[i] as number) - fromG) / widthG);
    if (bin >= 0 && bin < bins) counts[bin] = (counts[bin] as number) + 1;
  }
  return counts;
}

function bandwidthOf({ sd, quantiles: { p25, p75 } }: Spread, draws: number): number {
  return 0.9 * Math.min(sd, (p75 - p25) / 1.34 || Infinity) * draws ** -0.2;
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
