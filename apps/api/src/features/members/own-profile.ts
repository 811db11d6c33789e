import type { OwnMember, SessionRow } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../../platform/actor.ts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { rolesOf } from '../../platform/session.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { Member } from './member.entity.ts';
import { ownMember } from './members.reads.ts';

export interface ProfileChange {
  name: string;
  place: string;
  roles: readonly ('seller' | 'buyer')[];
}

/** Changes name, place and the roles a member may choose; roles granted by operators stay. */
export const changeProfile = (
  { db }: Pick<World, 'db'>,
  actor: Actor,
  { name, place, roles }: ProfileChange,
): Promise<OwnMember> =>
  inTransaction(db, async (tx) => {
    await tx.update(Member, { id: actor.id }, { name, place });
    await tx.query(
      `delete from member_roles where member_id = $1 and role in ('seller', 'buyer') and not role = any($2)`,
      [actor.id, roles],
    );
    for (const role of roles)
      await tx.query('insert into member_roles (member_id, role) values ($1, $2) on conflict do nothing', [
        actor.id,
        role,
      ]);
    if ((await rolesOf(tx, actor.id)).length === 0) {
      const message = 'Choose selling, buying or both.';
      throw new AppError('request.invalid', message, { fields: [{ path: 'roles', message }] });
    }
    await audit(tx, actor, { action: 'member.profile_change', objectKind: 'member', objectId: actor.id });
    return (await ownMember(tx, actor.id))!;
  });

/** The own sessions that are alive, the newest activity first. */
export async function ownSessions(tx: EntityManager, actor: Actor): Promise<SessionRow[]> {
  const rows: { id: string; device: string; ip: string; createdAt: Date; lastSeenAt: Date }[] = await tx.query(
    `select id, device, ip, created_at as "createdAt", last_seen_at as "lastSeenAt" from sessions
      where member_id = $1 and revoked_at is null and idle_until > market_now() and abs_until > market_now() order by last_seen_at desc limit 100`,
    [actor.id],
  );
  return rows.map((row) => ({
    ...row,
    current: row.id === actor.sessionId,
    createdAt: row.createdAt.toISOString(),
    lastSeenAt: row.lastSeenAt.toISOString(),
  }));
}

/** @throws AppError member.not_found for a session that is not the actor's own */
export const endSession = (
  { db, sessions }: Pick<World, 'db' | 'sessions'>,
  actor: Actor,
  sessionId: string,
): Promise<void> =>
  inTransaction(db, async (tx) => {
    const rows: unknown[] = await tx.query('select 1 from sessions where id = $1 and member_id = $2', [
      sessionId,
      actor.id,
    ]);
    if (rows.length === 0) throw new AppError('member.not_found', 'You have no such session.');
    await sessions.end(tx, sessionId, 'ended by the member');
    await audit(tx, actor, { action: 'session.end', objectKind: 'session', objectId: sessionId });
  });
