import { requireBetween } from '../argument.ts';
import { requireMinor, shareOf } from '../money/share-of.ts';

/** All that decides who gets what of a hold. Amounts in whole minor units, shares 0 … 1. */
export interface HoldDivision {
  /** V: the price less adjustments, or the value settled on assay. */
  valueMinor: number;
  freightMinor: number;
  buyerFeeShare: number;
  sellerFeeShare: number;
  /** Tax on each side's fee. */
  buyerTaxShare: number;
  sellerTaxShare: number;
  /** What each side owes the umpire. */
  umpireBuyerMinor: number;
  umpireSellerMinor: number;
  /** All the buyer, and the seller, paid in. */
  buyerPaidInMinor: number;
  sellerPaidInMinor: number;
}

/** Who gets what. paid in by both + second payment + debt = seller + fees + taxes + refunds + umpire, to the cent. */
export interface DividedHold {
  buyerFeeMinor: number;
  sellerFeeMinor: number;
  buyerTaxMinor: number;
  sellerTaxMinor: number;
  umpireMinor: number;
  sellerGetsMinor: number;
  /** What the seller owes when fees and umpire eat more than there is. */
  sellerDebtMinor: number;
  refundBuyerMinor: number;
  refundSellerMinor: number;
  /** What the buyer has yet to pay when the value exceeds the hold. */
  secondPaymentMinor: number;
}

const amounts = [
  'valueMinor',
  'freightMinor',
  'umpireBuyerMinor',
  'umpireSellerMinor',
  'buyerPaidInMinor',
  'sellerPaidInMinor',
] as const;
const shares = ['buyerFeeShare', 'sellerFeeShare', 'buyerTaxShare', 'sellerTaxShare'] as const;

/**
 * Divides what was paid in: each fee is rounded half to even on the value, each tax on its fee; the seller gets the remainder.
 * @throws {RangeError} naming the amount or share that is out of its range
 */
export function divideHold(given: HoldDivision): DividedHold {
  for (const amount of amounts) requireMinor(amount, given[amount]);
  for (const share of shares) requireBetween(share, given[share], 0, 1);
  const { valueMinor, freightMinor, umpireBuyerMinor, umpireSellerMinor } = given;
  const sellerFeeMinor = shareOf(valueMinor, given.sellerFeeShare);
  const sellerTaxMinor = shareOf(sellerFeeMinor, given.sellerTaxShare);
  const { buyerFeeMinor, buyerTaxMinor, owedMinor } = buyerOwes(given, valueMinor);
  const forSeller = valueMinor + freightMinor - sellerFeeMinor - sellerTaxMinor - umpireSellerMinor;
  const forBuyer = given.buyerPaidInMinor - owedMinor;
  return {
    buyerFeeMinor,
    sellerFeeMinor,
    buyerTaxMinor,
    sellerTaxMinor,
    umpireMinor: umpireBuyerMinor + umpireSellerMinor,
    sellerGetsMinor: Math.max(0, forSeller),
    sellerDebtMinor: Math.max(0, -forSeller),
    refundBuyerMinor: Math.max(0, forBuyer),
    refundSellerMinor: given.sellerPaidInMinor,
    secondPaymentMinor: Math.max(0, -forBuyer),
  };
}

/**
 * The hold as full payment, where a second payment does not come: the largest value that what the buyer paid in covers with
 * freight, fee, tax and the buyer's part of the umpire's fee.
 * @returns whole minor units, or null when not even the freight and the umpire are covered
 */
export function largestCoveredValue(given: Omit<HoldDivision, 'valueMinor'>): number | null {
  const covers = (valueMinor: number) => buyerOwes(given, valueMinor).owedMinor <= given.buyerPaidInMinor;
  if (!covers(0)) return null;
  let [covered, beyond] = [0, given.buyerPaidInMinor + 1];
  while (beyond - covered > 1) {
    const middle = Math.floor((covered + beyond) / 2);
    if (covers(middle)) covered = middle;
    else beyond = middle;
  }
  return covered;
}

function buyerOwes(given: Omit<HoldDivision, 'valueMinor'>, valueMinor: number) {
  const buyerFeeMinor = shareOf(valueMinor, given.buyerFeeShare);
  const buyerTaxMinor = shareOf(buyerFeeMinor, given.buyerTaxShare);
  const owedMinor = valueMinor + given.freightMinor + buyerFeeMinor + buyerTaxMinor + given.umpireBuyerMinor;
  return { buyerFeeMinor, buyerTaxMinor, owedMinor };
}
