import { Decimal } from 'decimal.js';
import { requireBetween } from '../argument.ts';
import { massDifference } from './mass-difference.ts';
import { requireMinor } from './share-of.ts';

/** Lines that were put on the scale together, with their share of the lot's estimated gold, 0 … 1. */
export interface WeighedLines {
  estimateShare: number;
  declaredG: number;
  foundG: number;
  resolutionG: number;
}

/**
 * What comes off the price of an outright lot whose mass is short: price · Σ share of the estimate · loss, rounded once half to
 * even, and never more than the price.
 * @returns whole minor units, 0 … priceMinor
 * @throws {RangeError} naming the amount, share or mass that is out of its range
 */
export function massShortAdjustment(priceMinor: number, weighed: readonly WeighedLines[]): number {
  requireMinor('priceMinor', priceMinor);
  const loss = weighed.reduce((sum, { estimateShare, declaredG, foundG, resolutionG }) => {
    requireBetween('estimateShare', estimateShare, 0, 1);
    return sum.plus(new Decimal(massDifference(declaredG, foundG, { resolutionG }).loss).times(estimateShare));
  }, new Decimal(0));
  const adjustment = loss.times(priceMinor).toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN).toNumber();
  return Math.min(priceMinor, adjustment);
}
