import type { Catalogue } from '../catalogue/catalogue.types.ts';
import type { Driver, LineEstimate, LotInput, Quantiles } from '../types.ts';
import { drawGold } from './draw-plan.ts';
import type { Factor, LinePlan, LotPlan } from './lot-plan.types.ts';
import { improveLot, measurementOf, type Reading } from './measurement.ts';
import { planLot } from './plan-lot.ts';
import { createQuantileFinder } from './quantile-finder.ts';
import { varianceShares, type FactorShare } from './variance.ts';

const mostDrivers = 6;
const leastShare = 0.005;
/** Enough for the ratio of two ranges drawn alike; prime, so that any generator serves. */
export const driverDraws = 1021;

export interface DriverInput {
  input: LotInput;
  catalogue: Catalogue;
  plan: LotPlan;
  seed: number;
  lines: readonly LineEstimate[];
  quantiles: Quantiles;
}

/** What the range of a lot comes from, largest share first, with the measurement that would narrow it and by how much. */
export function driversOf(given: DriverInput): Driver[] {
  const { plan, seed, quantiles } = given;
  const shares = largestShares(plan);
  if (shares.length === 0) return [];
  const nowG: [number, number] = [quantiles.p10, quantiles.p90];
  const rangeOf = createRangeFinder(seed, keysOf(plan));
  const now = rangeOf(plan);
  const known = new Map<string, [number, number]>();
  return shares.map(({ factor, share }) => {
    const { question, lines, planAfter } = measuring(given, factor);
    // Figures that one measurement answers share the range expected after it.
    const after = known.get(question) ?? rangeOf(planAfter('p50'));
    known.set(question, after);
    return {
      lineId: lines.length === 1 ? (lines[0] as LinePlan).input.id : null,
      classCode: (lines[0] as LinePlan).materialClass.code,
      parameter: factor.parameter,
      share,
      question,
      nowG,
      afterG: [(nowG[0] * after[0]) / now[0], (nowG[1] * after[1]) / now[1]],
    };
  });
}

type Measured = Omit<DriverInput, 'quantiles' | 'seed'>;
export type PlanAfter = (reading: Reading) => LotPlan;

/** For each question that the drivers ask, once: the lot as it would be planned after its answer. */
export function plansByQuestion(given: Measured): Map<string, PlanAfter> {
  const plans = new Map<string, PlanAfter>();
  for (const { factor } of largestShares(given.plan)) {
    const { question, planAfter } = measuring(given, factor);
    if (!plans.has(question)) plans.set(question, planAfter);
  }
  return plans;
}

function largestShares(plan: LotPlan): FactorShare[] {
  return varianceShares(plan)
    .filter(({ share }) => share >= leastShare)
    .slice(0, mostDrivers);
}

/** The measurement that answers a figure, where it is made, and what is made of the lot after it. */
function measuring({ input, catalogue, plan, lines: estimates }: Measured, factor: Factor) {
  const lines = plan.lines.filter(({ gold }) =>
    gold.some((term) => term.factors.some(({ key }) => key === factor.key)),
  );
  const [first] = lines as [LinePlan];
  const measurement = measurementOf(factor, first.input);
  const planAfter: PlanAfter = (reading) =>
    planLot(improveLot(input, { measurement, lines, factor, estimates }, reading), catalogue);
  const question = measurement.ask(lines.length === 1 ? first.label : `the ${first.materialClass.unit.many}`);
  return { question, lines, planAfter };
}

/** p10 and p90 of a plan's gold from a small sample; plans drawn with the same keys differ only where the plans do. */
function createRangeFinder(seed: number, keys: readonly string[]): (plan: LotPlan) => [number, number] {
  const find = createQuantileFinder(driverDraws);
  return (plan) => find(drawGold(plan, { seed, draws: driverDraws, keys }), [0.1, 0.9]) as [number, number];
}

/** The figures of a lot, each once. */
export function keysOf(plan: LotPlan): string[] {
  return [...new Set(plan.lines.flatMap(({ gold }) => gold.flatMap(({ factors }) => factors.map(({ key }) => key))))];
}
