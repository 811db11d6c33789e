import { requireBetween, requirePositive } from '../argument.ts';
import type { PlanDraws } from '../lot/draw-plan.ts';
import { createQuantileFinder } from '../lot/quantile-finder.ts';
import { meanAndVariance, medianOf, quantilesOf } from '../lot/quantiles.ts';
import type { Quantiles } from '../types.ts';
import { purchaseMinor, requireAssaySale, wholeBp, wholeShareMinor, type AssaySale } from './assay-sale.ts';
import { breakEvenContent, breakEvenPrice } from './break-even-on-assay.ts';
import { requireTerms, type BuyerTerms } from './buyer-terms.ts';
import { netMinor, payableG, returnOf, type Market } from './return.ts';
import { stepsOf, type Steps } from './steps.ts';

/** What a lot on assay is worth to one buyer. Functions take a payable share in hundredths of a point, 0 … 10 000. */
export interface AssayValue {
  /** Largest whole share that keeps both the wanted chance and the wanted margin; null when even nothing is too much. */
  highestSafeShareBp: number | null;
  /** Share of the draws in which the purchase does not lose money, 0 … 1. */
  chanceOfProfit(shareBp: number): number;
  expectedProfitMinor(shareBp: number): number;
  profitQuantilesMinor(shareBp: number): Quantiles;
  /** What the share is expected to cost, without fee and freight. */
  expectedPurchaseMinor(shareBp: number): number;
  /** Least content at which the share breaks even, at the lot's median mass; null when no amount of gold would do. */
  breakEvenGoldG(shareBp: number): number | null;
  /** The same as a grade, at the lot's mean mass. */
  breakEvenGradeGPerT(shareBp: number): number | null;
  /** Least gold price at which the share breaks even on average; null when no price would do. */
  breakEvenPricePerGMinor(shareBp: number): number | null;
  steps(shareBp: number): Steps;
}

/**
 * From the gold in a lot sold on assay to money, draw by draw. The seller is paid a share of the gold found, so what is paid
 * moves with what is there; the allowance for the winner's curse is on the buyer's own return alone.
 * @throws {RangeError} naming the term, the price or the share that is out of range
 */
export function valueOnAssay(
  draws: Pick<PlanDraws, 'goldG' | 'massG'>,
  terms: BuyerTerms,
  market: Market,
  sale: AssaySale,
): AssayValue {
  requireTerms(terms);
  requirePositive('market.pricePerGMinor', market.pricePerGMinor);
  requireAssaySale(sale);
  const withFreight = { ...terms, freightMinor: terms.freightMinor + sale.freightMinor };
  const perDraw = workOut(draws, withFreight, market, sale);
  const find = createQuantileFinder(perDraw.net.length);
  const [meanMassG, medianMassG] = [meanAndVariance(draws.massG).mean, medianOf(draws.massG, find)];
  const fee = 1 + terms.buyerFeeShare;
  const netMean = meanAndVariance(perDraw.net).mean;
  const purchaseOf = (shareBp: number) => meanPurchase(perDraw, shareOf(shareBp));
  const contentAt = (shareBp: number, massG: number) =>
    breakEvenContent({ terms: withFreight, market, sale, share: shareOf(shareBp), massG });
  return {
    highestSafeShareBp: highestSafeShare(perDraw, netMean, terms),
    chanceOfProfit: (shareBp) => countKept(perDraw, shareOf(shareBp), fee) / perDraw.net.length,
    expectedProfitMinor: (shareBp) => netMean - purchaseOf(shareBp) * fee,
    profitQuantilesMinor: (shareBp) => quantilesOf(profits(perDraw, shareOf(shareBp), fee), find),
    expectedPurchaseMinor: purchaseOf,
    breakEvenGoldG: (shareBp) => contentAt(shareBp, medianMassG),
    breakEvenGradeGPerT: (shareBp) => {
      const goldG = contentAt(shareBp, meanMassG);
      return goldG === null || meanMassG === 0 ? null : (goldG / meanMassG) * 1e6;
    },
    breakEvenPricePerGMinor: (shareBp) =>
      breakEvenPrice({ draws, terms: withFreight, market, sale, share: shareOf(shareBp) }),
    steps: (shareBp) => {
      const worked = returnOf(withFreight, market);
      const means = { goldG: meanAndVariance(draws.goldG).mean, massG: meanMassG, payableG: perDraw.payableMeanG };
      return stepsOf(purchaseOf(shareBp), withFreight, market, worked, means);
    },
  };
}

/** What each draw comes to: the buyer's own return, and what a whole share of the gold found would cost. */
export interface PerDraw {
  net: Float64Array;
  whole: Float64Array;
  treatment: Float64Array;
  payableMeanG: number;
}

function workOut(
  { goldG, massG }: Pick<PlanDraws, 'goldG' | 'massG'>,
  terms: BuyerTerms,
  market: Market,
  sale: AssaySale,
): PerDraw {
  const worked = returnOf(terms, market);
  const { length } = goldG;
  const [net, whole, treatment] = [0, 1, 2].map(() => new Float64Array(length)) as [
    Float64Array,
    Float64Array,
    Float64Array,
  ];
  let payable = 0;
  for (let i = 0; i < length; i += 1) {
    const [gold, mass] = [goldG[i] as number, massG[i] as number];
    payable += payableG(worked, gold);
    net[i] = netMinor(worked, gold, mass);
    whole[i] = wholeShareMinor(sale, market.pricePerGMinor, gold);
    treatment[i] = (sale.treatmentPerKgMinor * mass) / 1000;
  }
  return { net, whole, treatment, payableMeanG: payable / length };
}

function shareOf(shareBp: number): number {
  requireBetween('shareBp', shareBp, 0, wholeBp);
  return shareBp / wholeBp;
}

function meanPurchase({ whole, treatment }: PerDraw, share: number): number {
  let sum = 0;
  for (let i = 0; i < whole.length; i += 1) sum += purchaseMinor(share, whole[i] as number, treatment[i] as number);
  return sum / whole.length;
}

function profits({ net, whole, treatment }: PerDraw, share: number, fee: number): Float64Array {
  return net.map((each, i) => each - purchaseMinor(share, whole[i] as number, treatment[i] as number) * fee);
}

function countKept({ net, whole, treatment }: PerDraw, share: number, fee: number): number {
  let kept = 0;
  for (let i = 0; i < net.length; i += 1) {
    const purchase = purchaseMinor(share, whole[i] as number, treatment[i] as number);
    if ((net[i] as number) >= purchase * fee) kept += 1;
  }
  return kept;
}

/** Chance and margin both fall as the share rises, so the last share that keeps them is found by halving. */
function highestSafeShare(perDraw: PerDraw, netMean: number, terms: BuyerTerms): number | null {
  const fee = 1 + terms.buyerFeeShare;
  const wanted = terms.wantedChance * perDraw.net.length;
  const keeps = (shareBp: number) => {
    const share = shareBp / wholeBp;
    // The margin first: it is the cheaper of the two to look at.
    return netMean >= meanPurchase(perDraw, share) * (fee + terms.margin) && countKept(perDraw, share, fee) >= wanted;
  };
  if (!keeps(0)) return null;
  let [safe, unsafe] = [0, wholeBp + 1];
  while (unsafe - safe > 1) {
    const middle = (safe + unsafe) >> 1;
    if (keeps(middle)) safe = middle;
    else unsafe = middle;
  }
  return safe;
}
