import type { BuyingTerms } from '@lydite/contracts';
import { defaultTerms, type BuyerTerms } from '@lydite/valuation';

interface Charges {
  /** The market's fee in hundredths of a per cent of the purchase. */
  buyerFeeBp: number;
  freightMinor: number;
}

/** A buyer's own terms with the market's charges; what a buyer can't set yet is as the valuation assumes it for all. */
export const toBuyerTerms = (own: BuyingTerms, { buyerFeeBp, freightMinor }: Charges): BuyerTerms => ({
  ...defaultTerms,
  recoveryYield: own.recoveryYield,
  accountableShare: own.accountableShare,
  processingPerKgMinor: own.processingPerKgMinor,
  batchCostMinor: own.batchCostMinor,
  wantedChance: own.wantedChance,
  margin: own.marginShare,
  rivals: own.rivals,
  winnersCurse: own.curseOn,
  buyerFeeShare: buyerFeeBp / 10_000,
  freightMinor,
  // A lot bought outright is not assayed before it is paid.
  assayCostMinor: 0,
});
