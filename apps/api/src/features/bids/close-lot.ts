import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { setAlarm } from '../../platform/jobs.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { openDeal } from '../deals/deals.commands.ts';
import { notify } from '../notices/notices.commands.ts';
import { UnderOffer } from './bid.entity.ts';
import { replay, reserveReached, underOfferHours, type CeilingBid } from './bids.rules.ts';
import { lockLot, type LockedLot } from './lock-lot.ts';

/**
 * Closes a lot whose time has come, exactly once: the row's lock decides between closers and a last bid. Before its time,
 * after an extension, it sets the alarm anew; on a lot that is no longer open it does nothing.
 */
export const closeLot = ({ db }: Pick<World, 'db'>, lotId: string): Promise<void> =>
  inTransaction(db, async (tx) => {
    const { lot, now } = await lockLot(tx, { id: lotId });
    if (lot.state !== 'open') return;
    if (now < lot.closesAt) return setAlarm(tx, { job: 'lot.close', objectId: lot.id, at: lot.closesAt });
    const sold = lot.form === 'open-bids' && lot.leaderId !== null && reserveReached(lot);
    await tx.query('update lots set state = $2, closed_at = $3 where id = $1', [
      lot.id,
      sold ? 'awarded' : 'unsold',
      now,
    ]);
    if (sold)
      await openDeal(tx, {
        lotId,
        sellerId: lot.sellerId,
        buyerId: lot.leaderId!,
        priceMinor: lot.priceMinor!,
        freightMinor: lot.freightMinor,
      });
    else await tellUnsold(tx, lot, lot.bidders > 0 ? 'No bid reached your lowest price.' : 'Nobody bid.');
  });

const tellUnsold = (tx: EntityManager, lot: LockedLot, why: string): Promise<void> =>
  notify(tx, {
    memberId: lot.sellerId,
    kind: 'unsold',
    key: `unsold:${lot.id}`,
    subject: `${lot.code} closed without a sale`,
    text: `${why} You can copy the lot and list it anew.`,
    link: `/sell/lots/${lot.code}`,
  });

/** Closes what an alarm was lost for: open lots ten seconds past their close, and under-bidders' offers past their time. */
export async function sweepLots(world: Pick<World, 'db' | 'log'>): Promise<void> {
  const late: { id: string }[] = await world.db.query(
    `select id from lots where state = 'open' and closes_at < market_now() - interval '10 seconds' order by closes_at limit 500`,
  );
  // One lot that can't be closed must not keep the others waiting; it is tried again in a minute.
  for (const { id } of late)
    await closeLot(world, id).catch((error: unknown) =>
      world.log.error({ err: error, lotId: id }, 'a lot could not be closed'),
    );
  const offers: { id: string }[] = await world.db.query(
    'select id from under_offers where answered_at is null and answer_by < market_now() limit 500',
  );
  for (const { id } of offers)
    await lapseUnderOffer(world, id).catch((error: unknown) =>
      world.log.error({ err: error, offerId: id }, 'an under-bidder’s offer could not be ended'),
    );
}

/** The under-bidder did not answer in time: the lot is unsold. */
export const lapseUnderOffer = ({ db }: Pick<World, 'db'>, offerId: string): Promise<void> =>
  inTransaction(db, async (tx) => {
    const found = await tx.findOneBy(UnderOffer, { id: offerId });
    if (!found) return;
    const { lot, now } = await lockLot(tx, { id: found.lotId });
    const [rows]: [unknown[], number] = await tx.query(
      'update under_offers set answered_at = $2, accepted = false where id = $1 and answered_at is null and answer_by <= $2 returning id',
      [offerId, now],
    );
    if (rows.length > 0) await endUnsold(tx, lot, 'The next bidder did not answer.');
  });

export async function endUnsold(tx: EntityManager, lot: LockedLot, why: string): Promise<void> {
  await tx.query(`update lots set state = 'unsold' where id = $1`, [lot.id]);
  await tellUnsold(tx, lot, why);
}

/** Offers the lot to the next bidder, at the price the auction gives without those who did not pay; unsold below the reserve. */
export async function offerToUnderBidder(tx: EntityManager, lotId: string): Promise<void> {
  const { lot, now } = await lockLot(tx, { id: lotId });
  if (lot.form !== 'open-bids') return endUnsold(tx, lot, 'The buyer did not pay.');
  const again = replay(lot, await lastBidsOfSolvent(tx, lotId));
  if (again.leaderId === null || !reserveReached(again))
    return endUnsold(tx, lot, 'The buyer did not pay, and no other bid reaches your lowest price.');
  const offer = {
    id: randomUUID(),
    lotId,
    buyerId: again.leaderId,
    priceMinor: again.priceMinor!,
    answerBy: new Date(now.getTime() + underOfferHours * 3_600_000),
  };
  await tx.query(`update lots set state = 'offered' where id = $1`, [lotId]);
  await tx.insert(UnderOffer, offer);
  await setAlarm(tx, { job: 'under-offer.lapse', objectId: offer.id, at: offer.answerBy });
  await notify(tx, {
    memberId: offer.buyerId,
    kind: 'under_offer',
    key: `under-offer:${offer.id}`,
    subject: `${lot.code}, ${lot.title}, is offered to you`,
    text: 'The winner did not pay. You may have the lot at the price the bidding gives without that buyer. Answer within 24 hours.',
    link: '/bids',
  });
}

/** Each bidder's last ceiling in the order placed, without buyers whose deal on this lot was cancelled unpaid. */
const lastBidsOfSolvent = (tx: EntityManager, lotId: string): Promise<CeilingBid[]> =>
  tx.query(
    `select "bidderId", "ceilingMinor" from (
       select distinct on (bidder_id) bidder_id as "bidderId", ceiling_minor::int as "ceilingMinor", seq from bids
        where lot_id = $1 and bidder_id not in (select buyer_id from deals where lot_id = $1 and state = 'cancelled')
        order by bidder_id, seq desc) as last
     order by seq`,
    [lotId],
  );
