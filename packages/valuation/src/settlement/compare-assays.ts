import type { Decimal } from 'decimal.js';
import { toDecimal, type Written } from './decimal-argument.ts';

export interface AssayComparison {
  meanGPerT: number;
  /** Larger less smaller. */
  differenceGPerT: number;
  /** Difference as a share of the mean; 0 when both are 0. */
  differenceShare: number;
  limitShare: number;
  /** Whether the mean settles; a difference of just the limit is within it. */
  withinLimit: boolean;
}

/**
 * Splitting limit of the market's term set: about 2.8 between-laboratory standard deviations (ISO 5725, from memory).
 * @param meanGPerT mean of the two assays, g/t
 * @returns share of the mean: 6 % from 1 000 g/t on, 8 % from 200, 10 % below
 */
export function splittingLimitShare(meanGPerT: number): number {
  if (meanGPerT >= 1000) return 0.06;
  return meanGPerT >= 200 ? 0.08 : 0.1;
}

/**
 * Compares the two sides' assays of one lot, in decimal arithmetic.
 * @param limitShare share of the mean within which the mean settles; the market's own limit for the grade by default
 * @throws {RangeError} naming the grade or limit that is out of its range
 */
export function compareAssays(buyerGPerT: Written, sellerGPerT: Written, limitShare?: number): AssayComparison {
  const a = toDecimal('buyerGPerT', buyerGPerT, 0, 1e6);
  const b = toDecimal('sellerGPerT', sellerGPerT, 0, 1e6);
  const mean = a.plus(b).div(2);
  const limit = toDecimal('limitShare', limitShare ?? splittingLimitShare(mean.toNumber()), 0, 1);
  const difference = a.minus(b).abs();
  return {
    meanGPerT: mean.toNumber(),
    differenceGPerT: difference.toNumber(),
    differenceShare: mean.isZero() ? 0 : difference.div(mean).toNumber(),
    limitShare: limit.toNumber(),
    withinLimit: difference.lte(mean.times(limit)),
  };
}

/** The middle of three numbers. */
export const middleOfThree = (...three: [Decimal, Decimal, Decimal]): Decimal =>
  three.toSorted((x, y) => x.comparedTo(y))[1] as Decimal;
