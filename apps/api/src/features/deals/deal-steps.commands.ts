import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { marketNow } from '../../platform/clock.ts';
import { deadlineAfter } from '../../platform/deadlines.ts';
import { setAlarm } from '../../platform/jobs.ts';
import { deadlineRules, lastDayOfHold, reminderMoments, type DueKind, type RunningKind } from './deadlines.rules.ts';
import { Deal, DealEvent } from './deal.entity.ts';
import { nextState, type DealActor, type DealMove, type Side } from './deals.rules.ts';

export type LockedDeal = Deal;

/**
 * Locks a deal until the end of the transaction, then reads the clock.
 * @throws AppError deal.not_found for no deal, or one on which the member is not on that side
 */
export async function lockDeal(
  tx: EntityManager,
  by: { id: string } | { code: string; side: Side; memberId: string },
): Promise<{ deal: LockedDeal; now: Date }> {
  const where =
    'id' in by
      ? { id: by.id }
      : { code: by.code, ...(by.side === 'seller' ? { sellerId: by.memberId } : { buyerId: by.memberId }) };
  const deal = await tx.findOne(Deal, { where, lock: { mode: 'pessimistic_write' } });
  if (!deal) throw new AppError('deal.not_found', 'There is no such deal of yours.');
  return { deal, now: await marketNow(tx) };
}

/** The same for a step one of the sides takes. @throws AppError deal.frozen while the desk or a chargeback holds the deal up */
export async function lockOwnDeal(
  tx: EntityManager,
  by: { code: string; side: Side; memberId: string },
): Promise<{ deal: LockedDeal; now: Date }> {
  const locked = await lockDeal(tx, by);
  if (locked.deal.frozenAt)
    throw new AppError('deal.frozen', 'This deal is frozen. The market’s desk will write to both sides.');
  return locked;
}

export interface Due {
  kind: DueKind;
  from: Date;
  /** Null when the clock of this kind has run out and nothing happens by itself. */
  at: Date | null;
}

/** When a deadline that starts at `from` ends, capped by the hold's last day. */
export async function dueAfter(
  tx: EntityManager,
  deal: Pick<LockedDeal, 'paidAt'>,
  { kind, from }: { kind: RunningKind; from: Date },
): Promise<Due & { at: Date }> {
  const at = await deadlineAfter(tx, { from, days: deadlineRules[kind].days });
  if (!deal.paidAt) return { kind, from, at };
  const last = await deadlineAfter(tx, { from: deal.paidAt, days: lastDayOfHold });
  return { kind, from, at: last < at ? last : at };
}

export interface Step {
  move: DealMove;
  actor: DealActor;
  actorId?: string;
  now: Date;
  /** The deadline that runs from now on; null for none. */
  due: Due | null;
  /** Facts the timeline tells with the event. */
  detail?: Record<string, string | number>;
  patch?: Partial<Deal>;
}

/**
 * Takes a locked deal one step on: its state by the table, its event, its deadline with the alarms. Changes `deal` too.
 * @throws AppError deal.wrong_state when the table does not allow it
 */
export async function moveDeal(tx: EntityManager, deal: LockedDeal, step: Step): Promise<void> {
  const { move, actor, actorId = null, now, due, detail = {}, patch = {} } = step;
  const changes: Partial<Deal> = {
    ...patch,
    state: nextState(deal.state, move, actor),
    dueKind: due?.kind ?? null,
    dueFrom: due?.from ?? null,
    dueAt: due?.at ?? null,
    duePausedAt: null,
    updatedAt: now,
  };
  await tx.update(Deal, { id: deal.id }, changes);
  Object.assign(deal, changes);
  await addEvent(tx, { dealId: deal.id, at: now, actor, actorId, kind: move, detail });
  if (due) await setAlarms(tx, deal.id, due, now);
}

export const addEvent = async (tx: EntityManager, event: Omit<DealEvent, 'id'>): Promise<void> => {
  await tx.insert(DealEvent, event);
};

/** One alarm for each reminder that still lies ahead, and one for the end. */
export async function setAlarms(tx: EntityManager, dealId: string, { from, at }: Due, now: Date): Promise<void> {
  if (!at) return;
  for (const moment of [...reminderMoments({ from, at }), at])
    if (moment > now) await setAlarm(tx, { job: 'deal.deadline', objectId: dealId, at: moment });
}
