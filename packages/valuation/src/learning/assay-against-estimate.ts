import { requireBetween, requirePositive } from '../argument.ts';
import { normalQuantile } from '../quantity/normal-distribution.ts';
import type { Estimate } from '../types.ts';
import { rankIn } from './rank-in.ts';

export interface AssayVerdict {
  /** ln(assay / middle of the estimate); above 0 when there was more than estimated. */
  logRatio: number;
  /** Share of the estimate that lies below the assay, 0 … 1. */
  rank: number;
  /** Whether it lies between p25 and p75, and between p10 and p90. */
  insideHalf: boolean;
  insideEighty: boolean;
  /** Difference over the expanded uncertainties of both, on the log scale; beyond ±1 they contradict each other. */
  normalizedError: number;
}

/**
 * How a settled assay lies in the estimate that was sold.
 * @param estimate the frozen one
 * @param assayG gold found, grams, above 0
 * @param relativeSd of the assay, laboratory and sampling together, 0 … 1
 * @throws {RangeError} naming the figure that is out of its range, or when the estimate is of no gold
 */
export function assayAgainstEstimate(
  { goldG, beadsG }: Pick<Estimate, 'goldG' | 'beadsG'>,
  { assayG, relativeSd }: { assayG: number; relativeSd: number },
): AssayVerdict {
  requirePositive('assayG', assayG);
  requireBetween('relativeSd', relativeSd, 0, 1);
  const { p10, p25, p50, p75, p90 } = goldG.quantiles;
  requirePositive('estimate.goldG.quantiles.p10', p10);
  const logRatio = Math.log(assayG / p50);
  const estimateSd = Math.log(p90 / p10) / (2 * normalQuantile(0.9));
  const assaySd = Math.sqrt(Math.log(1 + relativeSd ** 2));
  return {
    logRatio,
    rank: rankIn({ goldG, beadsG }, assayG),
    insideHalf: assayG >= p25 && assayG <= p75,
    insideEighty: assayG >= p10 && assayG <= p90,
    normalizedError: scores({ value: logRatio, sd: assaySd, reference: 0, referenceSd: estimateSd }).normalizedError,
  };
}

/**
 * How a result agrees with a reference: zeta = difference / √(sd² + referenceSd²); E_n the same with expanded uncertainties,
 * twice the sd. Both 0 when nothing differs, infinite when something does though nothing is uncertain.
 * Source: ISO 13528:2022, 9.6 and 9.7 (from memory).
 */
export function scores(of: { value: number; sd: number; reference: number; referenceSd: number }): {
  zeta: number;
  normalizedError: number;
} {
  const difference = of.value - of.reference;
  const sd = Math.hypot(of.sd, of.referenceSd);
  const zeta = difference === 0 ? 0 : difference / sd;
  return { zeta, normalizedError: zeta / 2 };
}
