import type { OwnMember, SessionView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { rolesOf } from '../../platform/session.ts';

interface Row {
  id: string;
  email: string;
  name: string;
  place: string;
  emailConfirmed: boolean;
  verified: boolean;
  limitMinor: number;
}

/** A member as they see themselves; null when there is none. */
export async function ownMember(tx: EntityManager, memberId: string): Promise<OwnMember | null> {
  const rows: Row[] = await tx.query(
    `select id, email, name, place, email_confirmed_at is not null as "emailConfirmed", verified_at is not null as verified, limit_minor::int as "limitMinor"
       from members where id = $1`,
    [memberId],
  );
  return rows[0] ? { ...rows[0], roles: await rolesOf(tx, memberId) } : null;
}

/** The session as the clients show it; of a visitor when it has ended. */
export async function sessionView(
  tx: EntityManager,
  { memberId, sessionId }: { memberId: string; sessionId: string },
): Promise<SessionView> {
  const rows: { freshUntil: Date; unread: number }[] = await tx.query(
    `select fresh_until as "freshUntil", (select count(*)::int from notices where member_id = $1 and read_at is null) as unread
       from sessions where id = $2 and member_id = $1 and revoked_at is null and idle_until > market_now() and abs_until > market_now()`,
    [memberId, sessionId],
  );
  if (!rows[0]) return visitorSession;
  return {
    member: await ownMember(tx, memberId),
    freshUntil: rows[0].freshUntil.toISOString(),
    unreadNotices: rows[0].unread,
  };
}

export const visitorSession: SessionView = { member: null, freshUntil: null, unreadNotices: 0 };
