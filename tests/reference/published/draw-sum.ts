import type { Quantity } from '@lydite/valuation';
import { drawPlan } from '../../../packages/valuation/src/lot/draw-plan.ts';
import type { LinePlan, Term } from '../../../packages/valuation/src/lot/lot-plan.types.ts';
import { createQuantileFinder } from '../../../packages/valuation/src/lot/quantile-finder.ts';

/** Draws of a plain sum of independent quantities, by the sampler that estimates use. */
export function drawSum(quantities: readonly Quantity[], seed: number, draws: number): Float64Array {
  const gold = quantities.map((quantity, i): Term => {
    const factors = [{ key: `${i}`, parameter: 'input', quantity, power: 1 }];
    return { id: `${i}`, name: 'input', constant: 1, factors };
  });
  const line = { gold, mass: null } as unknown as LinePlan;
  return drawPlan({ lines: [line] }, { seed, draws }).goldG;
}

/** The 95 % interval that leaves as much out below as above. */
export const interval = (values: Float64Array) =>
  createQuantileFinder(values.length)(values, [0.025, 0.975]) as [number, number];
