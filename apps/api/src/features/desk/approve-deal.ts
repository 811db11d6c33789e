import type { Actor } from '../../platform/actor.ts';
import { audit } from '../../platform/audit.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { approveSettlement } from '../deals/approve-settlement.commands.ts';

/** Approves a settlement that waits for it, and writes down who did. */
export const approveDeal = ({ db }: Pick<World, 'db'>, actor: Actor, dealCode: string): Promise<void> =>
  inTransaction(db, async (tx) => {
    await approveSettlement(tx, { dealCode, operatorId: actor.id });
    await audit(tx, actor, { action: 'deal.approve', objectKind: 'deal', objectId: dealCode });
  });
