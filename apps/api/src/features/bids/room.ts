import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { awardedHold } from '../deals/deals.reads.ts';
import { mostMinor } from './bids.rules.ts';
import { lockBuyer, type LockedLot } from './lock-lot.ts';

/**
 * What a buyer's limit still has room for: limit − ceilings of open lots led − unpaid awards (docs/rules.md, Members).
 * `exceptLotId`: a lot whose own ceiling is about to be replaced.
 */
export async function roomOf(
  tx: EntityManager,
  { memberId, limitMinor, exceptLotId = null }: { memberId: string; limitMinor: number; exceptLotId?: string | null },
): Promise<number> {
  const rows: { bound: string }[] = await tx.query(
    `select (coalesce((select sum(leader_ceiling_minor) from lots where leader_id = $1 and state in ('open', 'frozen') and id is distinct from $2), 0)
           + coalesce((select sum(price_minor) from deals where buyer_id = $1 and state = 'awaiting_payment'), 0))::text as bound`,
    [memberId, exceptLotId],
  );
  return limitMinor - Number(rows[0]!.bound);
}

/**
 * Locks the buyer and checks that `amountMinor` fits.
 * @throws AppError bid.over_limit with the room that is left
 */
export async function assertRoom(
  tx: EntityManager,
  { memberId, amountMinor, lotId }: { memberId: string; amountMinor: number; lotId: string },
): Promise<void> {
  const { limitMinor } = await lockBuyer(tx, memberId);
  const roomMinor = Math.max(0, await roomOf(tx, { memberId, limitMinor, exceptLotId: lotId }));
  if (amountMinor > roomMinor)
    throw new AppError(
      'bid.over_limit',
      'This is more than your limit has room for. Lots you lead and awards you have not paid take their part of it.',
      {
        context: { limitMinor, roomMinor },
      },
    );
}

/**
 * An award whose hold no payment can carry could never be opened, nor its lot be closed.
 * @throws AppError bid.over_limit when price, freight and fee together are over the largest amount
 */
export async function assertPayable(
  tx: EntityManager,
  { sellerId, freightMinor }: Pick<LockedLot, 'sellerId' | 'freightMinor'>,
  { buyerId, priceMinor }: { buyerId: string; priceMinor: number },
): Promise<void> {
  if ((await awardedHold(tx, { sellerId, buyerId, priceMinor, freightMinor })) > mostMinor)
    throw new AppError(
      'bid.over_limit',
      'With freight and fee this is more than one payment can be. Bid less, or ask the seller about the freight.',
      { context: { mostMinor } },
    );
}
