import type { BuyerTerms } from './buyer-terms.ts';
import { expectedLargestNormal } from './expected-largest-normal.ts';

/**
 * Factor on the gold in a winner's own return: exp(−tau · e(rivals + 1)). All bidders see the same frozen estimate, so only
 * the part of the error that is a bidder's own is exposed to the curse. Good to 0.5 % at the default terms.
 * @returns 1 when the allowance is off or there are no rivals
 */
export function curseFactor({
  winnersCurse,
  rivals,
  tau,
}: Pick<BuyerTerms, 'winnersCurse' | 'rivals' | 'tau'>): number {
  return winnersCurse ? Math.exp(-tau * expectedLargestNormal(rivals + 1)) : 1;
}
