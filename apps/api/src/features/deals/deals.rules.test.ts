import { dealState, type DealState } from '@lydite/contracts';
import { describe, expect, test } from 'vitest';
import type { AppError } from '../../platform/app-error.ts';
import { deadlineRules, reminderMoments } from './deadlines.rules.ts';
import {
  actionsOf,
  dealMoves,
  finalStates,
  isDecided,
  nextState,
  type DealActor,
  type DealMove,
} from './deals.rules.ts';

const states = dealState.options;
const moves = Object.keys(dealMoves) as DealMove[];
const actors: DealActor[] = ['seller', 'buyer', 'market', 'desk'];

const outcome = (state: DealState, move: DealMove, actor: DealActor): string => {
  try {
    return nextState(state, move, actor);
  } catch (error) {
    return (error as AppError).code;
  }
};

describe('the table of states', () => {
  test('allows exactly these steps', () => {
    const allowed = states.flatMap((state) =>
      moves.flatMap((move) =>
        actors
          .filter((actor) => outcome(state, move, actor) !== 'deal.wrong_state')
          .map((actor) => `${state} –${move}, ${actor}→ ${outcome(state, move, actor)}`),
      ),
    );
    expect(allowed).toEqual([
      'awaiting_payment –hold, market→ held',
      'awaiting_payment –pay_missed, market→ cancelled',
      'held –dispatch, seller→ dispatched',
      'held –mark_ready, seller→ ready',
      'held –dispatch_missed, market→ held',
      'held –cancel_late, buyer→ cancelled',
      'dispatched –receipt_missed, market→ dispatched',
      'dispatched –receive, buyer→ received',
      'ready –collect_missed, market→ ready',
      'ready –receive, buyer→ received',
      'received –weigh_in, buyer→ weighed_in',
      'received –weigh_in_missed, market→ weighed_in',
      'weighed_in –countersign, seller→ weighed_in',
      'weighed_in –countersign_missed, market→ weighed_in',
      'weighed_in –accept, buyer→ weighed_in',
      'weighed_in –claim_mass, buyer→ in_dispute',
      'weighed_in –decided, market→ settling',
      'in_dispute –accept_claim, seller→ settling',
      'in_dispute –answer_missed, market→ in_dispute',
      'settling –approval_due, market→ needs_approval',
      'settling –settle, market→ settled',
      'needs_approval –approval_missed, market→ needs_approval',
      'needs_approval –approve, desk→ settling',
    ]);
  });

  test('lets nothing happen to a deal that has ended, and every other state has a way out', () => {
    for (const state of states) {
      const ways = moves.filter((move) => {
        const next: DealState | undefined = (dealMoves[move].from as Partial<Record<DealState, DealState>>)[state];
        return next !== undefined && next !== state;
      });
      expect(ways.length > 0, state).toBe(!finalStates.includes(state));
    }
  });
});

describe('what a side can do', () => {
  const facts = {
    state: 'weighed_in',
    frozen: false,
    side: 'buyer',
    way: 'seller-sends',
    dispatchLate: false,
    accepted: false,
    countersigned: false,
    claimableMinor: 0,
  } as const;

  test('a claim is offered only when there is something to claim, and nothing after accepting', () => {
    expect(actionsOf(facts)).toEqual(['accept']);
    expect(actionsOf({ ...facts, claimableMinor: 1 })).toEqual(['accept', 'claim_mass']);
    expect(actionsOf({ ...facts, claimableMinor: 1, accepted: true })).toEqual([]);
  });
  test('the buyer cancels only once dispatch is late', () => {
    expect(actionsOf({ ...facts, state: 'held' })).toEqual([]);
    expect(actionsOf({ ...facts, state: 'held', dispatchLate: true })).toEqual(['cancel_late']);
  });
  test('the seller hands over in the way the lot was sold', () => {
    expect(actionsOf({ ...facts, state: 'held', side: 'seller' })).toEqual(['dispatch']);
    expect(actionsOf({ ...facts, state: 'held', side: 'seller', way: 'collection' })).toEqual(['mark_ready']);
  });
  test('every action offered is one the table allows that side', () => {
    const moveOf: Record<string, DealMove> = { pay: 'hold' };
    for (const state of states)
      for (const side of ['seller', 'buyer'] as const)
        for (const action of actionsOf({ ...facts, state, side, dispatchLate: true, claimableMinor: 1 })) {
          const move = moveOf[action] ?? (action as DealMove);
          expect(outcome(state, move, dealMoves[move].by), `${state} ${action}`).not.toBe('deal.wrong_state');
          if (action !== 'pay') expect(dealMoves[move].by).toBe(side);
        }
  });
});

describe('when a weighed-in deal settles', () => {
  const at = (day: number): Date => new Date(Date.UTC(2026, 11, day, 17));
  const decided = (accepted: boolean, countersigned: boolean, day: number): boolean =>
    isDecided({ accepted, countersigned, claimEndsAt: at(8), countersignEndsAt: at(3), now: at(day) });

  test('accepted: with the countersignature, or when its time is over', () => {
    expect([decided(true, false, 2), decided(true, true, 2), decided(true, false, 3)]).toEqual([false, true, true]);
  });
  test('not accepted: when the claim days are over, countersigned or not', () => {
    expect([decided(false, true, 7), decided(false, true, 8), decided(false, false, 8)]).toEqual([false, true, true]);
  });
});

describe('reminders', () => {
  const from = new Date('2026-12-01T10:00:00Z');
  const moments = (at: string): string[] =>
    reminderMoments({ from, at: new Date(at) }).map((moment) => moment.toISOString());

  test('come at half time and a day before', () => {
    expect(moments('2026-12-07T17:00:00Z')).toEqual(['2026-12-04T13:30:00.000Z', '2026-12-06T17:00:00.000Z']);
  });
  test('leave the day before out when the deadline is shorter than that', () => {
    expect(moments('2026-12-02T09:00:00Z')).toEqual(['2026-12-01T21:30:00.000Z']);
  });
  test('every deadline that runs says what happens if it is missed', () => {
    for (const [kind, { days, ifMissed }] of Object.entries(deadlineRules))
      expect(ifMissed !== '', kind).toBe(days !== null);
  });
});
