import type { EntityManager } from 'typeorm';
import type { WeighInFacts } from '../deliveries/deliveries.reads.ts';
import { settleDeal } from '../settlements/settlements.commands.ts';
import { moveDeal, type Due, type LockedDeal } from './deal-steps.commands.ts';
import { isDecided } from './deals.rules.ts';

type WeighInTimes = Pick<WeighInFacts, 'at' | 'countersignedAt' | 'claimEndsAt' | 'countersignEndsAt'>;

/** The deadline that runs next after a weigh-in: the seller's countersignature, then the buyer's claim. */
export function nextDue(deal: Pick<LockedDeal, 'acceptedAt'>, weighIn: WeighInTimes, now: Date): Due | null {
  const running: Due[] = [];
  if (!weighIn.countersignedAt && now < weighIn.countersignEndsAt)
    running.push({ kind: 'countersign', from: weighIn.at, at: weighIn.countersignEndsAt });
  if (!deal.acceptedAt && now < weighIn.claimEndsAt)
    running.push({ kind: 'claim', from: weighIn.at, at: weighIn.claimEndsAt });
  return running[0] ?? null;
}

/** Settles a weighed-in deal as soon as nothing is open any more; until then it waits for what still is. */
export async function settleWhenDecided(
  tx: EntityManager,
  deal: LockedDeal,
  weighIn: WeighInTimes,
  now: Date,
): Promise<void> {
  const accepted = deal.acceptedAt !== null;
  const countersigned = weighIn.countersignedAt !== null;
  if (!isDecided({ ...weighIn, accepted, countersigned, now })) return;
  const why = `${accepted ? 'Accepted by the buyer' : 'The days for a claim are over'}; ${
    countersigned ? 'the weigh-in is countersigned' : 'the time to countersign is over'
  }`;
  await moveDeal(tx, deal, { move: 'decided', actor: 'market', now, due: null, detail: { why } });
  await settleDeal(tx, deal, { adjustmentMinor: 0, reason: '', now });
}
