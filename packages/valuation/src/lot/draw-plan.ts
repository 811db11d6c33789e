import { normalQuantile } from '../quantity/normal-distribution.ts';
import { quantileOf } from '../quantity/quantile.ts';
import type { Quantity } from '../types.ts';
import { createLattice, type Column } from './lattice.ts';
import type { Factor, LotPlan, Term } from './lot-plan.types.ts';

export interface PlanDraws {
  goldG: Float64Array;
  massG: Float64Array;
  lines: { goldG: Float64Array; massG: Float64Array; components: Float64Array[] }[];
}

interface DrawOptions {
  seed: number;
  draws: number;
  keys?: readonly string[];
}

/**
 * Draws a plan: the i-th entries of all arrays belong to one possible truth about the lot.
 * @param options seed, any integer; draws, at least 100; keys, whose figures take the first coordinates in this order, so that
 * two plans drawn with the same keys differ only where the plans do
 */
export function drawPlan(plan: LotPlan, options: DrawOptions): PlanDraws {
  const { draws } = options;
  const columnOf = createColumns(options);
  const lines = plan.lines.map(({ mass, gold }) => {
    const massG = mass ? drawTerm(mass, draws, columnOf) : new Float64Array(draws);
    const components = gold.map((term) => drawTerm(term, draws, columnOf));
    return { massG, components, goldG: sumOf(components, draws) };
  });
  return {
    lines,
    goldG: sumOf(
      lines.map(({ goldG }) => goldG),
      draws,
    ),
    massG: sumOf(
      lines.map(({ massG }) => massG),
      draws,
    ),
  };
}

/** Hands each factor its coordinate; the same key, the same coordinate. */
function createColumns({ seed, draws, keys = [] }: DrawOptions): (factor: Factor) => Column {
  const coordinate = createLattice(seed, draws);
  const columns = new Map(keys.map((key, index) => [key, coordinate(index)]));
  return ({ key }) => {
    const column = columns.get(key) ?? coordinate(columns.size);
    columns.set(key, column);
    return column;
  };
}

function drawTerm({ constant, factors }: Term, draws: number, columnOf: (factor: Factor) => Column): Float64Array {
  const product = new Float64Array(draws);
  const scores = normalScores(draws);
  // Lognormal figures are added in the log, so a product of many costs one exponential.
  let median = constant;
  for (const each of factors) {
    const column = columnOf(each);
    if (each.quantity.kind !== 'lognormal') continue;
    median *= each.quantity.median ** each.power;
    addScaled(product, scores, column, Math.log(each.quantity.gsd) * each.power);
  }
  for (let i = 0; i < draws; i += 1) product[i] = median * Math.exp(product[i] as number);
  for (const each of factors) {
    const { quantity, power } = each;
    if (quantity.kind === 'lognormal') continue;
    if (quantity.kind === 'uniform' && power === 1) multiplyUniform(product, quantity, columnOf(each));
    else multiply(product, valuesOf(quantity, power, draws), columnOf(each));
  }
  return product;
}

function addScaled(sum: Float64Array, values: Float64Array, { generator, shift }: Column, scale: number): void {
  const draws = sum.length;
  for (let i = 0, at = shift; i < draws; i += 1) {
    sum[i] = (sum[i] as number) + scale * (values[at] as number);
    at += generator;
    if (at >= draws) at -= draws;
  }
}

function multiply(product: Float64Array, values: Float64Array, { generator, shift }: Column): void {
  const draws = product.length;
  for (let i = 0, at = shift; i < draws; i += 1) {
    product[i] = (product[i] as number) * (values[at] as number);
    at += generator;
    if (at >= draws) at -= draws;
  }
}

/** The most common figure without a table of its values. */
function multiplyUniform(
  product: Float64Array,
  { lo, hi }: { lo: number; hi: number },
  { generator, shift }: Column,
): void {
  const draws = product.length;
  const step = (hi - lo) / draws;
  const first = lo + step / 2;
  for (let i = 0, at = shift; i < draws; i += 1) {
    product[i] = (product[i] as number) * (first + step * at);
    at += generator;
    if (at >= draws) at -= draws;
  }
}

/** Equally likely values of the quantity, ascending before the power is taken. */
function valuesOf(quantity: Quantity, power: number, draws: number): Float64Array {
  const values = new Float64Array(draws);
  if (quantity.kind === 'normal' && quantity.mean > farFromZero * quantity.sd) {
    const scores = normalScores(draws);
    for (let i = 0; i < draws; i += 1) values[i] = quantity.mean + quantity.sd * (scores[i] as number);
  } else {
    for (let i = 0; i < draws; i += 1) values[i] = quantileOf(quantity, (i + 0.5) / draws);
  }
  return power === 1 ? values : values.map((value) => value ** power);
}

/** In standard deviations: from here on cutting a normal at 0 changes no digit. */
const farFromZero = 8.5;

// A pure table, kept since every simulation of this size reads it.
const scoreTables = new Map<number, Float64Array>();
function normalScores(draws: number): Float64Array {
  const known = scoreTables.get(draws);
  if (known) return known;
  const scores = new Float64Array(draws);
  for (let i = 0; i < draws; i += 1) scores[i] = normalQuantile((i + 0.5) / draws);
  scoreTables.set(draws, scores);
  return scores;
}

function sumOf(parts: readonly Float64Array[], draws: number): Float64Array {
  const [first, ...others] = parts;
  if (!first) return new Float64Array(draws);
  if (others.length === 0) return first;
  const sum = Float64Array.from(first);
  for (const part of others) for (let i = 0; i < draws; i += 1) sum[i] = (sum[i] as number) + (part[i] as number);
  return sum;
}
