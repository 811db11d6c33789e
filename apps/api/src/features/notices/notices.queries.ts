import type { NoticeView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';

interface Row extends Omit<NoticeView, 'createdAt' | 'readAt'> {
  createdAt: Date;
  readAt: Date | null;
}

/** The newest two hundred notices of a member. */
export async function noticesOf(tx: EntityManager, memberId: string): Promise<NoticeView[]> {
  const rows: Row[] = await tx.query(
    `select id, kind, subject, text, link, created_at as "createdAt", read_at as "readAt" from notices where member_id = $1 order by created_at desc limit 200`,
    [memberId],
  );
  return rows.map((row) => ({
    ...row,
    createdAt: row.createdAt.toISOString(),
    readAt: row.readAt?.toISOString() ?? null,
  }));
}

export async function markRead(tx: EntityManager, memberId: string): Promise<void> {
  await tx.query('update notices set read_at = market_now() where member_id = $1 and read_at is null', [memberId]);
}
