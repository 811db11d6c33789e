import type { DealView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import { inTransaction } from '../../platform/transaction.ts';
import { createWords, massWords } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { recordCountersign } from '../deliveries/deliveries.commands.ts';
import { notify } from '../notices/notices.commands.ts';
import { returnHold } from '../payments/payments.commands.ts';
import { settleDeal } from '../settlements/settlements.commands.ts';
import { acceptedClaim } from './claim-terms.ts';
import { dueAfter, lockOwnDeal, moveDeal, type LockedDeal } from './deal-steps.commands.ts';
import { isDispatchLate } from './deal-view.presenter.ts';
import { Claim } from './deal.entity.ts';
import { dealViewOf } from './deals.reads.ts';
import { nextState, type DealMove, type Side } from './deals.rules.ts';
import { nextDue, settleWhenDecided } from './settle-when-decided.ts';
import { weighInFor } from './weigh-in-for.ts';

export interface OwnStep {
  dealCode: string;
  memberId: string;
}

type Work = (tx: EntityManager, locked: { deal: LockedDeal; now: Date }) => Promise<void>;

/** Locks the deal of the side whose step it is, checks that it is the time for it, does it and answers with the deal as it then is. */
const takeStep = (
  { db }: Pick<World, 'db'>,
  { dealCode, memberId }: OwnStep,
  { side, move }: { side: Side; move: DealMove },
  work: Work,
): Promise<DealView> =>
  inTransaction(db, async (tx) => {
    const locked = await lockOwnDeal(tx, { code: dealCode, side, memberId });
    nextState(locked.deal.state, move, side);
    await work(tx, locked);
    return dealViewOf(tx, { code: dealCode, memberId });
  });

/** The buyer accepts the delivery. It settles at once if the seller has countersigned, else when they do or their time is over. */
export const acceptDelivery = (world: Pick<World, 'db'>, step: OwnStep): Promise<DealView> =>
  takeStep(world, step, { side: 'buyer', move: 'accept' }, async (tx, { deal, now }) => {
    if (deal.acceptedAt) throw new AppError('deal.wrong_state', 'You have accepted this delivery already.');
    const weighIn = await weighInFor(tx, deal);
    await moveDeal(tx, deal, {
      move: 'accept',
      actor: 'buyer',
      actorId: step.memberId,
      now,
      due: nextDue({ acceptedAt: now }, weighIn, now),
      patch: { acceptedAt: now },
    });
    await settleWhenDecided(tx, deal, weighIn, now);
  });

/** The seller countersigns the weigh-in. It settles at once if the buyer has accepted, else when they do or the claim days are over. */
export const countersignWeighIn = (world: Pick<World, 'db'>, step: OwnStep): Promise<DealView> =>
  takeStep(world, step, { side: 'seller', move: 'countersign' }, async (tx, { deal, now }) => {
    const weighIn = await weighInFor(tx, deal);
    if (weighIn.countersignedAt)
      throw new AppError('deal.wrong_state', 'You have countersigned this weigh-in already.');
    await recordCountersign(tx, deal.id, now);
    const countersigned = { ...weighIn, countersignedAt: now };
    await moveDeal(tx, deal, {
      move: 'countersign',
      actor: 'seller',
      actorId: step.memberId,
      now,
      due: nextDue(deal, countersigned, now),
    });
    await settleWhenDecided(tx, deal, countersigned, now);
  });

/** The buyer claims that the mass is short: the adjustment is computed, and the seller has three days to answer. */
export const claimMass = (world: Pick<World, 'db'>, step: OwnStep): Promise<DealView> =>
  takeStep(world, step, { side: 'buyer', move: 'claim_mass' }, async (tx, { deal, now }) => {
    const weighIn = await weighInFor(tx, deal);
    if (deal.acceptedAt) throw new AppError('deal.wrong_state', 'You have accepted this delivery.');
    if (now >= weighIn.claimEndsAt) throw new AppError('deal.wrong_state', 'The days for a claim are over.');
    if (weighIn.claimableMinor === 0)
      throw new AppError(
        'claim.none',
        `The mass is within the tolerance of ${massWords(weighIn.toleranceG)}: there is nothing to claim.`,
      );
    const adjustmentMinor = weighIn.claimableMinor;
    const { declaredG, netG: foundG } = weighIn;
    await tx.insert(Claim, { dealId: deal.id, ground: 'mass', declaredG, foundG, adjustmentMinor, at: now });
    await moveDeal(tx, deal, {
      move: 'claim_mass',
      actor: 'buyer',
      actorId: step.memberId,
      now,
      due: await dueAfter(tx, deal, { kind: 'answer', from: now }),
      detail: { adjustmentMinor, shortG: -weighIn.differenceG },
    });
    const { money, moment } = createWords(await marketTerms(tx));
    await notify(tx, {
      memberId: deal.sellerId,
      kind: 'claim',
      key: `claim:${deal.id}`,
      subject: `${deal.code}: the buyer claims ${money(adjustmentMinor)} for mass short`,
      text: `${massWords(foundG)} was found of ${massWords(declaredG)} declared. Accept the claim, and the hold is settled with it; answer by ${moment(deal.dueAt!)}, else the market’s desk decides on what there is.`,
      link: `/sell/deals/${deal.code}`,
    });
  });

/** The seller accepts the claim: the hold is settled with its adjustment. */
export const acceptClaim = (world: Pick<World, 'db'>, step: OwnStep): Promise<DealView> =>
  takeStep(world, step, { side: 'seller', move: 'accept_claim' }, async (tx, { deal, now }) => {
    const claim = await tx.findOneByOrFail(Claim, { dealId: deal.id });
    await tx.update(Claim, { dealId: deal.id }, { acceptedAt: now });
    await moveDeal(tx, deal, {
      move: 'accept_claim',
      actor: 'seller',
      actorId: step.memberId,
      now,
      due: null,
      detail: { adjustmentMinor: claim.adjustmentMinor },
    });
    await settleDeal(tx, deal, { ...(await acceptedClaim(tx, deal)), now });
  });

/** The buyer cancels because dispatch is late: all of the hold goes back, without fees. */
export const cancelLate = (world: Pick<World, 'db'>, step: OwnStep): Promise<DealView> =>
  takeStep(world, step, { side: 'buyer', move: 'cancel_late' }, async (tx, { deal, now }) => {
    if (!isDispatchLate(deal, now))
      throw new AppError('deal.wrong_state', 'The seller still has time to hand the lot over.');
    await moveDeal(tx, deal, {
      move: 'cancel_late',
      actor: 'buyer',
      actorId: step.memberId,
      now,
      due: null,
      patch: { endedAt: now },
    });
    await returnHold(tx, deal, 'dispatch was late');
    await notify(tx, {
      memberId: deal.sellerId,
      kind: 'cancelled',
      key: `cancelled:${deal.id}:seller`,
      subject: `${deal.code} is cancelled: dispatch was late`,
      text: 'The buyer has everything back. You can copy the lot and list it anew.',
      link: `/sell/deals/${deal.code}`,
    });
  });
