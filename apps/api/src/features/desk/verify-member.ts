import type { DeskMember } from '@lydite/contracts';
import type { Actor } from '../../platform/actor.ts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { releaseWaitingTransfers } from '../payments/payments.commands.ts';
import { deskMember } from './members.queries.ts';

interface Verification {
  memberId: string;
  limitMinor: number;
  /** Which papers were seen; kept in the audit log. */
  reason: string;
}

/**
 * Records that an operator saw a member's identity and licence papers, and sets the buying limit. Payouts that waited for
 * this go out. @throws AppError member.not_found; member.role_missing for one's own papers
 */
export const verifyMember = (
  { db }: Pick<World, 'db'>,
  actor: Actor,
  { memberId, limitMinor, reason }: Verification,
): Promise<DeskMember> =>
  inTransaction(db, async (tx) => {
    if (memberId === actor.id)
      throw new AppError('member.role_missing', 'Another operator has to see your own papers.');
    const [rows]: [unknown[], number] = await tx.query(
      `update members set verified_at = coalesce(verified_at, market_now()), verified_by = $2, limit_minor = $3 where id = $1 returning id`,
      [memberId, actor.id, limitMinor],
    );
    if (rows.length === 0) throw new AppError('member.not_found', 'There is no such member.');
    await audit(tx, actor, { action: 'member.verify', objectKind: 'member', objectId: memberId, reason });
    await releaseWaitingTransfers(tx, memberId);
    return (await deskMember(tx, memberId))!;
  });
