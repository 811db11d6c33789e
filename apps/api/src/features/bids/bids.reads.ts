import type { PublicBid } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { roomOf } from './room.ts';

export { leastNextMinor, stepMinor, type Auction } from './bids.rules.ts';

export interface Standing {
  standing: 'highest' | 'outbid';
  ceilingMinor: number;
}

/** How a member stands on each of these lots; lots without a bid of theirs are absent. */
export async function standingOf(
  tx: EntityManager,
  { lotIds, memberId }: { lotIds: readonly string[]; memberId: string },
): Promise<Map<string, Standing>> {
  const rows: { lotId: string; ceilingMinor: number; leads: boolean }[] = await tx.query(
    `select distinct on (b.lot_id) b.lot_id as "lotId", b.ceiling_minor::int as "ceilingMinor", l.leader_id = b.bidder_id as leads
       from bids b join lots l on l.id = b.lot_id where b.lot_id = any($1) and b.bidder_id = $2 order by b.lot_id, b.seq desc`,
    [lotIds, memberId],
  );
  return new Map(
    rows.map((row) => [row.lotId, { standing: row.leads ? 'highest' : 'outbid', ceilingMinor: row.ceilingMinor }]),
  );
}

/**
 * The bids of a lot as anybody may see them, newest first: who, by alias, and the price the lot stood at after each.
 * Ceilings never leave.
 */
export async function publicBidsOf(
  tx: EntityManager,
  { lotId, memberId }: { lotId: string; memberId: string | null },
): Promise<PublicBid[]> {
  const rows: { number: number; amountMinor: number; at: Date; own: boolean }[] = await tx.query(
    `select a.number, b.price_after_minor::int as "amountMinor", b.placed_at as at, b.bidder_id is not distinct from $2 as own
       from bids b join lot_aliases a on a.lot_id = b.lot_id and a.member_id = b.bidder_id where b.lot_id = $1 order by b.seq desc limit 200`,
    [lotId, memberId],
  );
  return rows.map(({ number, amountMinor, at, own }) => ({
    alias: own ? `You, as Buyer ${number}` : `Buyer ${number}`,
    amountMinor,
    at: at.toISOString(),
    own,
  }));
}

/** What the member's limit still has room for on this lot, with the own ceiling on it set free. */
export async function roomForLot(
  tx: EntityManager,
  { memberId, lotId }: { memberId: string; lotId: string },
): Promise<number> {
  const rows: { limitMinor: number }[] = await tx.query(
    'select limit_minor::int as "limitMinor" from members where id = $1',
    [memberId],
  );
  return Math.max(0, await roomOf(tx, { memberId, limitMinor: rows[0]!.limitMinor, exceptLotId: lotId }));
}
