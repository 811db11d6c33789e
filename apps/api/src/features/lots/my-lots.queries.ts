import type { MyLotRow } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { toOutline, type OutlineParts } from '../estimates/estimates.reads.ts';
import { dutyOf, type DutyFacts } from './duty.rules.ts';

interface Row extends DutyFacts {
  code: string;
  title: string;
  state: MyLotRow['state'];
  coverPhotoId: string | null;
  massG: number | null;
  goldG: MyLotRow['goldG'];
  estimate: OutlineParts | null;
  priceMinor: number | null;
  bidders: number;
  closesAt: Date | null;
  dealCode: string | null;
  updatedAt: Date;
}

/** A draft's title and mass are read from what was saved so far; `mass` sums the lines that have one. */
const sql = `
  select l.code, l.state, coalesce(l.title, l.draft ->> 'title') as title, coalesce(l.cover_photo_id, cover.id) as "coverPhotoId",
         coalesce(l.mass_g, mass.g)::float8 as "massG",
         case when e.id is not null then jsonb_build_object('p10', e.gold_p10_g, 'p50', e.gold_p50_g, 'p90', e.gold_p90_g) end as "goldG",
         case when e.id is not null then jsonb_build_object('massG', e.result -> 'massG', 'goldG', e.result #> '{goldG,quantiles}',
           'gradeGPerT', e.result -> 'gradeGPerT', 'density', e.result -> 'density') end as estimate,
         (case l.form when 'asking-price' then l.asking_minor else l.price_minor end)::int as "priceMinor", l.bidders,
         l.closes_at as "closesAt", l.delivery_way as "deliveryWay", d.code as "dealCode", d.state as "dealState", d.due_at as "dealDueAt",
         d.frozen_at is not null as frozen, w.countersign_ends_at as "countersignBy", t.deal_id is not null and not coalesce(a.transfers_active and a.payouts_enabled, false) as "payoutWaits",
         greatest(l.saved_at, l.listed_at, l.closed_at, d.updated_at) as "updatedAt"
    from lots l
    left join estimates e on e.lot_id = l.id
    left join lateral (select sum((line ->> 'massG')::numeric) as g from jsonb_array_elements(l.draft -> 'lines') line) mass on l.state = 'draft'
    left join lateral (select id from photos where lot_id = l.id and removed_at is null order by position, id limit 1) cover on l.state = 'draft'
    left join deals d on d.lot_id = l.id and d.state <> 'cancelled'
    left join weigh_ins w on w.deal_id = d.id and w.countersigned_at is null and w.countersign_ends_at > $2
    left join payout_accounts a on a.member_id = l.seller_id
    left join lateral (select deal_id from transfers where deal_id = d.id and member_id = $1 and state = 'waiting' limit 1) t on true
   where l.seller_id = $1 and l.state <> 'deleted'
   order by "updatedAt" desc, l.id limit 500`;

/** A seller's lots, drafts included, the last touched first. */
export async function myLotRows(
  tx: EntityManager,
  { sellerId, now }: { sellerId: string; now: Date },
): Promise<MyLotRow[]> {
  const rows: Row[] = await tx.query(sql, [sellerId, now]);
  return rows.map(toMyLotRow);
}

function toMyLotRow(row: Row): MyLotRow {
  const { code, title, state, coverPhotoId, massG, goldG, priceMinor, bidders, dealCode, dealState } = row;
  const { duty, by } = dutyOf(row);
  return {
    code,
    title,
    state,
    coverPhotoId,
    massG,
    goldG,
    estimate: row.estimate && toOutline(row.estimate),
    priceMinor,
    bidders,
    closesAt: row.closesAt?.toISOString() ?? null,
    dealCode,
    dealState,
    duty,
    dutyBy: by?.toISOString() ?? null,
    updatedAt: row.updatedAt.toISOString(),
  };
}
