import type { DealAction, DealState } from '@lydite/contracts';
import { AppError } from '../../platform/app-error.ts';

export type Side = 'seller' | 'buyer';
export type DealActor = Side | 'market' | 'desk';

interface Move {
  by: DealActor;
  from: Partial<Record<DealState, DealState>>;
}

/** Everything that can happen to a deal: who brings it about, and which state it leads to from which (rules.md, Deal states). */
export const dealMoves = {
  hold: { by: 'market', from: { awaiting_payment: 'held' } },
  pay_missed: { by: 'market', from: { awaiting_payment: 'cancelled' } },
  dispatch: { by: 'seller', from: { held: 'dispatched' } },
  mark_ready: { by: 'seller', from: { held: 'ready' } },
  dispatch_missed: { by: 'market', from: { held: 'held' } },
  cancel_late: { by: 'buyer', from: { held: 'cancelled' } },
  collect_missed: { by: 'market', from: { ready: 'ready' } },
  receipt_missed: { by: 'market', from: { dispatched: 'dispatched' } },
  receive: { by: 'buyer', from: { dispatched: 'received', ready: 'received' } },
  weigh_in: { by: 'buyer', from: { received: 'weighed_in' } },
  weigh_in_missed: { by: 'market', from: { received: 'weighed_in' } },
  countersign: { by: 'seller', from: { weighed_in: 'weighed_in' } },
  countersign_missed: { by: 'market', from: { weighed_in: 'weighed_in' } },
  accept: { by: 'buyer', from: { weighed_in: 'weighed_in' } },
  claim_mass: { by: 'buyer', from: { weighed_in: 'in_dispute' } },
  accept_claim: { by: 'seller', from: { in_dispute: 'settling' } },
  answer_missed: { by: 'market', from: { in_dispute: 'in_dispute' } },
  decided: { by: 'market', from: { weighed_in: 'settling' } },
  approval_due: { by: 'market', from: { settling: 'needs_approval' } },
  approval_missed: { by: 'market', from: { needs_approval: 'needs_approval' } },
  approve: { by: 'desk', from: { needs_approval: 'settling' } },
  settle: { by: 'market', from: { settling: 'settled' } },
} as const satisfies Record<string, Move>;
export type DealMove = keyof typeof dealMoves;

export const finalStates: readonly DealState[] = ['settled', 'cancelled', 'refunded'];

const words: Record<DealState, string> = {
  awaiting_payment: 'awaits payment',
  held: 'is paid into hold',
  dispatched: 'is on its way',
  ready: 'is ready for collection',
  received: 'has arrived',
  weighed_in: 'is weighed in',
  in_dispute: 'is in dispute',
  settling: 'is being settled',
  needs_approval: 'awaits approval',
  settled: 'is settled',
  cancelled: 'is cancelled',
  refunded: 'is refunded',
};

/**
 * The state a move leads to.
 * @throws AppError deal.wrong_state when it can't happen from this state or isn't this actor's to make
 */
export function nextState(state: DealState, move: DealMove, actor: DealActor): DealState {
  const { by, from }: Move = dealMoves[move];
  const next = from[state];
  if (!next || by !== actor)
    throw new AppError('deal.wrong_state', `This cannot be done now: the deal ${words[state]}.`, {
      context: { state },
    });
  return next;
}

export interface ActionFacts {
  state: DealState;
  frozen: boolean;
  side: Side;
  way: 'seller-sends' | 'collection';
  dispatchLate: boolean;
  accepted: boolean;
  countersigned: boolean;
  /** What a claim on the mass would take off the price; 0 within the tolerance. */
  claimableMinor: number;
}

/** What this side can do now, the most likely first. */
export function actionsOf(facts: ActionFacts): DealAction[] {
  const { state, frozen, side, way, dispatchLate, accepted, countersigned, claimableMinor } = facts;
  if (frozen) return [];
  const possible: Record<Side, Partial<Record<DealState, DealAction[]>>> = {
    buyer: {
      awaiting_payment: ['pay'],
      held: dispatchLate ? ['cancel_late'] : [],
      dispatched: ['receive'],
      ready: ['receive'],
      received: ['weigh_in'],
      weighed_in: accepted ? [] : claimableMinor > 0 ? ['accept', 'claim_mass'] : ['accept'],
    },
    seller: {
      held: [way === 'collection' ? 'mark_ready' : 'dispatch'],
      weighed_in: countersigned ? [] : ['countersign'],
      in_dispute: ['accept_claim'],
    },
  };
  return possible[side][state] ?? [];
}

interface Decision {
  accepted: boolean;
  claimEndsAt: Date;
  countersigned: boolean;
  countersignEndsAt: Date;
  now: Date;
}

/** Outright: settles once the buyer accepted or the claim days are over, and the seller countersigned or that time is over. */
export const isDecided = ({ accepted, claimEndsAt, countersigned, countersignEndsAt, now }: Decision): boolean =>
  (accepted || now >= claimEndsAt) && (countersigned || now >= countersignEndsAt);
