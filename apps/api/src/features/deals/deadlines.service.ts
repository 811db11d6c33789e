import type { EntityManager } from 'typeorm';
import { marketTerms } from '../../platform/market-terms.ts';
import { inTransaction } from '../../platform/transaction.ts';
import { createWords } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { lapseAward } from '../bids/bids.commands.ts';
import { letDeclaredMassStand } from '../deliveries/deliveries.commands.ts';
import { notify } from '../notices/notices.commands.ts';
import { closePaymentPages } from '../payments/payments.commands.ts';
import { deadlineRules, reminderMoments, type DueKind, type RunningKind } from './deadlines.rules.ts';
import { lockDeal, moveDeal, setAlarms, type LockedDeal } from './deal-steps.commands.ts';
import type { DealMove } from './deals.rules.ts';
import { nextDue, settleWhenDecided } from './settle-when-decided.ts';
import { weighInFor } from './weigh-in-for.ts';
import { tellOperators, tellSides } from './tell-sides.ts';

type Missed = (tx: EntityManager, deal: LockedDeal, now: Date) => Promise<void>;

/**
 * Does what a deal's deadline brings about, if it is over; reminds of it, if it still runs. A deadline that was met, moved,
 * paused or frozen meanwhile changes nothing.
 */
export const runDeadline = ({ db }: Pick<World, 'db'>, dealId: string): Promise<void> =>
  inTransaction(db, async (tx) => {
    const { deal, now } = await lockDeal(tx, { id: dealId });
    if (!deal.dueKind || !deal.dueAt || deal.frozenAt || deal.duePausedAt) return;
    if (now < deal.dueAt) return remind(tx, deal, now);
    await missed[deal.dueKind as RunningKind](tx, deal, now);
  });

/** Runs what an alarm was lost for: deadlines ten seconds and more past their time. */
export async function sweepDeadlines(world: Pick<World, 'db' | 'log'>): Promise<void> {
  const late: { id: string }[] = await world.db.query(
    `select id from deals where due_at < market_now() - interval '10 seconds' and frozen_at is null and due_paused_at is null order by due_at limit 500`,
  );
  for (const { id } of late)
    // One deal that can't be moved must not keep the others waiting; it is tried again in a minute.
    await runDeadline(world, id).catch((error: unknown) =>
      world.log.error({ err: error, dealId: id }, 'a deadline could not be run'),
    );
}

/** One mail for the latest reminder whose time has come; each is sent once. */
async function remind(tx: EntityManager, deal: LockedDeal, now: Date): Promise<void> {
  const [from, at, kind] = [deal.dueFrom!, deal.dueAt!, deal.dueKind!];
  const passed = reminderMoments({ from, at }).filter((moment) => moment <= now);
  const latest = passed.at(-1);
  const { whose, duty, ifMissed } = deadlineRules[kind];
  if (!latest || whose === 'desk') return;
  const { moment } = createWords(await marketTerms(tx));
  await notify(tx, {
    memberId: whose === 'seller' ? deal.sellerId : deal.buyerId,
    kind: 'deadline',
    key: `remind:${deal.id}:${kind}:${latest.toISOString()}`,
    subject: `${deal.code}: ${duty.toLowerCase()} by ${moment(at)}`,
    text: `If it is missed: ${ifMissed}`,
    link: whose === 'seller' ? `/sell/deals/${deal.code}` : `/deals/${deal.code}`,
  });
  await setAlarms(tx, deal.id, { kind, from, at }, now);
}

const missed: Record<RunningKind, Missed> = {
  async pay(tx, deal, now) {
    await moveDeal(tx, deal, { move: 'pay_missed', actor: 'market', now, due: null, patch: { endedAt: now } });
    await closePaymentPages(tx, deal.id);
    await tellSides(tx, deal, {
      fact: 'pay_missed',
      subject: `${deal.code} was not paid in time and is cancelled`,
      seller: 'We ask the next bidder, if there is one at your lowest price, and write to you.',
      buyer: 'The award has lapsed. It counts on your record.',
    });
    await lapseAward(tx, { lotId: deal.lotId });
  },
  dispatch: (tx, deal, now) =>
    standStill(tx, deal, now, {
      move: 'dispatch_missed',
      next: 'dispatch_late',
      subject: `${deal.code}: dispatch is late`,
      seller: 'The buyer may now cancel and have everything back. Hand the lot over at once, or write to the buyer.',
      buyer: 'The seller did not hand the lot over in time. You may cancel and have everything back, or wait.',
    }),
  collect: (tx, deal, now) =>
    standStill(tx, deal, now, {
      move: 'collect_missed',
      next: 'desk',
      subject: `${deal.code}: the lot was not collected in time`,
      seller: 'The market’s desk takes it up and will write to you.',
      buyer: 'The market’s desk takes it up. Collect the lot, and record the receipt.',
    }),
  receipt: (tx, deal, now) =>
    standStill(tx, deal, now, {
      move: 'receipt_missed',
      next: 'desk',
      subject: `${deal.code}: no receipt after 21 days`,
      seller: 'The market’s desk takes it up as “did not arrive”. Keep the carrier’s proof ready.',
      buyer: 'The market’s desk takes it up as “did not arrive”. If the lot has come, record the receipt.',
    }),
  async weigh_in(tx, deal, now) {
    await letDeclaredMassStand(tx, deal, now);
    await tellSides(tx, deal, {
      fact: 'weigh_in_missed',
      subject: `${deal.code} was not weighed in in time: the declared mass stands`,
      seller: 'The hold is settled when the buyer accepts or the days for a claim are over.',
      buyer: 'You may still accept the delivery; else the hold is settled when the days for a claim are over.',
    });
  },
  async countersign(tx, deal, now) {
    const weighIn = await weighInFor(tx, deal);
    const due = nextDue(deal, weighIn, now);
    await moveDeal(tx, deal, { move: 'countersign_missed', actor: 'market', now, due });
    await settleWhenDecided(tx, deal, weighIn, now);
  },
  claim: async (tx, deal, now) => settleWhenDecided(tx, deal, await weighInFor(tx, deal), now),
  answer: (tx, deal, now) =>
    standStill(tx, deal, now, {
      move: 'answer_missed',
      next: 'desk',
      subject: `${deal.code}: the claim was not answered in time`,
      seller: 'The market’s desk decides on what there is. You may still accept the claim.',
      buyer: 'The market’s desk decides on what there is.',
    }),
  async approval(tx, deal, now) {
    await moveDeal(tx, deal, {
      move: 'approval_missed',
      actor: 'market',
      now,
      due: { kind: 'desk', from: now, at: null },
    });
    await tellOperators(tx, deal);
  },
};

interface StandStill {
  move: DealMove;
  next: Extract<DueKind, 'dispatch_late' | 'desk'>;
  subject: string;
  seller: string;
  buyer: string;
}

/** The time is over and nothing happens by itself: both sides are told, and it is for them or the desk to act. */
async function standStill(
  tx: EntityManager,
  deal: LockedDeal,
  now: Date,
  { move, next, ...words }: StandStill,
): Promise<void> {
  await moveDeal(tx, deal, { move, actor: 'market', now, due: { kind: next, from: now, at: null } });
  await tellSides(tx, deal, { fact: move, ...words });
}
