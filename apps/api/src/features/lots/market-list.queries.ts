import type { LotList, LotQuery, LotRow } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { standingOf } from '../bids/bids.reads.ts';
import { toOutline, type OutlineParts } from '../estimates/estimates.reads.ts';
import { filtersOf, sortOf, type ListContext } from './market-filters.ts';

const pageSize = 25;

interface Row extends Omit<LotRow, 'estimate' | 'closesAt' | 'you'> {
  id: string;
  estimate: OutlineParts;
  closesAt: Date;
}

/** The open lots that fit, one page of them, and how many each of the ready-made views holds. */
export async function marketList(tx: EntityManager, query: LotQuery, context: ListContext): Promise<LotList> {
  const { where, values } = filtersOf(query, context);
  const totals: { total: number }[] = await tx.query(
    `select count(*)::int as total from lots l join estimates e on e.lot_id = l.id where ${where}`,
    values,
  );
  const rows: Row[] = await tx.query(pageSql({ where, order: sortOf(query.sort), offset: values.length }), [
    ...values,
    pageSize,
    (query.page - 1) * pageSize,
  ]);
  const standings = context.memberId
    ? await standingOf(tx, { lotIds: rows.map(({ id }) => id), memberId: context.memberId })
    : new Map<string, never>();
  return {
    rows: rows.map(({ id, ...row }) => ({
      ...row,
      estimate: toOutline(row.estimate),
      closesAt: row.closesAt.toISOString(),
      you: standings.get(id) ?? null,
    })),
    total: totals[0]!.total,
    page: query.page,
    pageSize,
    countsByView: await countsByView(tx, context),
  };
}

/** Sorts and cuts the page on the narrow columns first, so that only its rows read their wide estimates. */
const pageSql = ({ where, order, offset }: { where: string; order: string; offset: number }): string => `
  with page as (
    select l.id, row_number() over (order by ${order}) as place
      from lots l join estimates e on e.lot_id = l.id where ${where}
     order by place limit $${offset + 1} offset $${offset + 2}
  )
  select l.id, l.code, l.title, l.class_codes as "classCodes", l.mass_g::float8 as "massG", l.mass_evidence as "massEvidence", l.pieces, l.place,
         l.cover_photo_id as "coverPhotoId", l.form,
         (case l.form when 'asking-price' then l.asking_minor else l.price_minor end)::int as "priceMinor", l.start_minor::int as "startMinor",
         l.bidders, l.closes_at as "closesAt",
         jsonb_build_object('massG', e.result -> 'massG', 'goldG', e.result #> '{goldG,quantiles}', 'gradeGPerT', e.result -> 'gradeGPerT',
                            'density', e.result -> 'density') as estimate
    from page join lots l on l.id = page.id join estimates e on e.lot_id = l.id
   order by page.place`;

async function countsByView(
  tx: EntityManager,
  { now, endOfToday, memberId }: ListContext,
): Promise<Record<string, number>> {
  const rows: Record<string, number>[] = await tx.query(
    `select count(*)::int as "all",
            count(*) filter (where e.gold_p50_g >= 10)::int as "over-10-g",
            count(*) filter (where l.closes_at <= $2)::int as "closing-today",
            count(*) filter (where exists (select from bids b where b.lot_id = l.id and b.bidder_id = $3))::int as "bid"
       from lots l join estimates e on e.lot_id = l.id where l.state = 'open' and l.closes_at > $1`,
    [now, endOfToday, memberId],
  );
  return rows[0]!;
}
