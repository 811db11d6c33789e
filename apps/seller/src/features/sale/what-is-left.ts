import type { LotDraft, MarketView } from '@lydite/contracts';
import {
  defaultTerms,
  netToSeller,
  simulateLot,
  valueLot,
  type Catalogue,
  type LotInput,
  type SellerNet,
} from '@lydite/valuation';

export interface LeftRow extends SellerNet {
  label: string;
}

type Fees = Pick<MarketView, 'sellerFeeBp' | 'price'>;

const basisPoints = 10_000;
const tenUnitsMinor = 1000;
const preview = { seed: 1, draws: 4000 };

interface Charges {
  sellerFeeBp: number;
  freightMinor: number;
}

const netOf = (priceMinor: number, { sellerFeeBp, freightMinor }: Charges): SellerNet =>
  netToSeller(priceMinor, { sellerFeeShare: sellerFeeBp / basisPoints, taxShare: 0, freightMinor });

/** What a price leaves the seller after the market's fee, the freight the buyer pays included; minor units. */
export const inHandMinor = (priceMinor: number, charges: Charges): number => netOf(priceMinor, charges).netMinor;

/** What each price the seller has named would leave in hand; freight counts only where the seller sends. */
export function leftRows(
  { sale, delivery }: Pick<LotDraft, 'sale' | 'delivery'>,
  { sellerFeeBp }: Pick<MarketView, 'sellerFeeBp'>,
  usualMinor: number | null,
): LeftRow[] {
  const named: [string, number | null][] =
    sale.form === 'asking-price'
      ? [['Asking price', sale.askingMinor]]
      : [
          ['Start price', sale.startMinor],
          ['Lowest price', sale.reserveMinor],
        ];
  const freightMinor = delivery.way === 'seller-sends' ? (delivery.freightMinor ?? 0) : 0;
  return [...named, ['A buyer’s safe bid', usualMinor] as const].flatMap(([label, priceMinor]) =>
    priceMinor ? [{ label, ...netOf(priceMinor, { sellerFeeBp, freightMinor }) }] : [],
  );
}

/**
 * What a buyer with the market's usual terms could safely bid for the lot as described, minor units, to whole ten units of
 * money; null when nothing, or when there is no price to reckon with.
 */
export function usualSafeBidMinor(input: LotInput, catalogue: Catalogue, { price }: Fees): number | null {
  if (!price || input.lines.length === 0) return null;
  const draws = simulateLot(input, catalogue, preview);
  const { highestSafeBidMinor } = valueLot(draws, defaultTerms, { pricePerGMinor: price.perGramMinor });
  const rounded = Math.floor((highestSafeBidMinor ?? 0) / tenUnitsMinor) * tenUnitsMinor;
  return rounded > 0 ? rounded : null;
}
