import type { DeskDeal } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { timelinesOf } from '../deals/deals.reads.ts';
import { pageOf, type DeskQuery } from './paging.ts';

interface Row extends Omit<DeskDeal, 'dueAt' | 'events'> {
  id: string;
  dueAt: Date | null;
  total: number;
}

const dueWords: Record<string, string> = {
  pay: 'Payment into hold',
  dispatch: 'Dispatch',
  dispatch_late: 'Dispatch, late',
  collect: 'Collection',
  receipt: 'Receipt',
  weigh_in: 'Weigh-in',
  countersign: 'Seller’s countersignature',
  claim: 'Claim days',
  answer: 'Answer to the claim',
  approval: 'Operator’s approval',
  desk: 'The desk',
};

/** Deals by the next deadline; ended ones last. */
export async function dealsPage(tx: EntityManager, query: DeskQuery) {
  const page = await pageOf<Row, Row>(
    tx,
    `select d.id, d.code, l.code as "lotCode", l.title, s.name as seller, b.name as buyer, d.state, d.frozen_at is not null as frozen,
            d.hold_minor::int as "holdMinor", coalesce((select balance from ledger_accounts where code = 'hold.deal:' || d.code), 0)::int as "heldMinor",
            d.due_at as "dueAt", coalesce(d.due_kind, '') as "dueWhat", count(*) over()::int as total
       from deals d join lots l on l.id = d.lot_id join members s on s.id = d.seller_id join members b on b.id = d.buyer_id
      where d.code ilike $1 or l.code ilike $1 or l.title ilike $1 or s.name ilike $1 or b.name ilike $1
      order by d.state in ('settled', 'cancelled', 'refunded'), d.due_at nulls last, d.updated_at desc, d.id limit $2 offset $3`,
    query,
    (row) => row,
  );
  const timelines = await timelinesOf(
    tx,
    page.rows.map((row) => row.id),
  );
  return { ...page, rows: page.rows.map((row) => toDeskDeal(row, timelines.get(row.id) ?? [])) };
}

const toDeskDeal = ({ dueAt, ...row }: Row, events: DeskDeal['events']): DeskDeal => ({
  ...row,
  dueAt: dueAt?.toISOString() ?? null,
  dueWhat: dueWords[row.dueWhat] ?? row.dueWhat,
  events,
});
