import { requireBetween, requirePositive } from '../argument.ts';
import type { PlanDraws } from '../lot/draw-plan.ts';
import { createQuantileFinder } from '../lot/quantile-finder.ts';
import { meanAndVariance, medianOf, quantilesOf } from '../lot/quantiles.ts';
import type { Quantiles } from '../types.ts';
import { requireTerms, type BuyerTerms } from './buyer-terms.ts';
import { breakEvenGold, breakEvenPayment, netMinor, payableG, returnOf, type Market } from './return.ts';
import { stepsOf, type Steps } from './steps.ts';

/** What a lot is worth to one buyer. Functions take a bid in minor units, 0 or more. */
export interface LotValue {
  /** Expected value before the purchase and the market's fee. */
  netMeanMinor: number;
  /** Largest whole bid that keeps both the wanted chance and the wanted margin; null when even nothing is too much. */
  highestSafeBidMinor: number | null;
  /** Share of the draws in which the bid does not lose money, 0 … 1. */
  chanceOfProfit(bidMinor: number): number;
  expectedProfitMinor(bidMinor: number): number;
  profitQuantilesMinor(bidMinor: number): Quantiles;
  /** Contained gold at which the bid breaks even, at the lot's median mass; null when no amount of gold would do. */
  breakEvenGoldG(bidMinor: number): number | null;
  /** The same as a grade, at the lot's mean mass; null when no grade would do or the lot has no mass. */
  breakEvenGradeGPerT(bidMinor: number): number | null;
  /** Gold price at which the bid breaks even on average; null when no price would do. */
  breakEvenPricePerGMinor(bidMinor: number): number | null;
  steps(bidMinor: number): Steps;
}

/**
 * From the gold in a lot to money, draw by draw: payable gold at the refiner's price, less treatment, refining and the cost of
 * waiting, less the buyer's own costs.
 * @throws {RangeError} naming the term, the price or the bid that is out of range
 */
export function valueLot(draws: Pick<PlanDraws, 'goldG' | 'massG'>, terms: BuyerTerms, market: Market): LotValue {
  requireTerms(terms);
  requirePositive('market.pricePerGMinor', market.pricePerGMinor);
  const worked = returnOf(terms, market);
  const { sorted, means } = workOut(draws, worked);
  const find = createQuantileFinder(sorted.length);
  const medianMassG = medianOf(draws.massG, find);
  const netMeanMinor = meanAndVariance(sorted).mean;
  const costOf = (bidMinor: number) => {
    requireBetween('bidMinor', bidMinor, 0);
    return bidMinor * (1 + terms.buyerFeeShare);
  };
  return {
    netMeanMinor,
    highestSafeBidMinor: highestSafeBid(sorted, netMeanMinor, terms),
    chanceOfProfit: (bidMinor) => 1 - countBelow(sorted, costOf(bidMinor)) / sorted.length,
    expectedProfitMinor: (bidMinor) => netMeanMinor - costOf(bidMinor),
    profitQuantilesMinor: (bidMinor) => {
      const cost = costOf(bidMinor);
      return quantilesOf(
        sorted.map((net) => net - cost),
        find,
      );
    },
    breakEvenGoldG: (bidMinor) => breakEvenGold(worked, bidMinor, medianMassG),
    breakEvenGradeGPerT: (bidMinor) => {
      const goldG = breakEvenGold(worked, bidMinor, means.massG);
      return goldG === null || means.massG === 0 ? null : (goldG / means.massG) * 1e6;
    },
    breakEvenPricePerGMinor: (bidMinor) => {
      const payment = breakEvenPayment(worked, bidMinor, means.payableG, means.massG);
      return payment === null || terms.priceHaircut === 1
        ? null
        : (payment + terms.refiningPerGMinor) / (1 - terms.priceHaircut);
    },
    steps: (bidMinor) => stepsOf(bidMinor, terms, market, worked, means),
  };
}

function workOut({ goldG, massG }: Pick<PlanDraws, 'goldG' | 'massG'>, worked: ReturnType<typeof returnOf>) {
  const net = new Float64Array(goldG.length);
  let payable = 0;
  for (let i = 0; i < net.length; i += 1) {
    const gold = goldG[i] as number;
    payable += payableG(worked, gold);
    net[i] = netMinor(worked, gold, massG[i] as number);
  }
  const means = {
    goldG: meanAndVariance(goldG).mean,
    massG: meanAndVariance(massG).mean,
    payableG: payable / net.length,
  };
  return { sorted: net.sort(), means };
}

/** The smaller of what the wanted chance allows (an order statistic, never interpolated) and what the wanted margin allows. */
function highestSafeBid(sorted: Float64Array, mean: number, { wantedChance, buyerFeeShare, margin }: BuyerTerms) {
  const keeps = sorted[sorted.length - Math.ceil(wantedChance * sorted.length)] as number;
  const bid = Math.floor(Math.min(keeps / (1 + buyerFeeShare), mean / (1 + buyerFeeShare + margin)));
  return bid < 0 ? null : bid;
}

function countBelow(sorted: Float64Array, value: number): number {
  let [low, high] = [0, sorted.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sorted[middle] as number) < value) low = middle + 1;
    else high = middle;
  }
  return low;
}
