import type { MyBidRow, MyBids } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { leastNextMinor, type Auction } from './bids.rules.ts';
import { roomOf } from './room.ts';

interface Row extends Auction {
  code: string;
  title: string;
  coverPhotoId: string | null;
  state: MyBidRow['lotState'];
  closed: boolean;
  ceilingMinor: number;
  closesAt: Date;
  dealCode: string | null;
  dealState: string | null;
  offerPriceMinor: number | null;
  offerAnswerBy: Date | null;
}

const sql = `
  select l.code, l.title, l.cover_photo_id as "coverPhotoId", l.state, l.closes_at <= market_now() as closed, l.start_minor::int as "startMinor",
         null as "reserveMinor", l.price_minor::int as "priceMinor", l.leader_id as "leaderId", l.leader_ceiling_minor::int as "leaderCeilingMinor",
         own.ceiling_minor::int as "ceilingMinor", l.closes_at as "closesAt", d.code as "dealCode", d.state as "dealState",
         o.price_minor::int as "offerPriceMinor", o.answer_by as "offerAnswerBy"
    from (select distinct on (lot_id) lot_id, ceiling_minor from bids where bidder_id = $1 order by lot_id, seq desc) own
    join lots l on l.id = own.lot_id
    left join lateral (select code, state from deals where lot_id = l.id and buyer_id = $1 order by awarded_at desc limit 1) d on true
    left join under_offers o on o.lot_id = l.id and o.buyer_id = $1 and o.answered_at is null
   order by l.closes_at desc limit 200`;

/** A member's bids, and what they bind. */
export async function myBids(tx: EntityManager, memberId: string): Promise<MyBids> {
  const rows: Row[] = await tx.query(sql, [memberId]);
  const limits: { limitMinor: number }[] = await tx.query(
    'select limit_minor::int as "limitMinor" from members where id = $1',
    [memberId],
  );
  const limitMinor = limits[0]!.limitMinor;
  const leads = (row: Row): boolean => row.leaderId === memberId && row.state === 'open' && !row.closed;
  return {
    rows: rows.map((row) => toMyBidRow(row, memberId)),
    limitMinor,
    roomMinor: Math.max(0, await roomOf(tx, { memberId, limitMinor })),
    ifAllWonMinor: rows.filter(leads).reduce((sum, row) => sum + row.priceMinor!, 0),
  };
}

const toMyBidRow = (row: Row, memberId: string): MyBidRow => ({
  lotCode: row.code,
  title: row.title,
  coverPhotoId: row.coverPhotoId,
  lotState: row.state,
  standing: row.leaderId === memberId ? 'highest' : 'outbid',
  ceilingMinor: row.ceilingMinor,
  priceMinor: row.priceMinor,
  leastNextMinor: row.state === 'open' && !row.closed && row.startMinor !== null ? leastNextMinor(row, memberId) : null,
  closesAt: row.closesAt.toISOString(),
  dealCode: row.dealCode,
  dealState: row.dealState,
  offer: row.offerAnswerBy && { priceMinor: row.offerPriceMinor!, answerBy: row.offerAnswerBy.toISOString() },
});
