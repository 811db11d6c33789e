import type { Estimate } from '../types.ts';
import { drawPlan, type PlanDraws } from '../lot/draw-plan.ts';
import { keysOf, plansByQuestion, type PlanAfter } from '../lot/drivers.ts';
import type { LinesPlan } from '../lot/lot-plan.types.ts';
import type { Reading } from '../lot/measurement.ts';
import type { LotDraws } from '../lot/simulate-lot.ts';
import { netToSeller, type SellerFees, type SellerNet } from '../money/net-to-seller.ts';
import type { Market } from '../money/return.ts';
import { valueLot } from '../money/value-lot.ts';
import { measureNext, type NextMeasurement } from './measure-next.ts';
import { typicalTerms, type NamedTerms } from './typical-terms.ts';

export interface TypicalBid {
  key: NamedTerms['key'];
  name: string;
  /** Highest safe bid of such a buyer; null when nothing is safe to pay. */
  bidMinor: number | null;
  /** What it leaves the seller after fee and tax. */
  leaves: SellerNet | null;
}

export interface WorthMeasuring extends NextMeasurement {
  /** Expected rise of the highest safe bid by kind of buyer, whole minor units; may be negative where doubt was paid for. */
  gainMinor: Record<NamedTerms['key'], number>;
  /** The middle one of these. */
  middleGainMinor: number;
}

export interface ReserveAdvice {
  bids: TypicalBid[];
  /** The measurement worth most first. */
  measurements: WorthMeasuring[];
}

interface AdviceInput {
  draws: LotDraws;
  /** Of the same draws. */
  estimate: Pick<Estimate, 'lines' | 'drivers'>;
  market: Market;
  fees: SellerFees;
  sets?: readonly NamedTerms[];
}

const mostMeasurements = 3;
/** Enough for a difference between two values drawn alike. */
const trialDraws = 2003;

/**
 * Weights of the three readings by which an expectation over all readings is reckoned: Swanson's rule.
 * Source: A. Hurst, G. C. Brown and R. I. Swanson, Swanson's 30–40–30 rule, AAPG Bulletin 84 (2000) 1883–1891 (from memory).
 */
const readings: [reading: Reading, weight: number][] = [
  ['p10', 0.3],
  ['p50', 0.4],
  ['p90', 0.3],
];

/**
 * What a seller may ask: what three kinds of buyer could safely pay for the lot as described, what that leaves after fees, and
 * what the next measurements are worth, as the expected rise of those bids over what the measurement may read.
 * @throws {RangeError} naming the term, price, fee or amount that is out of its range
 */
export function reserveAdvice({ draws, estimate, market, fees, sets = typicalTerms }: AdviceInput): ReserveAdvice {
  const bids = sets.map(({ key, name, terms }) => {
    const bidMinor = valueLot(draws, terms, market).highestSafeBidMinor;
    return { key, name, bidMinor, leaves: bidMinor === null ? null : netToSeller(bidMinor, fees) };
  });
  const plans = plansByQuestion({ ...draws, lines: estimate.lines });
  const bidsOn = (trial: PlanDraws) => sets.map(({ terms }) => valueLot(trial, terms, market).highestSafeBidMinor ?? 0);
  const keys = keysOf(draws.plan);
  const drawTrial = (plan: LinesPlan) => drawPlan(plan, { seed: draws.seed, draws: trialDraws, keys });
  const now = bidsOn(drawTrial(draws.plan));
  const expected = (planAfter: PlanAfter) => {
    const byReading = readings.map(([reading]) => bidsOn(drawTrial(planAfter(reading))));
    return sets.map((_, i) => readings.reduce((sum, [, weight], j) => sum + weight * (byReading[j]?.[i] as number), 0));
  };
  const measurements = measureNext(estimate.drivers)
    .slice(0, mostMeasurements)
    .map((measurement) => {
      const gains = expected(plans.get(measurement.question) as PlanAfter).map((after, i) =>
        Math.round(after - (now[i] as number)),
      );
      const gainMinor = Object.fromEntries(sets.map(({ key }, i) => [key, gains[i]])) as WorthMeasuring['gainMinor'];
      return { ...measurement, gainMinor, middleGainMinor: middleOf(gains) };
    });
  return { bids, measurements: measurements.sort((a, b) => b.middleGainMinor - a.middleGainMinor) };
}

function middleOf(values: readonly number[]): number {
  return values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;
}
