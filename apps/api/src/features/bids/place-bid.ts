import { randomUUID } from 'node:crypto';
import type { BidOutcome } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { setAlarm } from '../../platform/jobs.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { notify } from '../notices/notices.commands.ts';
import { Bid } from './bid.entity.ts';
import { applyBid, bidsPerMinute, closeAfterBid, leastNextMinor, type Auction } from './bids.rules.ts';
import { lockLot, type LockedLot } from './lock-lot.ts';
import { assertPayable, assertRoom } from './room.ts';

export interface BidOrder {
  lotCode: string;
  bidderId: string;
  ceilingMinor: number;
  /** Chosen once per press of the button: the same attempt is one bid. */
  attempt: string;
}

/** @throws AppError why no bid is taken on this lot now. */
export function assertTakesBids(lot: LockedLot, bidderId: string, now: Date, form: 'open-bids' | 'asking-price'): void {
  if (lot.sellerId === bidderId) throw new AppError('lot.own', 'This is your own lot. Nobody bids on their own lot.');
  if (lot.form !== form)
    throw new AppError(
      'lot.wrong_state',
      form === 'open-bids'
        ? 'This lot has an asking price; bids are not taken.'
        : 'This lot takes bids; it has no asking price.',
    );
  if (lot.state === 'frozen')
    throw new AppError('lot.wrong_state', 'The desk has frozen this lot. Bids are taken again when it is released.');
  if (lot.state !== 'open' || now >= lot.closesAt)
    throw new AppError('lot.closed', 'This lot is closed. Your bid was not placed.');
}

/** What this attempt has placed already; null for a new one. @throws AppError request.invalid when it was another lot's */
export async function earlierBid(
  tx: EntityManager,
  lot: LockedLot,
  { bidderId, attempt }: Pick<BidOrder, 'bidderId' | 'attempt'>,
): Promise<Bid | null> {
  const earlier = await tx.findOneBy(Bid, { bidderId, attempt });
  if (earlier && earlier.lotId !== lot.id)
    throw new AppError('request.invalid', 'This attempt was a bid on another lot. Choose a new one for each bid.', {
      fields: [{ path: 'attempt', message: 'Choose a new one for each bid.' }],
    });
  return earlier;
}

/** Places a binding bid with a ceiling, in one transaction on the locked lot; writes nothing when the rules refuse it. */
export const placeBid = (world: Pick<World, 'db' | 'settings'>, order: BidOrder): Promise<BidOutcome> =>
  inTransaction(world.db, async (tx) => {
    const { lot, now } = await lockLot(tx, { code: order.lotCode });
    const earlier = await earlierBid(tx, lot, order);
    if (earlier) return outcomeOf(lot, order.bidderId, earlier.ceilingMinor);
    assertTakesBids(lot, order.bidderId, now, 'open-bids');
    await assertNotTooMany(tx, world, order.bidderId);
    assertHighEnough(lot, order);
    await assertRoom(tx, { memberId: order.bidderId, amountMinor: order.ceilingMinor, lotId: lot.id });
    await assertPayable(tx, lot, { buyerId: order.bidderId, priceMinor: order.ceilingMinor });

    const after = applyBid(lot, order);
    const changed = after.priceMinor !== lot.priceMinor || after.leaderId !== lot.leaderId;
    const closesAt = closeAfterBid({ at: now, closesAt: lot.closesAt, latestClosesAt: lot.latestClosesAt, changed });
    const bidders = lot.bidders + (await takeAlias(tx, lot, order.bidderId));
    await record(tx, { lot, after, order, now, closesAt, bidders });
    if (closesAt > lot.closesAt) await setAlarm(tx, { job: 'lot.close', objectId: lot.id, at: closesAt });
    if (lot.leaderId && lot.leaderId !== after.leaderId) await tellOutbid(tx, lot, lot.leaderId);
    return outcomeOf({ ...lot, ...after, closesAt, bidders }, order.bidderId, order.ceilingMinor);
  });

function assertHighEnough(lot: LockedLot, { bidderId, ceilingMinor }: BidOrder): void {
  const least = leastNextMinor(lot, bidderId);
  if (ceilingMinor >= least) return;
  throw new AppError('bid.below_least', 'The bidding has gone past this amount. Nothing was placed.', {
    fields: [{ path: 'ceilingMinor', message: 'Bid at least the least next bid.' }],
    context: { leastNextMinor: least, priceMinor: lot.priceMinor },
  });
}

async function assertNotTooMany(
  tx: EntityManager,
  { settings }: Pick<World, 'settings'>,
  bidderId: string,
): Promise<void> {
  if (!settings.LIMITS) return;
  const rows: { n: number }[] = await tx.query(
    `select count(*)::int as n from bids where bidder_id = $1 and placed_at > market_now() - interval '1 minute'`,
    [bidderId],
  );
  if (rows[0]!.n >= bidsPerMinute)
    throw new AppError('request.too_many', 'That is more than 60 bids in a minute. Wait a minute.', {
      context: { retryAfterS: 60 },
    });
}

/** Gives a first-time bidder the lot's next alias; 1 when it was one. */
async function takeAlias(tx: EntityManager, lot: LockedLot, bidderId: string): Promise<number> {
  const rows: unknown[] = await tx.query(
    'insert into lot_aliases (lot_id, member_id, number) values ($1, $2, $3) on conflict (lot_id, member_id) do nothing returning number',
    [lot.id, bidderId, lot.bidders + 1],
  );
  return rows.length;
}

interface Accepted {
  lot: LockedLot;
  after: Auction;
  order: BidOrder;
  now: Date;
  closesAt: Date;
  bidders: number;
}

async function record(tx: EntityManager, { lot, after, order, now, closesAt, bidders }: Accepted): Promise<void> {
  const seq = lot.seq + 1;
  await tx.query(
    'update lots set price_minor = $2, leader_id = $3, leader_ceiling_minor = $4, closes_at = $5, seq = $6, bidders = $7 where id = $1',
    [lot.id, after.priceMinor, after.leaderId, after.leaderCeilingMinor, closesAt, seq, bidders],
  );
  await tx.insert(Bid, {
    id: randomUUID(),
    lotId: lot.id,
    seq,
    bidderId: order.bidderId,
    ceilingMinor: order.ceilingMinor,
    priceAfterMinor: after.priceMinor!,
    leaderAfter: after.leaderId!,
    closesAfter: closesAt,
    placedAt: now,
    attempt: order.attempt,
  });
}

const tellOutbid = (tx: EntityManager, lot: LockedLot, memberId: string): Promise<void> =>
  notify(tx, {
    memberId,
    kind: 'outbid',
    key: `outbid:${lot.id}:${lot.seq + 1}`,
    subject: `Outbid on ${lot.code}, ${lot.title}`,
    text: 'Another buyer now leads this lot. You can bid again until it closes.',
    link: `/lots/${lot.code}`,
  });

const outcomeOf = (lot: LockedLot, bidderId: string, ceilingMinor: number): BidOutcome => ({
  standing: lot.leaderId === bidderId ? 'highest' : 'outbid',
  ceilingMinor,
  priceMinor: lot.priceMinor!,
  leastNextMinor: leastNextMinor(lot, bidderId),
  closesAt: lot.closesAt.toISOString(),
  bidders: lot.bidders,
});
