import type { Decimal } from 'decimal.js';
import { requireMinor, shareOf } from '../money/share-of.ts';
import { middleOfThree } from './compare-assays.ts';
import { toDecimal, type Written } from './decimal-argument.ts';

export type FeeOwer = 'buyer' | 'seller' | 'both';

export interface Resolution {
  settledGPerT: number;
  /** Whose result it is; the umpire's when results are equal. */
  settledBy: 'buyer' | 'seller' | 'umpire';
  /** Who pays the umpire: the side further away; both, half each, at equal distance. */
  feeOwedBy: FeeOwer;
}

/**
 * Settles two assays that lie too far apart by the umpire's: the middle of the three is final.
 * @throws {RangeError} naming the grade that is out of its range
 * Source: common practice of umpire assays, from memory: a result between the two is final, outside them the nearer party's is.
 */
export function resolveByUmpire(grades: {
  buyerGPerT: Written;
  sellerGPerT: Written;
  umpireGPerT: Written;
}): Resolution {
  const [buyer, seller, umpire] = (['buyerGPerT', 'sellerGPerT', 'umpireGPerT'] as const).map((name) =>
    toDecimal(name, grades[name], 0, 1e6),
  ) as [Decimal, Decimal, Decimal];
  const settled = middleOfThree(buyer, seller, umpire);
  const further = buyer.minus(umpire).abs().comparedTo(seller.minus(umpire).abs());
  return {
    settledGPerT: settled.toNumber(),
    settledBy: settled.eq(umpire) ? 'umpire' : settled.eq(buyer) ? 'buyer' : 'seller',
    feeOwedBy: further === 0 ? 'both' : further > 0 ? 'buyer' : 'seller',
  };
}

/** The umpire's fee by who owes it; shared, the buyer's half is rounded half to even and the seller pays the rest. */
export function umpireFee(feeMinor: number, owedBy: FeeOwer): { buyerMinor: number; sellerMinor: number } {
  requireMinor('feeMinor', feeMinor);
  const buyerMinor = owedBy === 'both' ? shareOf(feeMinor, 0.5) : owedBy === 'buyer' ? feeMinor : 0;
  return { buyerMinor, sellerMinor: feeMinor - buyerMinor };
}
