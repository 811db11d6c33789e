import { requireMinor, shareOf } from './share-of.ts';

export interface SellerFees {
  sellerFeeShare: number;
  /** Tax on the market's fee at the seller's rate. */
  taxShare: number;
  /** Freight the buyer pays with the price. */
  freightMinor: number;
}

export interface SellerNet {
  priceMinor: number;
  freightMinor: number;
  feeMinor: number;
  taxMinor: number;
  /** price + freight − fee − tax. */
  netMinor: number;
}

/**
 * What a price leaves in the seller's hand: fee and tax rounded one after the other, half to even, as the settlement does.
 * @throws {RangeError} naming the amount or share that is out of its range
 */
export function netToSeller(priceMinor: number, { sellerFeeShare, taxShare, freightMinor }: SellerFees): SellerNet {
  requireMinor('priceMinor', priceMinor);
  requireMinor('freightMinor', freightMinor);
  const feeMinor = shareOf(priceMinor, sellerFeeShare);
  const taxMinor = shareOf(feeMinor, taxShare);
  return { priceMinor, freightMinor, feeMinor, taxMinor, netMinor: priceMinor + freightMinor - feeMinor - taxMinor };
}
