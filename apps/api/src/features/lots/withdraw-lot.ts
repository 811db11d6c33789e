import type { MyLotView } from '@lydite/contracts';
import type { Actor } from '../../platform/actor.ts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { marketNow } from '../../platform/clock.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { Lot } from './lot.entity.ts';
import { findOwnLot, toMyLotView } from './own-lot.ts';

/** Takes an open lot off the market before its first bid. @throws AppError lot.not_found, lot.wrong_state */
export const withdrawLot = (
  { db }: Pick<World, 'db'>,
  { lotCode, actor }: { lotCode: string; actor: Actor },
): Promise<MyLotView> =>
  inTransaction(db, async (tx) => {
    const own = { lotCode, sellerId: actor.id };
    const lot = await findOwnLot(tx, own, { lock: true });
    const now = await marketNow(tx);
    if (lot.state !== 'open' || now >= lot.closesAt!)
      throw new AppError('lot.wrong_state', 'Only a lot that is open can be withdrawn.');
    if (lot.seq > 0)
      throw new AppError('lot.wrong_state', 'This lot has a bid, and bids are binding. Ask the desk to withdraw it.');
    await tx.update(Lot, { id: lot.id }, { state: 'withdrawn', closedAt: now });
    await audit(tx, actor, { action: 'lot.withdraw', objectKind: 'lot', objectId: lot.id });
    return toMyLotView(tx, await findOwnLot(tx, own));
  });
