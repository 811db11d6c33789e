import { requireBetween, requirePositive } from '../argument.ts';

/** What a route is thought to yield before the buyer's own batches are counted. */
export interface YieldPrior {
  /** Recovered over contained, strictly between 0 and 1, and its standard deviation. */
  yield: number;
  sd: number;
  /** Contained gold, grams, after which own batches weigh as much as the prior. */
  effectiveG: number;
}

export interface YieldBatch {
  /** Gold estimated or assayed in what was processed, grams. */
  containedG: number;
  recoveredG: number;
}

export interface JournalYield {
  yield: number;
  sd: number;
  /** Share of the figure that comes from own batches, 0 … 1. */
  ownShare: number;
}

/**
 * A buyer's own yield, shrunk towards the route's: each counts by the gold it stands for. As a beta distribution whose
 * concentration grows with the mass.
 * @throws {RangeError} naming the figure that is out of its range
 * Source: beta–binomial conjugate pair, A. Gelman et al., Bayesian Data Analysis, section 2.4.
 */
export function journalYield(prior: YieldPrior, batches: readonly YieldBatch[]): JournalYield {
  requirePositive('prior.yield', prior.yield);
  requireBetween('prior.yield', prior.yield, 0, 1 - 1e-9);
  requirePositive('prior.effectiveG', prior.effectiveG);
  const most = prior.yield * (1 - prior.yield);
  requirePositive('prior.sd', prior.sd);
  requireBetween('prior.sd', prior.sd, 0, Math.sqrt(most));
  const [containedG, recoveredG] = totalsOf(batches);
  const massG = prior.effectiveG + containedG;
  // A batch may give more than was estimated in it; a yield above 1 is the estimate's error, not the route's.
  const mean = Math.min(1, (prior.yield * prior.effectiveG + recoveredG) / massG);
  const concentration = (most / prior.sd ** 2 - 1) * (massG / prior.effectiveG);
  return {
    yield: mean,
    sd: Math.sqrt((mean * (1 - mean)) / (concentration + 1)),
    ownShare: containedG / massG,
  };
}

function totalsOf(batches: readonly YieldBatch[]): [containedG: number, recoveredG: number] {
  let [contained, recovered] = [0, 0];
  batches.forEach(({ containedG, recoveredG }, i) => {
    requirePositive(`batches[${i}].containedG`, containedG);
    requireBetween(`batches[${i}].recoveredG`, recoveredG, 0);
    contained += containedG;
    recovered += recoveredG;
  });
  return [contained, recovered];
}
