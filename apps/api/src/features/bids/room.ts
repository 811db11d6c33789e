import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { lockBuyer } from './lock-lot.ts';

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
