import { requireBetween, requirePositive } from '../argument.ts';

/** Share of the declared mass within which a weigh-in agrees with it; the market's weighing tolerance. */
const toleranceShare = 0.005;

export interface MassDifference {
  /** Found less declared, grams; negative when mass is short. */
  differenceG: number;
  toleranceG: number;
  withinTolerance: boolean;
  /** Share of the declared mass that counts as lost: the whole shortage once it is beyond the tolerance, never an excess. */
  loss: number;
}

/**
 * Compares a declared net mass with the one weighed in. The tolerance is the greater of 0.5 % of the declared mass and twice
 * the scale's resolution; a difference of just that much is within it.
 * @throws {RangeError} naming the mass or resolution that is out of its range
 */
export function massDifference(
  declaredG: number,
  foundG: number,
  { resolutionG }: { resolutionG: number },
): MassDifference {
  requirePositive('declaredG', declaredG);
  requireBetween('foundG', foundG, 0);
  requireBetween('resolutionG', resolutionG, 0);
  const differenceG = foundG - declaredG;
  const toleranceG = Math.max(declaredG * toleranceShare, 2 * resolutionG);
  // A nanogram of slack: 10.05 kg − 10 kg must count as 50 g although its binary form is a trace more.
  const withinTolerance = Math.abs(differenceG) <= toleranceG + 1e-9;
  return {
    differenceG,
    toleranceG,
    withinTolerance,
    loss: withinTolerance ? 0 : Math.max(0, -differenceG / declaredG),
  };
}
