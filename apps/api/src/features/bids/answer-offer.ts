import { AppError } from '../../platform/app-error.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { openDeal } from '../deals/deals.commands.ts';
import { UnderOffer } from './bid.entity.ts';
import { endUnsold } from './close-lot.ts';
import { lockLot } from './lock-lot.ts';
import { assertRoom } from './room.ts';
import { dealCodeOf } from './take-lot.ts';

export interface OfferAnswer {
  lotCode: string;
  buyerId: string;
  accept: boolean;
}

/** The under-bidder takes the lot at the offered price, or refuses it. */
export const answerOffer = (
  { db }: Pick<World, 'db'>,
  { lotCode, buyerId, accept }: OfferAnswer,
): Promise<{ dealCode: string | null }> =>
  inTransaction(db, async (tx) => {
    const { lot, now } = await lockLot(tx, { code: lotCode });
    const offers = await tx.findBy(UnderOffer, { lotId: lot.id, buyerId });
    // The answer to an earlier press may have been lost.
    if (accept && offers.some((one) => one.accepted)) return { dealCode: await dealCodeOf(tx, lot.id, buyerId) };
    const offer = offers.find((one) => one.answeredAt === null);
    if (!offer) throw new AppError('lot.not_found', 'Nothing is offered to you on this lot.');
    if (now >= offer.answerBy) throw new AppError('lot.closed', 'The time for an answer is over.');
    await tx.update(UnderOffer, { id: offer.id }, { answeredAt: now, accepted: accept });
    if (!accept) {
      await endUnsold(tx, lot, 'The next bidder did not take it either.');
      return { dealCode: null };
    }
    await assertRoom(tx, { memberId: buyerId, amountMinor: offer.priceMinor, lotId: lot.id });
    await tx.query(
      `update lots set state = 'awarded', price_minor = $2, leader_id = $3, leader_ceiling_minor = $2 where id = $1`,
      [lot.id, offer.priceMinor, buyerId],
    );
    const deal = await openDeal(tx, {
      lotId: lot.id,
      sellerId: lot.sellerId,
      buyerId,
      priceMinor: offer.priceMinor,
      freightMinor: lot.freightMinor,
    });
    return { dealCode: deal.code };
  });
