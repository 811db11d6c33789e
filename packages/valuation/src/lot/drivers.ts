import type { Catalogue } from '../catalogue/catalogue.types.ts';
import type { Driver, LineEstimate, LineInput, LotInput, Quantiles } from '../types.ts';
import { add, drawGold } from './draw-plan.ts';
import type { Factor, LinePlan, LinesPlan } from './lot-plan.types.ts';
import { improveLot, measurementOf, type Reading } from './measurement.ts';
import { planLine } from './plan-lot.ts';
import { createQuantileFinder } from './quantile-finder.ts';
import { varianceShares, type FactorShare } from './variance.ts';

const mostDrivers = 6;
const leastShare = 0.005;
/** Enough for the ratio of two ranges drawn alike; prime, so that any generator serves. */
export const driverDraws = 1021;

export interface DriverInput {
  input: LotInput;
  catalogue: Catalogue;
  plan: LinesPlan;
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
  const rangeOf = createRangeFinder(plan, seed);
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
export type PlanAfter = (reading: Reading) => LinesPlan;

/** For each question that the drivers ask, once: the lot as it would be planned after its answer. */
export function plansByQuestion(given: Measured): Map<string, PlanAfter> {
  const plans = new Map<string, PlanAfter>();
  for (const { factor } of largestShares(given.plan)) {
    const { question, planAfter } = measuring(given, factor);
    if (!plans.has(question)) plans.set(question, planAfter);
  }
  return plans;
}

function largestShares(plan: LinesPlan): FactorShare[] {
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
  const planAfter: PlanAfter = (reading) => {
    const after = improveLot(input, { measurement, lines, factor, estimates }, reading);
    return { lines: after.lines.map((line, i) => keptPlan(plan, line, i) ?? planLine(line, i, catalogue)) };
  };
  const question = measurement.ask(lines.length === 1 ? first.label : `the ${first.materialClass.unit.many}`);
  return { question, lines, planAfter };
}

function keptPlan({ lines }: LinesPlan, line: LineInput, index: number): LinePlan | null {
  const plan = lines[index];
  return plan?.input === line ? plan : null;
}

/**
 * p10 and p90 of the gold from a small sample, for the plan itself and for plans that measurements made of it. All are drawn
 * alike, so that they differ only where the plans do; lines left as they were are drawn once.
 */
function createRangeFinder(plan: LinesPlan, seed: number): (of: LinesPlan) => [number, number] {
  const find = createQuantileFinder(driverDraws);
  const options = { seed, draws: driverDraws, keys: keysOf(plan) };
  const kept = new Map(plan.lines.map((line) => [line, drawGold({ lines: [line] }, options)]));
  return ({ lines }) => {
    const goldG = drawGold({ lines: lines.filter((line) => !kept.has(line)) }, options);
    for (const line of lines) {
      const part = kept.get(line);
      if (part) add(goldG, part);
    }
    return find(goldG, [0.1, 0.9]) as [number, number];
  };
}

/** The figures of a lot, each once. */
export function keysOf(plan: LinesPlan): string[] {
  return [...new Set(plan.lines.flatMap(({ gold }) => gold.flatMap(({ factors }) => factors.map(({ key }) => key))))];
}
