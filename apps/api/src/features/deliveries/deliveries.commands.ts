import type { EntityManager } from 'typeorm';
import { dueAfter, moveDeal, type LockedDeal } from '../deals/deal-steps.commands.ts';
import { lotHeadline } from '../lots/lots.reads.ts';
import { WeighIn } from './weigh-in.entity.ts';

/** The smallest mass the market keeps: the declared mass is taken as read, to the milligram. */
const readAsDeclaredG = 0.001;

/** Nobody weighed in time: the declared mass stands and counts as weigh-in; the seller, whose figure it is, need not countersign. */
export async function letDeclaredMassStand(tx: EntityManager, deal: LockedDeal, now: Date): Promise<void> {
  const { massG } = await lotHeadline(tx, deal.lotId);
  const due = await dueAfter(tx, deal, { kind: 'claim', from: now });
  await tx.insert(WeighIn, {
    dealId: deal.id,
    grossG: massG,
    tareG: 0,
    netG: massG,
    scaleResolutionG: readAsDeclaredG,
    scaleSerial: '',
    note: 'Nobody weighed in time: the declared mass stands.',
    photoIds: [],
    enteredBy: null,
    at: now,
    countersignedAt: now,
    claimEndsAt: due.at,
    countersignEndsAt: now,
  });
  await moveDeal(tx, deal, {
    move: 'weigh_in_missed',
    actor: 'market',
    now,
    due,
    detail: { netG: massG },
    patch: { weighedInAt: now },
  });
}

export const recordCountersign = async (tx: EntityManager, dealId: string, now: Date): Promise<void> => {
  await tx.update(WeighIn, { dealId }, { countersignedAt: now });
};

/** Lets both sides' time after a weigh-in end later: the deal stood still. */
export const moveWeighInTimes = async (tx: EntityManager, dealId: string, byMs: number): Promise<void> => {
  await tx.query(
    `update weigh_ins set claim_ends_at = claim_ends_at + make_interval(secs => $2), countersign_ends_at = countersign_ends_at + make_interval(secs => $2)
      where deal_id = $1`,
    [dealId, byMs / 1000],
  );
};
