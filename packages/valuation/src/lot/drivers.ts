import type { Catalogue } from '../catalogue/catalogue.types.ts';
import type { Driver, LineEstimate, LotInput, Quantiles } from '../types.ts';
import { drawPlan } from './draw-plan.ts';
import type { LinePlan, LotPlan } from './lot-plan.types.ts';
import { improveLot, measurementOf } from './measurement.ts';
import { planLot } from './plan-lot.ts';
import { createQuantileFinder } from './quantile-finder.ts';
import { varianceShares, type FactorShare } from './variance.ts';

const mostDrivers = 6;
const leastShare = 0.005;
/** Enough for the ratio of two ranges drawn alike; prime, so that any generator serves. */
const draws = 1021;

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
  const nowG: [number, number] = [quantiles.p10, quantiles.p90];
  const now = rangeOf(plan, seed, keysOf(plan));
  const expect = createExpectation(given);
  const shares = varianceShares(plan).filter(({ share }) => share >= leastShare);
  return shares.slice(0, mostDrivers).map((each) => {
    const { question, lines, after } = expect(each);
    return {
      lineId: lines.length === 1 ? (lines[0] as LinePlan).input.id : null,
      classCode: (lines[0] as LinePlan).materialClass.code,
      parameter: each.factor.parameter,
      share: each.share,
      question,
      nowG,
      afterG: [(nowG[0] * after[0]) / now[0], (nowG[1] * after[1]) / now[1]],
    };
  });
}

/** The measurement for a figure and the range expected after it; figures that one measurement answers share its range. */
function createExpectation({ input, catalogue, plan, seed, lines: estimates }: DriverInput) {
  const known = new Map<string, [number, number]>();
  const keys = keysOf(plan);
  return ({ factor }: FactorShare) => {
    const lines = plan.lines.filter(({ gold }) =>
      gold.some((term) => term.factors.some(({ key }) => key === factor.key)),
    );
    const [first] = lines as [LinePlan];
    const measurement = measurementOf(factor, first.input);
    const question = measurement.ask(lines.length === 1 ? first.label : `the ${first.materialClass.unit.many}`);
    const after =
      known.get(question) ??
      rangeOf(planLot(improveLot(input, measurement, lines, factor, estimates), catalogue), seed, keys);
    known.set(question, after);
    return { question, lines, after };
  };
}

function rangeOf(plan: LotPlan, seed: number, keys: readonly string[]): [number, number] {
  const { goldG } = drawPlan(plan, { seed, draws, keys });
  return createQuantileFinder(draws)(goldG, [0.1, 0.9]) as [number, number];
}

/** The figures of a lot, each once. */
function keysOf(plan: LotPlan): string[] {
  return [...new Set(plan.lines.flatMap(({ gold }) => gold.flatMap(({ factors }) => factors.map(({ key }) => key))))];
}
