import type { DeskLot } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { pageOf, type DeskQuery } from './paging.ts';

interface Row extends Omit<DeskLot, 'closesAt' | 'goldG'> {
  closesAt: Date | null;
  p10: number | null;
  p50: number | null;
  p90: number | null;
  total: number;
}

/** Every lot but deleted ones; what closes next comes first, drafts last. Reserves and ceilings are nobody's here. */
export const lotsPage = (tx: EntityManager, query: DeskQuery) =>
  pageOf<Row, DeskLot>(
    tx,
    `select l.code, coalesce(l.title, nullif(l.draft ->> 'title', ''), 'Untitled draft') as title, m.name as seller, l.state,
            coalesce(l.form, l.draft -> 'sale' ->> 'form') as form, coalesce(l.price_minor, l.asking_minor)::int as "priceMinor", l.bidders,
            l.closes_at as "closesAt", d.code as "dealCode", e.gold_p10_g as p10, e.gold_p50_g as p50, e.gold_p90_g as p90, count(*) over()::int as total
       from lots l join members m on m.id = l.seller_id
       left join estimates e on e.lot_id = l.id
       left join lateral (select code from deals where lot_id = l.id order by awarded_at desc limit 1) d on true
      where l.state <> 'deleted' and (l.code ilike $1 or m.name ilike $1 or coalesce(l.title, l.draft ->> 'title') ilike $1)
      order by l.state <> 'open', l.state = 'draft', l.closes_at desc nulls last, l.id limit $2 offset $3`,
    query,
    ({ p10, p50, p90, closesAt, ...row }) => ({
      ...row,
      goldG: p10 === null ? null : { p10, p50: p50!, p90: p90! },
      closesAt: closesAt?.toISOString() ?? null,
    }),
  );
