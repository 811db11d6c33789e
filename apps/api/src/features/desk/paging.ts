import type { EntityManager } from 'typeorm';

export const pageSize = 50;

export interface DeskQuery {
  page: number;
  q?: string | undefined;
}

/** What a search text matches anywhere in: `%` and `_` in it stand for themselves. */
export const likeOf = (q: string | undefined): string => `%${(q ?? '').replaceAll(/[\\%_]/g, '\\$&')}%`;

/**
 * One page of a table. `sql` selects the rows with `count(*) over()::int as total`, its parameters after `$1` (the pattern)
 * being the limit and the offset.
 */
export async function pageOf<Row extends { total: number }, View>(
  tx: EntityManager,
  sql: string,
  { page, q }: DeskQuery,
  toView: (row: Row) => View,
): Promise<{ rows: View[]; total: number; page: number; pageSize: number }> {
  const rows: Row[] = await tx.query(sql, [likeOf(q), pageSize, (page - 1) * pageSize]);
  return { rows: rows.map(toView), total: rows[0]?.total ?? 0, page, pageSize };
}
