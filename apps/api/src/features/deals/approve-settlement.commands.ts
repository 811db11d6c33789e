import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { settleDeal } from '../settlements/settlements.commands.ts';
import { acceptedClaim } from './claim-terms.ts';
import { lockDeal, moveDeal } from './deal-steps.commands.ts';
import { dealParties } from './deals.reads.ts';

/**
 * An operator approves a settlement that waited for it because of its size: the hold is settled at once.
 * @throws AppError deal.not_found; member.role_missing on a side of the deal; deal.frozen; deal.wrong_state when none waits
 */
export async function approveSettlement(
  tx: EntityManager,
  { dealCode, operatorId }: { dealCode: string; operatorId: string },
): Promise<void> {
  const found = await dealParties(tx, { code: dealCode });
  if (!found) throw new AppError('deal.not_found', 'There is no such deal.');
  const { deal, now } = await lockDeal(tx, { id: found.id });
  if (operatorId === deal.sellerId || operatorId === deal.buyerId)
    throw new AppError('member.role_missing', 'This is your own deal: another operator has to approve it.');
  if (deal.frozenAt)
    throw new AppError('deal.frozen', 'This deal is frozen. Its settlement waits until it is released.');
  await moveDeal(tx, deal, { move: 'approve', actor: 'desk', actorId: operatorId, now, due: null });
  await settleDeal(tx, deal, { ...(await acceptedClaim(tx, deal)), now, approved: true });
}
