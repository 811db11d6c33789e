import { normalQuantile } from '../quantity/normal-distribution.ts';
import { quantileOf } from '../quantity/quantile.ts';
import type { Quantity } from '../types.ts';

// A pure table, kept since every simulation of this size reads it.
const tables = new Map<number, Float64Array>();

/** The (i + ½)/draws quantiles of the standard normal, ascending; not to be written to. */
export function normalScores(draws: number): Float64Array {
  const known = tables.get(draws);
  if (known) return known;
  const scores = new Float64Array(draws);
  for (let i = 0; i < draws; i += 1) scores[i] = normalQuantile((i + 0.5) / draws);
  tables.set(draws, scores);
  return scores;
}

/** In standard deviations: from here on cutting a normal at 0 changes no digit. */
const farFromZero = 8.5;

/** Equally likely values of the quantity, ascending before the power is taken. */
export function valuesOf(quantity: Quantity, power: number, draws: number): Float64Array {
  const values = new Float64Array(draws);
  if (quantity.kind === 'normal' && quantity.mean > farFromZero * quantity.sd) {
    const scores = normalScores(draws);
    for (let i = 0; i < draws; i += 1) values[i] = quantity.mean + quantity.sd * (scores[i] as number);
  } else {
    for (let i = 0; i < draws; i += 1) values[i] = quantileOf(quantity, (i + 0.5) / draws);
  }
  return power === 1 ? values : values.map((value) => value ** power);
}
