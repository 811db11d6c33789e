import { requireBetween } from '../argument.ts';
import type { Catalogue } from '../catalogue/catalogue.types.ts';
import type { LotInput } from '../types.ts';
import { drawPlan, type PlanDraws } from './draw-plan.ts';
import type { LotPlan } from './lot-plan.types.ts';
import { planLot } from './plan-lot.ts';

export interface SimulationOptions {
  /** Any integer from 0 to 2³² − 1; a frozen estimate keeps it. */
  seed: number;
  /** 100 … 1 000 000, by default 10 000. */
  draws?: number;
}

/** Possible truths about a lot, and what they were drawn from. In memory only; store the estimate made of it. */
export interface LotDraws extends PlanDraws {
  input: LotInput;
  catalogue: Catalogue;
  plan: LotPlan;
  seed: number;
  draws: number;
}

/**
 * Draws the gold of a lot: Monte Carlo as in JCGM 101:2008, on a lattice. The same input, catalogue, seed and draws give the
 * same numbers everywhere, to at least 9 digits.
 * @throws {RangeError} naming the option, the class or the figure that is out of range
 */
export function simulateLot(input: LotInput, catalogue: Catalogue, options: SimulationOptions): LotDraws {
  const { seed, draws = 10_000 } = options;
  requireInteger('seed', seed, 0, 2 ** 32 - 1);
  requireInteger('draws', draws, 100, 1_000_000);
  const plan = planLot(input, catalogue);
  return { ...drawPlan(plan, { seed, draws }), input, catalogue, plan, seed, draws };
}

function requireInteger(name: string, value: number, least: number, most: number): void {
  requireBetween(name, value, least, most);
  if (!Number.isInteger(value)) throw new RangeError(`${name} must be a whole number, not ${value}`);
}
