import { claimMass, dispatch, makeReady, receive, weighIn } from '../acts/delivering.ts';
import { pay, sell } from '../acts/buying.ts';
import { sold } from '../lots/sold.ts';
import type { Story } from '../play.ts';
import type { Stage } from '../stage.ts';

/** Deals that stand at one step each at the present. Every one of them is within its deadline, on whatever day that is. */

export async function* awaitingPayment(stage: Stage): Story {
  const closes = stage.calendar.fullHour(-5);
  const bids = [
    ['reclaim', 520],
    ['recovery', 620],
  ] as const;
  yield* sell(stage, { seller: 'disposal', plan: sold.branchSwitches, closes, bids });
}

export async function* held(stage: Stage): Story {
  const closes = stage.calendar.fullHour(-30);
  const bids = [
    ['works', 230],
    ['refining', 290],
  ] as const;
  const deal = yield* sell(stage, { seller: 'repairs', plan: sold.notebookMemory, closes, bids });
  yield closes.plus({ hours: 4, minutes: 51 });
  await pay(stage, { buyer: 'refining', deal });
}

export async function* dispatched(stage: Stage): Story {
  const closes = stage.calendar.fullHour(-4 * 24);
  const bids = [
    ['trading', 540],
    ['recovery', 660],
  ] as const;
  const deal = yield* sell(stage, { seller: 'disposal', plan: sold.bladeBoards, closes, bids });
  yield closes.plus({ hours: 3, minutes: 26 });
  await pay(stage, { buyer: 'recovery', deal });
  yield closes.plus({ days: 2, hours: 2, minutes: 33 });
  await dispatch(stage, { by: 'disposal', deal }, 'WC 21 340');
}

export async function* readyForCollection(stage: Stage): Story {
  const closes = stage.calendar.fullHour(-3 * 24);
  const bids = [
    ['refining', 1700],
    ['reclaim', 2300],
  ] as const;
  const deal = yield* sell(stage, { seller: 'clearance', plan: sold.schoolBoards, closes, bids });
  yield closes.plus({ hours: 6, minutes: 4 });
  await pay(stage, { buyer: 'reclaim', deal });
  yield closes.plus({ days: 1, hours: 3, minutes: 38 });
  await makeReady(stage, { by: 'clearance', deal });
}

export async function* received(stage: Stage): Story {
  const closes = stage.calendar.fullHour(-6 * 24);
  const bids = [
    ['works', 280],
    ['recovery', 340],
  ] as const;
  const deal = yield* sell(stage, { seller: 'dismantling', plan: sold.graphicsCards, closes, bids });
  yield closes.plus({ hours: 8, minutes: 13 });
  await pay(stage, { buyer: 'recovery', deal });
  yield closes.plus({ days: 2, minutes: 56 });
  await dispatch(stage, { by: 'dismantling', deal }, 'WC 21 202');
  yield closes.plus({ days: 5, hours: 3, minutes: 22 });
  await receive(stage, { by: 'recovery', deal });
}

export async function* weighedIn(stage: Stage): Story {
  const closes = stage.calendar.fullHour(-7 * 24);
  const bids = [
    ['trading', 260],
    ['works', 340],
  ] as const;
  const deal = yield* sell(stage, { seller: 'repairs', plan: sold.benchContacts, closes, bids });
  yield closes.plus({ hours: 2, minutes: 47 });
  await pay(stage, { buyer: 'works', deal });
  yield closes.plus({ days: 1, hours: 4, minutes: 9 });
  await dispatch(stage, { by: 'repairs', deal }, 'WC 21 155');
  yield closes.plus({ days: 5, hours: 20, minutes: 31 });
  await receive(stage, { by: 'works', deal });
  yield closes.plus({ days: 6, hours: 14, minutes: 7 });
  await weighIn(stage, { by: 'works', deal }, { netKg: 1.598, tareKg: 0.105, resolutionG: 1, serial: 'O-3' });
}

/** The mass is short beyond the tolerance; the seller has not answered the claim yet. */
export async function* inDispute(stage: Stage): Story {
  const closes = stage.calendar.fullHour(-8 * 24);
  const bids = [
    ['reclaim', 280],
    ['refining', 370],
    ['recovery', 330],
  ] as const;
  const deal = yield* sell(stage, { seller: 'repairs', plan: sold.notebookBoards, closes, bids });
  yield closes.plus({ hours: 5, minutes: 42 });
  await pay(stage, { buyer: 'refining', deal });
  yield closes.plus({ days: 1, hours: 2, minutes: 18 });
  await dispatch(stage, { by: 'repairs', deal }, 'WC 21 098');
  yield closes.plus({ days: 6, minutes: 51 });
  await receive(stage, { by: 'refining', deal });
  yield closes.plus({ days: 6, hours: 20, minutes: 26 });
  const note = 'One bag was torn. We weighed what arrived twice, with the same result.';
  await weighIn(stage, { by: 'refining', deal }, { netKg: 20.6, tareKg: 2.2, resolutionG: 100, serial: 'U-12', note });
  yield closes.plus({ days: 7, hours: 4, minutes: 33 });
  await claimMass(stage, { by: 'refining', deal });
}
