import type { DeskMember } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { pageOf, type DeskQuery } from './paging.ts';

interface Row extends Omit<DeskMember, 'verifiedAt' | 'createdAt'> {
  verifiedAt: Date | null;
  createdAt: Date;
  total: number;
}

const columns = `m.id, m.name, m.email, m.place, m.email_confirmed_at is not null as "emailConfirmed", m.verified_at as "verifiedAt",
  m.limit_minor::int as "limitMinor", m.created_at as "createdAt",
  array(select role from member_roles r where r.member_id = m.id order by role) as roles,
  case when a.account_id is null then 'none' when a.transfers_active and a.payouts_enabled then 'ready' else 'details missing' end as "payoutAccount"`;

/** Members, those whose papers are still to be seen first. */
export const membersPage = (tx: EntityManager, query: DeskQuery) =>
  pageOf<Row, DeskMember>(
    tx,
    `select ${columns}, count(*) over()::int as total from members m left join payout_accounts a on a.member_id = m.id
      where m.name ilike $1 or m.email ilike $1 or m.place ilike $1
      order by m.verified_at is not null, m.created_at desc, m.id limit $2 offset $3`,
    query,
    toDeskMember,
  );

export async function deskMember(tx: EntityManager, memberId: string): Promise<DeskMember | null> {
  const rows: Row[] = await tx.query(
    `select ${columns}, 1 as total from members m left join payout_accounts a on a.member_id = m.id where m.id = $1`,
    [memberId],
  );
  return rows[0] ? toDeskMember(rows[0]) : null;
}

const toDeskMember = (row: Row): DeskMember => ({
  ...row,
  verifiedAt: row.verifiedAt?.toISOString() ?? null,
  createdAt: row.createdAt.toISOString(),
});
