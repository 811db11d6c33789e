import { catalogue20261, estimateLot } from '@lydite/valuation';
import { driverDraws, plansByQuestion } from '../../packages/valuation/src/lot/drivers.ts';
import { planLot } from '../../packages/valuation/src/lot/plan-lot.ts';
import type { LinesPlan } from '../../packages/valuation/src/lot/lot-plan.types.ts';
import { sixLineLot } from './six-line-lot.ts';

/** What the rival implementations are given: the model of the lot, ready to draw, and what to make of the draws. */
export interface BenchInput {
  plan: LinesPlan;
  /** The lot after each of the measurements that the drivers name. */
  afterPlans: LinesPlan[];
  draws: number;
  driverDraws: number;
  probabilities: number[];
  beads: number[];
  bins: number;
}

const percents = [0.15, 1, 5, 10, 25, 50, 75, 90, 95, 99, 99.5, 99.85];

export function benchInput(): BenchInput {
  const plan = planLot(sixLineLot, catalogue20261);
  const { lines } = estimateLot(sixLineLot, catalogue20261, { seed: 1 });
  const plans = plansByQuestion({ input: sixLineLot, catalogue: catalogue20261, plan, lines });
  return {
    plan: { lines: plan.lines },
    afterPlans: [...plans.values()].map((planAfter) => planAfter('p50')),
    draws: 10_000,
    driverDraws,
    probabilities: percents.map((percent) => percent / 100),
    beads: Array.from({ length: 50 }, (_, i) => (i + 0.5) / 50),
    bins: 96,
  };
}
