import type { DateTime } from 'luxon';
import { bid, bidTimes, type BidPlan } from '../acts/buying.ts';
import { list, listingTime } from '../acts/selling.ts';
import type { LotPlan } from '../lot-plan.ts';
import type { FirmKey } from '../people.ts';
import type { Story } from '../play.ts';
import type { Stage } from '../stage.ts';

/** A lot that takes bids or waits for a taker at the present. */
export interface OpenLot {
  seller: FirmKey;
  plan: LotPlan;
  /** A full hour in the future. */
  closes: DateTime;
  bids: readonly BidPlan[];
}

/** Lists the lot so that it closes when it shall, and lets its buyers bid until shortly before the present. */
export async function* openLot(stage: Stage, { seller, plan, closes, bids }: OpenLot): Story {
  const listed = listingTime(closes, plan);
  yield listed;
  const lotCode = await list(stage, seller, plan);
  const moments = bidTimes(listed, stage.calendar.hoursAgo(0.5), bids.length);
  for (const [index, one] of bids.entries()) {
    yield moments[index]!;
    await bid(stage, lotCode, one);
  }
}
