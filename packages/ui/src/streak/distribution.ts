import type { StreakEstimate } from './streak-types.ts';

export interface Distribution {
  /** Ends of the drawn part, p0.15 and p99.85, grams. */
  fromG: number;
  toG: number;
  /** Smoothed density per gram; 0 outside the bins. */
  densityAt: (goldG: number) => number;
  /** Grams at a probability of 0 … 1 within the bins. */
  quantileAt: (probability: number) => number;
}

/** One binomial pass (1, 2, 1) / 4: the bins come from draws, and their noise is no part of the message. */
function smoothOnce(values: readonly number[]): number[] {
  return values.map((value, i) => ((values[i - 1] ?? value) + 2 * value + (values[i + 1] ?? value)) / 4);
}

/** Reads an estimate's stored bins as a continuous density and its inverse sum. */
export function distributionOf(estimate: StreakEstimate): Distribution {
  const { fromG, toG, perG } = estimate.density;
  const binG = (toG - fromG) / perG.length;
  let smooth = [...perG];
  for (let pass = 0; pass < 4; pass++) smooth = smoothOnce(smooth);

  const sums = [0];
  for (const value of smooth) sums.push((sums.at(-1) ?? 0) + value);
  const total = sums.at(-1) || 1;

  const densityAt = (goldG: number) => {
    if (goldG < fromG || goldG > toG || binG <= 0) return 0;
    const position = (goldG - fromG) / binG - 0.5;
    const left = Math.floor(position);
    const at = (i: number) => smooth[Math.min(Math.max(i, 0), smooth.length - 1)] ?? 0;
    return at(left) + (at(left + 1) - at(left)) * (position - left);
  };

  const quantileAt = (probability: number) => {
    const wanted = probability * total;
    let bin = sums.findIndex((sum) => sum >= wanted) - 1;
    if (bin < 0) bin = 0;
    const below = sums[bin] ?? 0;
    const inBin = (sums[bin + 1] ?? total) - below;
    return fromG + (bin + (inBin > 0 ? (wanted - below) / inBin : 0)) * binG;
  };

  const { p0_15, p99_85 } = estimate.goldG.quantiles;
  return { fromG: Math.max(p0_15, fromG), toG: Math.min(p99_85, toG), densityAt, quantileAt };
}
