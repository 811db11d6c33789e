import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { openDeal } from '../deals/deals.commands.ts';
import { Bid } from './bid.entity.ts';
import { lockLot } from './lock-lot.ts';
import { assertTakesBids, earlierBid } from './place-bid.ts';
import { assertPayable, assertRoom } from './room.ts';

export interface TakeOrder {
  lotCode: string;
  buyerId: string;
  /** The price the buyer saw: a lot is never taken at another one. */
  priceMinor: number;
  attempt: string;
}

/** Takes a lot at its asking price: the first buyer has it. Binding. */
export const takeLot = (
  { db }: Pick<World, 'db'>,
  { lotCode, buyerId, priceMinor, attempt }: TakeOrder,
): Promise<{ dealCode: string }> =>
  inTransaction(db, async (tx) => {
    const { lot, now } = await lockLot(tx, { code: lotCode });
    if (await earlierBid(tx, lot, { bidderId: buyerId, attempt }))
      return { dealCode: await dealCodeOf(tx, lot.id, buyerId) };
    assertTakesBids(lot, buyerId, now, 'asking-price');
    if (lot.askingMinor !== priceMinor)
      throw new AppError('lot.price_changed', 'The asking price is another one now. Nothing was taken.', {
        context: { priceMinor: lot.askingMinor },
      });
    await assertRoom(tx, { memberId: buyerId, amountMinor: priceMinor, lotId: lot.id });
    await assertPayable(tx, lot, { buyerId, priceMinor });
    await tx.query(
      `update lots set state = 'awarded', price_minor = $2, leader_id = $3, leader_ceiling_minor = $2, seq = seq + 1, bidders = 1, closed_at = $4 where id = $1`,
      [lot.id, priceMinor, buyerId, now],
    );
    await tx.insert(Bid, {
      id: randomUUID(),
      lotId: lot.id,
      seq: lot.seq + 1,
      bidderId: buyerId,
      ceilingMinor: priceMinor,
      priceAfterMinor: priceMinor,
      leaderAfter: buyerId,
      closesAfter: lot.closesAt,
      placedAt: now,
      attempt,
    });
    const deal = await openDeal(tx, {
      lotId: lot.id,
      sellerId: lot.sellerId,
      buyerId,
      priceMinor,
      freightMinor: lot.freightMinor,
    });
    return { dealCode: deal.code };
  });

/** Code of the buyer's latest deal on a lot they were awarded. */
export async function dealCodeOf(tx: EntityManager, lotId: string, buyerId: string): Promise<string> {
  const rows: { code: string }[] = await tx.query(
    'select code from deals where lot_id = $1 and buyer_id = $2 order by awarded_at desc limit 1',
    [lotId, buyerId],
  );
  return rows[0]!.code;
}
