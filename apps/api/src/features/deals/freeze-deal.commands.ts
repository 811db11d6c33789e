import type { EntityManager } from 'typeorm';
import { moveWeighInTimes } from '../deliveries/deliveries.commands.ts';
import { addEvent, lockDeal, setAlarms } from './deal-steps.commands.ts';
import { Deal } from './deal.entity.ts';

/** Stops a deal and its deadline, in whatever state it is: the buyer's bank wants the money back. Twice is once. */
export async function freezeDeal(tx: EntityManager, { dealId }: { dealId: string }): Promise<void> {
  const { deal, now } = await lockDeal(tx, { id: dealId });
  if (deal.frozenAt) return;
  await tx.update(Deal, { id: dealId }, { frozenAt: now, updatedAt: now });
  await addEvent(tx, { dealId, at: now, actor: 'market', actorId: null, kind: 'freeze', detail: {} });
}

/** Lets a frozen deal go on; its deadline ends later by the time it stood still. */
export async function releaseDeal(tx: EntityManager, { dealId }: { dealId: string }): Promise<void> {
  const { deal, now } = await lockDeal(tx, { id: dealId });
  if (!deal.frozenAt) return;
  const stoodStillMs = now.getTime() - deal.frozenAt.getTime();
  const dueAt = deal.dueAt && new Date(deal.dueAt.getTime() + stoodStillMs);
  await moveWeighInTimes(tx, dealId, stoodStillMs);
  await tx.update(Deal, { id: dealId }, { frozenAt: null, dueAt, updatedAt: now });
  await addEvent(tx, { dealId, at: now, actor: 'market', actorId: null, kind: 'release', detail: {} });
  if (deal.dueKind && dueAt)
    await setAlarms(tx, dealId, { kind: deal.dueKind, from: deal.dueFrom ?? now, at: dueAt }, now);
}
