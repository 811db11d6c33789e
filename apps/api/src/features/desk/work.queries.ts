import type { JobRow, OutboxRow } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { pageOf, type DeskQuery } from './paging.ts';

interface Row extends Omit<OutboxRow, 'createdAt' | 'nextAt' | 'doneAt'> {
  createdAt: Date;
  nextAt: Date | null;
  doneAt: Date | null;
  total: number;
}

/** Outside effects: those set aside first, then those still to do, then the newest. Payloads stay in the database. */
export const outboxPage = (tx: EntityManager, query: DeskQuery) =>
  pageOf<Row, OutboxRow>(
    tx,
    `select id::text, kind, key, state, attempts, last_error as "lastError", created_at as "createdAt",
            case when state = 'pending' then next_at end as "nextAt", done_at as "doneAt", count(*) over()::int as total
       from outbox where kind ilike $1 or key ilike $1 or state ilike $1
      order by state <> 'dead', state <> 'pending', id desc limit $2 offset $3`,
    query,
    (row) => ({
      ...row,
      createdAt: row.createdAt.toISOString(),
      nextAt: row.nextAt?.toISOString() ?? null,
      doneAt: row.doneAt?.toISOString() ?? null,
    }),
  );

/** The job queue, by queue. Empty while no worker has ever run. */
export async function jobQueues(tx: EntityManager): Promise<JobRow[]> {
  const there: { there: boolean }[] = await tx.query(`select to_regclass('pgboss.job') is not null as there`);
  if (!there[0]!.there) return [];
  const rows: (Omit<JobRow, 'oldestWaitingAt'> & { oldest: Date | null })[] = await tx.query(
    `select q.name as queue, count(*) filter (where j.state in ('created', 'retry'))::int as waiting,
            count(*) filter (where j.state = 'active')::int as active, count(*) filter (where j.state = 'failed')::int as failed,
            min(j.start_after) filter (where j.state in ('created', 'retry')) as oldest
       from pgboss.queue q left join pgboss.job j on j.name = q.name where q.name !~ '^__' group by q.name order by q.name`,
  );
  return rows.map(({ oldest, ...row }) => ({ ...row, oldestWaitingAt: oldest?.toISOString() ?? null }));
}
