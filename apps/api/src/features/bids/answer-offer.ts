import { AppError } from '../../platform/app-error.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { openDeal } from '../deals/deals.commands.ts';
import { UnderOffer } from './bid.entity.ts';
import { endUnsold } from './close-lot.ts';
import { lockLot } from './lock-lot.ts';
import { assertRoom } from './room.ts';

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
    const offer = (await tx.findBy(UnderOffer, { lotId: lot.id, buyerId })).find((one) => one.answeredAt === null);
    if (!offer) throw new AppError('lot.not_found', 'Nothing is offered to you on this lot.');
    if (now >= offer.answerBy) throw new AppError('lot.closed', 'The time for an answer is over.');
    await tx.update(UnderOffer, { id: offer.id }, { answeredAt: now, accepted: accept });
    if (!accept) {
      await endUnsold(tx, lot);
      return { dealCode: null };
    }
    await assertRoom(tx, { memberId: buyerId, amountMinor: offer.priceMinor, lotId: lot.id });
    await tx.query(`update lots set state = 'awarded' where id = $1`, [lot.id]);
    const deal = await openDeal(tx, {
      lotId: lot.id,
      sellerId: lot.sellerId,
      buyerId,
      priceMinor: offer.priceMinor,
      freightMinor: lot.freightMinor,
    });
    return { dealCode: deal.code };
  });
