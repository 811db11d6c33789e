import { randomUUID } from 'node:crypto';
import {
  accept,
  acceptClaim,
  claimMass,
  countersign,
  dispatch,
  makeReady,
  receive,
  weighIn,
} from '../acts/delivering.ts';
import { bid, dealOf, pay, sell } from '../acts/buying.ts';
import { list } from '../acts/selling.ts';
import { sold } from '../lots/sold.ts';
import type { Story } from '../play.ts';
import type { Stage } from '../stage.ts';

/** Everything in order: a late bid moves the close, both sides say yes, the seller is paid. */
export async function* settledInOrder(stage: Stage): Story {
  const closes = stage.calendar.ago(30, '18:00');
  const plan = sold.rackMemory;
  yield closes.minus({ days: plan.sale.days, minutes: 20 });
  const lotCode = await list(stage, 'repairs', plan);
  yield closes.minus({ days: 4, hours: 3 });
  await bid(stage, lotCode, ['reclaim', 620]);
  yield closes.minus({ days: 1, hours: 6 });
  await bid(stage, lotCode, ['recovery', 880]);
  yield closes.minus({ minutes: 3 });
  await bid(stage, lotCode, ['refining', 840]);
  yield closes.plus({ minutes: 10 });
  const deal = await dealOf(stage, lotCode);
  yield closes.plus({ hours: 15, minutes: 42 });
  await pay(stage, { buyer: 'recovery', deal });
  yield closes.plus({ days: 1, hours: 21, minutes: 18 });
  await dispatch(stage, { by: 'repairs', deal }, 'WC 20 417');
  yield closes.plus({ days: 4, hours: 16, minutes: 51 });
  await receive(stage, { by: 'recovery', deal });
  yield closes.plus({ days: 4, hours: 18, minutes: 26 });
  const crate = { netKg: 15.09, tareKg: 1.24, picture: 'memory-crate-scale' } as const;
  await weighIn(stage, { by: 'recovery', deal }, { ...crate, resolutionG: 10, serial: 'B-204' });
  yield closes.plus({ days: 5, hours: 15, minutes: 33 });
  await countersign(stage, { by: 'repairs', deal });
  yield closes.plus({ days: 5, hours: 20, minutes: 4 });
  await accept(stage, { by: 'recovery', deal });
}

/** Weighed on the public scale of the buyer's town. Nobody says anything after that: the deadlines settle it. */
export async function* settledBySilence(stage: Stage): Story {
  const closes = stage.calendar.ago(27, '17:00');
  const bids = [
    ['reclaim', 330],
    ['trading', 420],
    ['refining', 380],
  ] as const;
  const deal = yield* sell(stage, { seller: 'clearance', plan: sold.officeBoards, closes, bids });
  yield closes.plus({ hours: 17, minutes: 38 });
  // The first card is declined, the second is good.
  await pay(stage, { buyer: 'trading', deal, method: 'pm_card_chargeDeclinedInsufficientFunds' });
  yield closes.plus({ hours: 18, minutes: 13 });
  await pay(stage, { buyer: 'trading', deal });
  yield closes.plus({ days: 1, hours: 16, minutes: 56 });
  await dispatch(stage, { by: 'clearance', deal }, 'WC 20 562');
  yield closes.plus({ days: 3, hours: 17, minutes: 22 });
  await receive(stage, { by: 'trading', deal });
  yield closes.plus({ days: 3, hours: 19, minutes: 47 });
  const scale = { netKg: 31.08, tareKg: 0.38, resolutionG: 10, serial: 'No. 6', picture: 'weigh-ticket' } as const;
  await weighIn(stage, { by: 'trading', deal }, scale);
}

