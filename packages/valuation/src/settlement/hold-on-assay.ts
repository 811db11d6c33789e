import { requireMinor, shareOf } from '../money/share-of.ts';
import { settleFineGold, type FineGoldSettlement } from './settle-on-assay.ts';

/** What a payable share comes to in money before anything is assayed: `fineG` is the frozen p75 of the lot. */
export interface AssayHoldInput extends FineGoldSettlement {
  freightMinor: number;
  buyerFeeShare: number;
  /** Tax on the fee. */
  buyerTaxShare: number;
}

export interface AssayHold {
  valueMinor: number;
  freightMinor: number;
  feeMinor: number;
  taxMinor: number;
  /** What the buyer pays into the hold, and what a bid takes of the buyer's room. */
  totalMinor: number;
}

/**
 * The hold of a deal on assay: the value at the frozen p75 by the settlement's own steps, with freight, fee and the tax on it.
 * @throws {RangeError} naming the figure, amount or share that is out of its range
 */
export function holdOnAssay({ freightMinor, buyerFeeShare, buyerTaxShare, ...gold }: AssayHoldInput): AssayHold {
  requireMinor('freightMinor', freightMinor);
  const { valueMinor } = settleFineGold(gold);
  const feeMinor = shareOf(valueMinor, buyerFeeShare);
  const taxMinor = shareOf(feeMinor, buyerTaxShare);
  return { valueMinor, freightMinor, feeMinor, taxMinor, totalMinor: valueMinor + freightMinor + feeMinor + taxMinor };
}
