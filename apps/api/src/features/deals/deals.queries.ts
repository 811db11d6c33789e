import type { DealRow, DealState } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { dueWords } from './deal-due.presenter.ts';
import type { DueKind } from './deadlines.rules.ts';
import type { Side } from './deals.rules.ts';

interface Row {
  code: string;
  lotCode: string;
  title: string;
  coverPhotoId: string | null;
  state: DealState;
  side: Side;
  priceMinor: number;
  holdMinor: number;
  updatedAt: Date;
  dueKind: DueKind | null;
  dueAt: Date | null;
  duePausedAt: Date | null;
  frozenAt: Date | null;
  acceptedAt: Date | null;
  countersignedAt: Date | null;
  claimEndsAt: Date | null;
  countersignEndsAt: Date | null;
  sellerGetsMinor: number | null;
  refundMinor: number | null;
  payoutState: string | null;
  now: Date;
}

/** More than anybody runs at once; older ones are found by the statements. */
const most = 500;

/** Own deals, those with a deadline of one's own first by time, then the latest changed. */
export async function myDeals(
  tx: EntityManager,
  { memberId, side }: { memberId: string; side: Side | undefined },
): Promise<DealRow[]> {
  const rows: Row[] = await tx.query(
    `select d.code, l.code as "lotCode", l.title, l.cover_photo_id as "coverPhotoId", d.state,
            case when d.seller_id = $1 then 'seller' else 'buyer' end as side,
            d.price_minor::int as "priceMinor", d.hold_minor::int as "holdMinor", d.updated_at as "updatedAt",
            d.due_kind as "dueKind", d.due_at as "dueAt", d.due_paused_at as "duePausedAt", d.frozen_at as "frozenAt", d.accepted_at as "acceptedAt",
            w.countersigned_at as "countersignedAt", w.claim_ends_at as "claimEndsAt", w.countersign_ends_at as "countersignEndsAt",
            s.seller_gets_minor::int as "sellerGetsMinor", s.refund_minor::int as "refundMinor", t.state as "payoutState", market_now() as now
       from deals d join lots l on l.id = d.lot_id
       left join weigh_ins w on w.deal_id = d.id
       left join settlements s on s.deal_id = d.id
       left join transfers t on t.settlement_id = s.id and t.member_id = d.seller_id
      where (d.seller_id = $1 and $2::text is distinct from 'buyer') or (d.buyer_id = $1 and $2::text is distinct from 'seller')
      order by d.updated_at desc, d.id limit ${most}`,
    [memberId, side ?? null],
  );
  return rows.map(toDealRow).toSorted(byOwnDuty);
}

function toDealRow(row: Row): DealRow {
  const { side, now, claimEndsAt, countersignEndsAt, countersignedAt } = row;
  const times = claimEndsAt && countersignEndsAt ? { countersignedAt, claimEndsAt, countersignEndsAt } : null;
  const due = dueWords(row, times, side, now);
  return {
    code: row.code,
    lotCode: row.lotCode,
    title: row.title,
    coverPhotoId: row.coverPhotoId,
    state: row.state,
    side,
    priceMinor: row.priceMinor,
    holdMinor: row.holdMinor,
    duty: due?.own ? due.what : '',
    dutyBy: due?.own ? (due.at?.toISOString() ?? null) : null,
    updatedAt: row.updatedAt.toISOString(),
    sellerGetsMinor: row.sellerGetsMinor,
    refundMinor: row.refundMinor,
    payoutState: row.payoutState,
  };
}

const byOwnDuty = (a: DealRow, b: DealRow): number =>
  Number(b.duty !== '') - Number(a.duty !== '') || (a.dutyBy ?? '').localeCompare(b.dutyBy ?? '');
