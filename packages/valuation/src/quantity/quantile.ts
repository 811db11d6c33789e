import type { Quantity } from '../types.ts';
import { normalProbability, normalQuantile } from './normal-distribution.ts';

/**
 * The value that `quantity` stays below with the given probability (inverse distribution function).
 * @param probability strictly between 0 and 1
 * @throws {RangeError} when the probability is 0, 1 or outside
 */
export function quantileOf(quantity: Quantity, probability: number): number {
  if (!(probability > 0 && probability < 1))
    throw new RangeError(`probability must be between 0 and 1: ${probability}`);
  switch (quantity.kind) {
    case 'exact':
      return quantity.value;
    case 'uniform':
      return quantity.lo + (quantity.hi - quantity.lo) * probability;
    case 'triangular':
      return triangularQuantile(quantity, probability);
    case 'normal':
      return truncatedNormalQuantile(quantity, probability);
    case 'lognormal':
      return quantity.median * Math.exp(Math.log(quantity.gsd) * normalQuantile(probability));
  }
}

type Of<Kind extends Quantity['kind']> = Extract<Quantity, { kind: Kind }>;

function triangularQuantile({ lo, mode, hi }: Of<'triangular'>, probability: number): number {
  const width = hi - lo;
  if (width === 0) return lo;
  return probability < (mode - lo) / width
    ? lo + Math.sqrt(probability * width * (mode - lo))
    : hi - Math.sqrt((1 - probability) * width * (hi - mode));
}

function truncatedNormalQuantile({ mean, sd }: Of<'normal'>, probability: number): number {
  if (sd === 0) return mean;
  const below = normalProbability(-mean / sd);
  // Taken from the upper tail, whose small probabilities keep their digits.
  return Math.max(0, mean - sd * normalQuantile((1 - probability) * (1 - below)));
}