/** The mass is short beyond the tolerance, and the seller accepts the claim: part of the hold goes back. */
export async function* settledAfterClaim(stage: Stage): Story {
  const closes = stage.calendar.ago(24, '16:00');
  const bids = [
    ['works', 280],
    ['recovery', 390],
    ['trading', 350],
  ] as const;
  const deal = yield* sell(stage, { seller: 'dismantling', plan: sold.keypadPhones, closes, bids });
  yield closes.plus({ hours: 4, minutes: 9 });
  await pay(stage, { buyer: 'recovery', deal });
  yield closes.plus({ days: 2, hours: 17, minutes: 31 });
  await dispatch(stage, { by: 'dismantling', deal }, 'WC 20 688');
  yield closes.plus({ days: 5, hours: 18, minutes: 7 });
  await receive(stage, { by: 'recovery', deal });
  yield closes.plus({ days: 5, hours: 20, minutes: 42 });
  const note = 'Dry, without the bag. A second weighing gave the same.';
  const scale = { netKg: 11.86, tareKg: 0.62, resolutionG: 10, serial: 'B-204', note };
  await weighIn(stage, { by: 'recovery', deal }, scale);
  yield closes.plus({ days: 5, hours: 21, minutes: 18 });
  await claimMass(stage, { by: 'recovery', deal });
  yield closes.plus({ days: 6, hours: 19, minutes: 51 });
  await acceptClaim(stage, { by: 'dismantling', deal });
}

/** Settled, but nobody has seen the seller's papers yet: the transfer waits. */
export async function* settledWithoutPapers(stage: Stage): Story {
  const closes = stage.calendar.ago(16, '19:00');
  const bids = [
    ['works', 340],
    ['trading', 470],
  ] as const;
  const deal = yield* sell(stage, { seller: 'salvage', plan: sold.pinStrips, closes, bids });
  yield closes.plus({ hours: 14, minutes: 26 });
  await pay(stage, { buyer: 'trading', deal });
  yield closes.plus({ days: 1, hours: 15, minutes: 33 });
  await dispatch(stage, { by: 'salvage', deal }, 'WC 20 905');
  yield closes.plus({ days: 3, hours: 15, minutes: 4 });
  await receive(stage, { by: 'trading', deal });
  yield closes.plus({ days: 3, hours: 16, minutes: 38 });
  await weighIn(stage, { by: 'trading', deal }, { netKg: 4.803, tareKg: 0.41, resolutionG: 1, serial: 'P-7' });
  yield closes.plus({ days: 3, hours: 20, minutes: 13 });
  await countersign(stage, { by: 'salvage', deal });
  yield closes.plus({ days: 4, hours: 14, minutes: 56 });
  await accept(stage, { by: 'trading', deal });
}

/** Taken at the asking price and collected at the seller's place. */
export async function* settledByCollection(stage: Stage): Story {
  const plan = sold.hallProcessors;
  const listed = stage.calendar.ago(20, '09:15');
  yield listed;
  const lotCode = await list(stage, 'disposal', plan);
  yield listed.plus({ days: 1, hours: 5, minutes: 22 });
  const priceMinor = plan.sale.askingMinor!;
  const buyerId = stage.people.refining.id;
  await stage.bids.take({ lotCode, buyerId, priceMinor, attempt: randomUUID() });
  const deal = await dealOf(stage, lotCode);
  yield listed.plus({ days: 1, hours: 6, minutes: 47 });
  await pay(stage, { buyer: 'refining', deal });
  yield listed.plus({ days: 2, hours: 2, minutes: 9 });
  await makeReady(stage, { by: 'disposal', deal });
  yield listed.plus({ days: 5, hours: 3, minutes: 31 });
  await receive(stage, { by: 'refining', deal });
  yield listed.plus({ days: 5, hours: 6, minutes: 7 });
  await weighIn(stage, { by: 'refining', deal }, { netKg: 9.21, tareKg: 0.9, resolutionG: 10, serial: 'U-31' });
  yield listed.plus({ days: 6, minutes: 42 });
  await countersign(stage, { by: 'disposal', deal });
  yield listed.plus({ days: 6, hours: 4, minutes: 18 });
  await accept(stage, { by: 'refining', deal });
}
