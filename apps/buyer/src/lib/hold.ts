import { shareOf } from '@lydite/valuation';

interface HoldParts {
  priceMinor: number;
  freightMinor: number;
  feeMinor: number;
  totalMinor: number;
}

/** What a buyer pays into the hold for a lot bought outright: price, freight and the market's fee, before tax on the fee. */
export function holdFor(priceMinor: number, charges: { freightMinor: number; buyerFeeBp: number }): HoldParts {
  const { freightMinor, buyerFeeBp } = charges;
  const feeMinor = shareOf(priceMinor, buyerFeeBp / 10_000);
  return { priceMinor, freightMinor, feeMinor, totalMinor: priceMinor + freightMinor + feeMinor };
}
