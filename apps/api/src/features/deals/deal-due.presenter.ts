import type { DealView } from '@lydite/contracts';
import type { WeighInFacts } from '../deliveries/deliveries.reads.ts';
import { deadlineRules, type DueKind } from './deadlines.rules.ts';
import type { Deal } from './deal.entity.ts';
import type { Side } from './deals.rules.ts';

interface Running {
  kind: DueKind;
  at: Date | null;
}

type DueFacts = Pick<Deal, 'state' | 'dueKind' | 'dueAt' | 'duePausedAt' | 'frozenAt' | 'acceptedAt'>;
type WeighInTimes = Pick<WeighInFacts, 'countersignedAt' | 'claimEndsAt' | 'countersignEndsAt'>;

/**
 * The deadline this side reads of. After the weigh-in two run side by side, the seller's countersignature and the buyer's
 * claim: each side sees its own first.
 */
function runningFor(deal: DueFacts, weighIn: WeighInTimes | null, side: Side, now: Date): Running | null {
  if (deal.frozenAt || deal.duePausedAt || !deal.dueKind) return null;
  if (deal.state === 'weighed_in' && weighIn) {
    const countersign: Running | null =
      weighIn.countersignedAt || now >= weighIn.countersignEndsAt
        ? null
        : { kind: 'countersign', at: weighIn.countersignEndsAt };
    const claim: Running | null = deal.acceptedAt ? null : { kind: 'claim', at: weighIn.claimEndsAt };
    return side === 'seller' ? (countersign ?? claim) : (claim ?? countersign);
  }
  return { kind: deal.dueKind, at: deal.dueAt };
}

export interface DueWords {
  what: string;
  at: Date | null;
  ifMissed: string;
  /** Whether it is this side's turn. */
  own: boolean;
}

/** What is due, in words for one side; null when no deadline runs. */
export function dueWords(deal: DueFacts, weighIn: WeighInTimes | null, side: Side, now: Date): DueWords | null {
  const running = runningFor(deal, weighIn, side, now);
  if (!running) return null;
  const { whose, duty, others, ifMissed } = deadlineRules[running.kind];
  const own = whose === side;
  const settlesThen = running.kind === 'countersign' && deal.acceptedAt !== null;
  return {
    what: own ? duty : others,
    at: running.at,
    ifMissed: settlesThen
      ? 'The hold is settled when the seller has countersigned, at the latest at this time.'
      : ifMissed,
    own: own || (running.kind === 'dispatch_late' && side === 'buyer'),
  };
}

export const toDueView = (due: DueWords | null): DealView['due'] =>
  due?.at ? { what: due.what, at: due.at.toISOString(), ifMissed: due.ifMissed } : null;
