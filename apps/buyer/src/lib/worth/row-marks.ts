import type { BuyingTerms, LotRow } from '@lydite/contracts';
import { toBuyerTerms } from './buyer-terms.ts';
import { breakEvenAtMass } from './lot-worth.ts';

interface RowTerms {
  terms: BuyingTerms;
  buyerFeeBp: number;
  pricePerGMinor: number;
}

interface Marks {
  breakEvenG: number | null;
  leadBreakEvenG: number | null;
}

const none: Marks = { breakEvenG: null, leadBreakEvenG: null };

/**
 * Where bids break even on a row's stone: the own one where the buyer has bid, and the leading one where that is another's.
 * A row doesn't carry the lot's freight, which would not show at the stone's size.
 */
export function rowMarks(given: RowTerms | null): (row: Pick<LotRow, 'you' | 'estimate' | 'priceMinor'>) => Marks {
  if (!given) return () => none;
  const terms = toBuyerTerms(given.terms, { buyerFeeBp: given.buyerFeeBp, freightMinor: 0 });
  return ({ you, estimate, priceMinor }) => {
    if (!you) return none;
    const breakEven = breakEvenAtMass(estimate.massG, terms, given.pricePerGMinor);
    const isOutbid = you.standing === 'outbid' && priceMinor !== null;
    return { breakEvenG: breakEven(you.ceilingMinor), leadBreakEvenG: isOutbid ? breakEven(priceMinor) : null };
  };
}
