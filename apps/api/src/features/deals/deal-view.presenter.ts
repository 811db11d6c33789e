import type { DealView, PhotoView, SettlementView, WeighInView } from '@lydite/contracts';
import { feeMinor } from '../../platform/fee-minor.ts';
import type { Words } from '../../platform/words.ts';
import type { WeighInFacts } from '../deliveries/deliveries.reads.ts';
import type { LotHeadline } from '../lots/lots.reads.ts';
import { chainOf } from './deal-chain.presenter.ts';
import { dueWords, toDueView } from './deal-due.presenter.ts';
import { toEventView } from './deal-events.presenter.ts';
import type { Claim, Deal, DealEvent } from './deal.entity.ts';
import { actionsOf, type Side } from './deals.rules.ts';

interface DealFacts {
  deal: Deal;
  side: Side;
  lot: LotHeadline;
  weighIn: WeighInFacts | null;
  weighInPhotos: PhotoView[];
  claim: Claim | null;
  settlement: DealView['settlement'];
  payment: DealView['payment'];
  counterparty: DealView['counterparty'];
  events: DealEvent[];
  now: Date;
  words: Words;
}

export function toDealView(facts: DealFacts): DealView {
  const { deal, side, lot, weighIn, claim, settlement, payment, counterparty, events, now, words } = facts;
  const viewer = { side, counterpartyName: counterparty?.name ?? null };
  return {
    code: deal.code,
    lotCode: lot.code,
    title: lot.title,
    coverPhotoId: lot.coverPhotoId,
    massG: lot.massG,
    pieces: lot.pieces,
    state: deal.state,
    frozen: deal.frozenAt !== null,
    side,
    counterparty,
    priceMinor: deal.priceMinor,
    freightMinor: deal.freightMinor,
    buyerFeeMinor: feeMinor(deal.priceMinor, deal.buyerFeeBp),
    sellerFeeMinor: feeMinor(deal.priceMinor, deal.sellerFeeBp),
    holdMinor: deal.holdMinor,
    // Why a bank declined is the buyer's alone, as what a transfer waits for is the seller's.
    payment: side === 'buyer' ? payment : { ...payment, message: '' },
    delivery: {
      way: lot.deliveryWay,
      place: lot.place,
      hours: lot.deliveryHours,
      carrier: deal.carrier,
      trackingCode: deal.trackingCode,
    },
    weighIn: weighIn && toWeighInView(weighIn, facts.weighInPhotos),
    claim: claim && { ground: claim.ground, adjustmentMinor: claim.adjustmentMinor, at: claim.at.toISOString() },
    settlement: settlement && (side === 'seller' ? settlement : withoutReason(settlement)),
    due: toDueView(dueWords(deal, weighIn, side, now)),
    chain: chainOf({ deal, way: lot.deliveryWay, weighIn, settlement, viewer, words }),
    events: events.map((event) => toEventView(event, viewer, words)),
    actions: actionsOf({
      state: deal.state,
      frozen: deal.frozenAt !== null,
      side,
      way: lot.deliveryWay,
      dispatchLate: isDispatchLate(deal, now),
      accepted: deal.acceptedAt !== null,
      countersigned: weighIn !== null && weighIn.countersignedAt !== null,
      claimableMinor: weighIn && now < weighIn.claimEndsAt ? weighIn.claimableMinor : 0,
    }),
  };
}

const withoutReason = (settlement: SettlementView): SettlementView => ({
  ...settlement,
  transfer: settlement.transfer && { ...settlement.transfer, reason: '' },
});

/** Late from the moment the time is over, whether or not the clock's own step has run yet. */
export const isDispatchLate = ({ dueKind, dueAt }: Pick<Deal, 'dueKind' | 'dueAt'>, now: Date): boolean =>
  dueKind === 'dispatch_late' || (dueKind === 'dispatch' && dueAt !== null && now >= dueAt);

const toWeighInView = (facts: WeighInFacts, photos: PhotoView[]): WeighInView => ({
  grossG: facts.grossG,
  tareG: facts.tareG,
  netG: facts.netG,
  scaleResolutionG: facts.scaleResolutionG,
  scaleSerial: facts.scaleSerial,
  note: facts.note,
  photos,
  at: facts.at.toISOString(),
  countersignedAt: facts.countersignedAt?.toISOString() ?? null,
  declaredG: facts.declaredG,
  differenceG: facts.differenceG,
  toleranceG: facts.toleranceG,
  claimableMinor: facts.claimableMinor,
});
