import { feeMinor } from '../../platform/fee-minor.ts';

export interface OutrightDeal {
  priceMinor: number;
  /** What agreed or decided claims take off the price, 0 to the price. */
  adjustmentMinor: number;
  freightMinor: number;
  /** Rates in hundredths of a per cent: the fees on the value, the taxes on the fees. */
  buyerFeeBp: number;
  sellerFeeBp: number;
  buyerTaxBp: number;
  sellerTaxBp: number;
  /** All the buyer paid into the hold. */
  paidInMinor: number;
}

/** V, fb, fs, tb, ts, S and Rb of rules.md, in minor units. */
export interface OutrightFigures {
  valueMinor: number;
  buyerFeeMinor: number;
  sellerFeeMinor: number;
  buyerTaxMinor: number;
  sellerTaxMinor: number;
  sellerGetsMinor: number;
  refundMinor: number;
}

/** What a buyer pays into the hold of an outright deal: price, freight, the fee and the tax on it. */
export function holdOf({
  priceMinor,
  freightMinor,
  buyerFeeBp,
  buyerTaxBp,
}: Pick<OutrightDeal, 'priceMinor' | 'freightMinor' | 'buyerFeeBp' | 'buyerTaxBp'>): number {
  const fee = feeMinor(priceMinor, buyerFeeBp);
  return priceMinor + freightMinor + fee + feeMinor(fee, buyerTaxBp);
}

/**
 * Divides the hold of an outright deal (rules.md, Money): V = price − adjustment; each fee on V and each tax on its fee
 * rounded half even; the seller has V + freight less fee and tax, the buyer has back what is left. To the cent,
 * paid in = seller + both fees + both taxes + refund.
 * @throws RangeError when the figures can't be settled out of this hold
 */
export function settleOutright(deal: OutrightDeal): OutrightFigures {
  const { priceMinor, adjustmentMinor, freightMinor, paidInMinor } = deal;
  if (adjustmentMinor < 0 || adjustmentMinor > priceMinor)
    throw new RangeError(`An adjustment of ${adjustmentMinor} does not fit a price of ${priceMinor}`);
  const valueMinor = priceMinor - adjustmentMinor;
  const buyerFeeMinor = feeMinor(valueMinor, deal.buyerFeeBp);
  const sellerFeeMinor = feeMinor(valueMinor, deal.sellerFeeBp);
  const buyerTaxMinor = feeMinor(buyerFeeMinor, deal.buyerTaxBp);
  const sellerTaxMinor = feeMinor(sellerFeeMinor, deal.sellerTaxBp);
  const sellerGetsMinor = valueMinor + freightMinor - sellerFeeMinor - sellerTaxMinor;
  const refundMinor = paidInMinor - valueMinor - freightMinor - buyerFeeMinor - buyerTaxMinor;
  if (sellerGetsMinor < 0 || refundMinor < 0)
    throw new RangeError(
      `A hold of ${paidInMinor} leaves ${sellerGetsMinor} to the seller and ${refundMinor} to refund`,
    );
  const figures = {
    valueMinor,
    buyerFeeMinor,
    sellerFeeMinor,
    buyerTaxMinor,
    sellerTaxMinor,
    sellerGetsMinor,
    refundMinor,
  };
  assertDivides(paidInMinor, figures);
  return figures;
}

/** The identity every settlement must keep, checked apart from the arithmetic above. */
function assertDivides(paidInMinor: number, figures: OutrightFigures): void {
  const { buyerFeeMinor, sellerFeeMinor, buyerTaxMinor, sellerTaxMinor, sellerGetsMinor, refundMinor } = figures;
  const out = sellerGetsMinor + buyerFeeMinor + sellerFeeMinor + buyerTaxMinor + sellerTaxMinor + refundMinor;
  if (out !== paidInMinor) throw new RangeError(`A settlement divides ${out} out of ${paidInMinor}`);
}
