import { IsNull, Not, type EntityManager } from 'typeorm';
import { marketTerms } from '../../platform/market-terms.ts';
import { createWords, massWords } from '../../platform/words.ts';
import { netOf } from '../deliveries/deliveries.reads.ts';
import type { LockedDeal } from './deal-steps.commands.ts';
import { Claim } from './deal.entity.ts';

/** What an accepted claim takes off a deal's price, and why, as the statement says it; nothing without one. */
export async function acceptedClaim(
  tx: EntityManager,
  deal: LockedDeal,
): Promise<{ adjustmentMinor: number; reason: string }> {
  const claim = await tx.findOneBy(Claim, { dealId: deal.id, acceptedAt: Not(IsNull()) });
  if (!claim) return { adjustmentMinor: 0, reason: '' };
  const { declaredG, foundG, adjustmentMinor } = claim;
  const { money } = createWords(await marketTerms(tx));
  const shortG = netOf({ grossG: declaredG, tareG: foundG });
  return {
    adjustmentMinor,
    reason: `Mass: ${money(deal.priceMinor)} × ${massWords(shortG)} short ÷ ${massWords(declaredG)} declared`,
  };
}
