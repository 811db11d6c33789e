import { withdrawLot } from '../../features/lots/withdraw-lot.ts';
import { copyLot } from '../../features/lots/drafts.ts';
import { bid, bidTimes, pay, sell } from '../acts/buying.ts';
import { sendDebitBack } from '../acts/at-the-processor.ts';
import { describeLot, list, listingTime } from '../acts/selling.ts';
import { sold } from '../lots/sold.ts';
import { unsold } from '../lots/unsold.ts';
import { actorOf } from '../people.ts';
import type { Story } from '../play.ts';
import type { Stage } from '../stage.ts';

/** No bid reaches the seller's lowest price; the seller begins a new draft from the lot. */
export async function* belowReserve(stage: Stage): Story {
  const plan = unsold.supplyBoards;
  const closes = stage.calendar.ago(5, '15:00');
  const listed = listingTime(closes, plan);
  yield listed;
  const lotCode = await list(stage, 'repairs', plan);
  const [first, second] = bidTimes(listed, closes, 2);
  yield first!;
  await bid(stage, lotCode, ['works', 180]);
  yield second!;
  await bid(stage, lotCode, ['reclaim', 210]);
  yield closes.plus({ days: 3, minutes: 4 });
  await copyLot(stage.world, { lotCode, sellerId: stage.people.repairs.id });
}

/** Listed with a mass that was only stated, and taken back before anybody bid. */
export async function* withdrawn(stage: Stage): Story {
  yield stage.calendar.ago(9, '10:10');
  const lotCode = await list(stage, 'collectors', unsold.simModules);
  yield stage.calendar.ago(9, '16:45');
  await withdrawLot(stage.world, { lotCode, actor: actorOf(stage.people, 'collectors') });
}

export async function* drafts(stage: Stage): Story {
  yield stage.calendar.ago(3, '19:20');
  await describeLot(stage, 'repairs', unsold.halfDone);
  yield stage.calendar.ago(1, '18:05');
  await describeLot(stage, 'repairs', unsold.nearlyDone);
}

/**
 * The winner's bank debit comes back, nothing else is paid in time, and the lot is offered to the next bidder. While a debit is
 * on its way the time to pay stands still, so that it can run out on any day and hour: here three hours ago.
 */
export async function* offeredToUnderBidder(stage: Stage): Story {
  const { calendar, world } = stage;
  const missed = calendar.hoursAgo(3);
  const closes = calendar.ago(10, '14:00');
  const bids = [
    ['recovery', 270],
    ['trading', 310],
  ] as const;
  const deal = yield* sell(stage, { seller: 'dismantling', plan: sold.consoleCrate, closes, bids });
  const debited = closes.plus({ hours: 5, minutes: 38 });
  yield debited;
  await pay(stage, { buyer: 'trading', deal, method: 'pm_usBankAccount_success' });
  yield debited.plus(missed.toMillis() - deal.dueAt.getTime());
  const payments: { intentId: string }[] = await world.db.query(
    'select intent_id as "intentId" from payments where deal_id = $1',
    [deal.id],
  );
  await sendDebitBack(world.settings, payments[0]!.intentId);
  await stage.hear();
}
