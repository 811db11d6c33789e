import { Decimal } from 'decimal.js';
import { requireBetween } from '../argument.ts';
import { wholeBp } from '../money/assay-sale.ts';
import type { Market } from '../money/return.ts';
import { requireMinor, shareOf } from '../money/share-of.ts';
import type { Estimate, IdentityEvidence, LineInput, MassEvidence } from '../types.ts';

/** A buyer's own rule for one class of material. Masses in grams, both limits included. */
export interface StandingOffer {
  classCode: string;
  rate: { kind: 'per-kg'; perKgMinor: number } | { kind: 'share'; shareBp: number };
  leastMassG: number;
  mostMassG: number;
  /** The weakest evidence that is still enough. */
  identityAtLeast: IdentityEvidence;
  massAtLeast: MassEvidence;
  /** What is left today and in all; counts price, freight and fee. */
  dayBudgetMinor: number;
  budgetMinor: number;
}

export interface OfferedLot {
  estimate: Pick<Estimate, 'goldG' | 'massG'>;
  lines: readonly Pick<LineInput, 'classCode' | 'identityEvidence' | 'massEvidence' | 'massG'>[];
  freightMinor: number;
}

export type NoOfferReason =
  | 'no-lines'
  | 'other-class'
  | 'mass-too-small'
  | 'mass-too-large'
  | 'identity-not-shown'
  | 'mass-not-weighed'
  | 'stale-price'
  | 'worth-nothing'
  | 'over-day-budget'
  | 'over-budget';

export type FirmOffer =
  | { fits: true; priceMinor: number; feeMinor: number; totalMinor: number }
  /** All the reasons, in the order a person would check them. */
  | { fits: false; reasons: NoOfferReason[] };

/** The market as an offer sees it: a stale price never fires an offer by share. */
export interface OfferMarket extends Market {
  priceIsStale: boolean;
  buyerFeeShare: number;
}

const identityRank: Record<IdentityEvidence, number> = { stated: 0, photographed: 1, inspected: 2 };

/**
 * What a standing offer makes of a lot: price per kilogram of its middle mass, or payable share · p25 of its gold · price, rounded
 * down to the minor unit; never above what the budget has left.
 * @throws {RangeError} naming the figure that is out of its range
 */
export function firmOffer(offer: StandingOffer, lot: OfferedLot, market: OfferMarket): FirmOffer {
  requireOffer(offer, lot);
  const priceMinor = offeredPrice(offer, lot, market);
  const feeMinor = shareOf(priceMinor, market.buyerFeeShare);
  const totalMinor = priceMinor + feeMinor + lot.freightMinor;
  const checks: [NoOfferReason, boolean][] = [
    ['no-lines', lot.lines.length === 0],
    ['other-class', lot.lines.some(({ classCode }) => classCode !== offer.classCode)],
    ['mass-too-small', lot.estimate.massG < offer.leastMassG],
    ['mass-too-large', lot.estimate.massG > offer.mostMassG],
    [
      'identity-not-shown',
      lot.lines.some(({ identityEvidence }) => identityRank[identityEvidence] < identityRank[offer.identityAtLeast]),
    ],
    ['mass-not-weighed', offer.massAtLeast === 'weighed' && lot.lines.some((line) => !isWeighed(line))],
    ['stale-price', offer.rate.kind === 'share' && market.priceIsStale],
    ['worth-nothing', priceMinor === 0],
    ['over-day-budget', totalMinor > offer.dayBudgetMinor],
    ['over-budget', totalMinor > offer.budgetMinor],
  ];
  const reasons = checks.flatMap(([reason, holds]) => (holds ? [reason] : []));
  return reasons.length > 0 ? { fits: false, reasons } : { fits: true, priceMinor, feeMinor, totalMinor };
}

const isWeighed = ({ massEvidence, massG }: Pick<LineInput, 'massEvidence' | 'massG'>) =>
  massEvidence === 'weighed' && massG !== null;

function offeredPrice({ rate }: StandingOffer, { estimate }: OfferedLot, { pricePerGMinor }: Market): number {
  const price =
    rate.kind === 'per-kg'
      ? new Decimal(estimate.massG).div(1000).times(rate.perKgMinor)
      : new Decimal(estimate.goldG.quantiles.p25).times(rate.shareBp).div(wholeBp).times(pricePerGMinor);
  return price.floor().toNumber();
}

function requireOffer(offer: StandingOffer, lot: OfferedLot): void {
  if (offer.rate.kind === 'per-kg') requireMinor('rate.perKgMinor', offer.rate.perKgMinor);
  else requireBetween('rate.shareBp', offer.rate.shareBp, 0, wholeBp);
  requireBetween('leastMassG', offer.leastMassG, 0);
  requireBetween('mostMassG', offer.mostMassG, offer.leastMassG);
  requireMinor('dayBudgetMinor', offer.dayBudgetMinor);
  requireMinor('budgetMinor', offer.budgetMinor);
  requireMinor('freightMinor', lot.freightMinor);
}
