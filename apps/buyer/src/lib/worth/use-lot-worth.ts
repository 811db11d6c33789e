import { useMarket } from '@lydite/client';
import type { BuyingTerms, LotView } from '@lydite/contracts';
import type { Catalogue } from '@lydite/valuation';
import { useMemo } from 'react';
import { toBuyerTerms } from './buyer-terms.ts';
import { drawAgain, lotWorth, type LotWorth } from './lot-worth.ts';

interface WorthSource {
  lot: LotView;
  catalogue: Catalogue;
  terms: BuyingTerms;
}

/** A lot's worth to the buyer, worked out in the browser; the lot is drawn once, and valued anew when terms or price change. */
export function useLotWorth({ lot, catalogue, terms }: WorthSource): LotWorth | null {
  const { currency, buyerFeeBp } = useMarket();
  const { lines, estimate, delivery, price, massG } = lot;
  const draws = useMemo(() => drawAgain({ lines, estimate }, catalogue), [lines, estimate, catalogue]);
  return useMemo(
    () =>
      lotWorth({
        draws,
        beadsG: estimate.beadsG,
        massG,
        terms: toBuyerTerms(terms, { buyerFeeBp, freightMinor: delivery.freightMinor }),
        pricePerGMinor: price.perGramMinor,
        currency,
      }),
    [draws, estimate, massG, terms, buyerFeeBp, delivery.freightMinor, price.perGramMinor, currency],
  );
}
