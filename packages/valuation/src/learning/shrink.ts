import { requireBetween, requirePositive } from '../argument.ts';

export interface Belief {
  mean: number;
  sd: number;
}

/**
 * A measurement shrunk towards what was thought before, each weighed by its precision 1/sd².
 * @param prior sd above 0
 * @param measured sd above 0
 * @throws {RangeError} naming the sd that is not above 0
 * Source: normal–normal conjugate pair, A. Gelman et al., Bayesian Data Analysis, section 2.5.
 */
export function shrink(prior: Belief, measured: Belief): Belief {
  requirePositive('prior.sd', prior.sd);
  requirePositive('measured.sd', measured.sd);
  const [before, given] = [prior.sd ** -2, measured.sd ** -2];
  return {
    mean: (prior.mean * before + measured.mean * given) / (before + given),
    sd: Math.sqrt(1 / (before + given)),
  };
}

/**
 * Share of their distance from the common mean that equally uncertain averages should keep: 1 − (k − 3)·sd² / Σ(y − ȳ)²,
 * not below 0. The spread between the true values follows: their variance is share / (1 − share) · sd².
 * @param averages at least four
 * @param sd of one average, above 0
 * @throws {RangeError} when there are fewer than four averages or the sd is not above 0
 * Source: B. Efron and C. Morris, Stein's paradox in statistics, Scientific American 236 (1977) 119–127.
 */
export function keptShare(averages: readonly number[], sd: number): number {
  requireBetween('averages.length', averages.length, 4);
  requirePositive('sd', sd);
  const mean = averages.reduce((sum, value) => sum + value, 0) / averages.length;
  const squares = averages.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  return squares === 0 ? 0 : Math.max(0, 1 - ((averages.length - 3) * sd ** 2) / squares);
}
