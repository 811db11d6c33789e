import type { Quantity } from '../types.ts';
import { exponentials, mostExponent } from './exponential.ts';
import { createLattice, type Column } from './lattice.ts';
import type { Factor, LinesPlan, Term } from './lot-plan.types.ts';
import { normalScores, valuesOf } from './score-table.ts';

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
export function drawPlan(plan: LinesPlan, options: DrawOptions): PlanDraws {
  const { draws } = options;
  const draw = createTermDrawer(options);
  const lines = plan.lines.map(({ mass, gold }) => {
    const massG = mass ? draw(mass, new Float64Array(draws)) : new Float64Array(draws);
    const components = gold.map((term) => draw(term, new Float64Array(draws)));
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

/** Only the gold of all lines together, in the draws that `drawPlan` would give it but for the order of keys not named. */
export function drawGold(plan: LinesPlan, options: DrawOptions): Float64Array {
  const draw = createTermDrawer(options);
  const goldG = new Float64Array(options.draws);
  const one = new Float64Array(options.draws);
  for (const term of plan.lines.flatMap(({ gold }) => gold)) add(goldG, draw(term, one));
  return goldG;
}

/** Fills an array with the draws of a term and hands it back. */
type DrawTerm = (term: Term, into: Float64Array) => Float64Array;

function createTermDrawer(options: DrawOptions): DrawTerm {
  const columnOf = createColumns(options);
  const scores = normalScores(options.draws);
  const furthest = scores[options.draws - 1] as number;
  return ({ constant, factors }, into) => {
    const logs: Scaled[] = [];
    // Lognormal figures are added in the log, so a product of many costs one exponential.
    let [median, reach] = [constant, 0];
    for (const each of factors) {
      const column = columnOf(each);
      if (each.quantity.kind !== 'lognormal') continue;
      const scale = Math.log(each.quantity.gsd) * each.power;
      median *= each.quantity.median ** each.power;
      reach += Math.abs(scale) * furthest;
      logs.push({ scale, column });
    }
    if (reach > mostExponent) throw new RangeError('the spreads given multiply beyond any number');
    if (logs.length === 0) into.fill(median);
    else {
      fillWithSums(into, scores, logs);
      exponentials(into, median);
    }
    for (const each of factors) if (each.quantity.kind !== 'lognormal') multiplyBy(into, each, columnOf(each));
    return into;
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

interface Scaled {
  scale: number;
  column: Column;
}

const nothing: Scaled = { scale: 0, column: { generator: 0, shift: 0 } };

/** Σ scale · score, two figures at a time: half as many ways through memory. */
function fillWithSums(sum: Float64Array, scores: Float64Array, figures: readonly Scaled[]): void {
  for (let i = 0; i < figures.length; i += 2) {
    const [one, other] = [figures[i] as Scaled, figures[i + 1] ?? nothing];
    if (i === 0) fillWithPair(sum, scores, one, other);
    else addPair(sum, scores, one, other);
  }
}

function fillWithPair(sum: Float64Array, scores: Float64Array, a: Scaled, b: Scaled): void {
  const [draws, stepA, stepB, scaleA, scaleB] = [sum.length, a.column.generator, b.column.generator, a.scale, b.scale];
  for (let i = 0, atA = a.column.shift, atB = b.column.shift; i < draws; i += 1) {
    sum[i] = scaleA * (scores[atA] as number) + scaleB * (scores[atB] as number);
    atA += stepA;
    if (atA >= draws) atA -= draws;
    atB += stepB;
    if (atB >= draws) atB -= draws;
  }
}

function addPair(sum: Float64Array, scores: Float64Array, a: Scaled, b: Scaled): void {
  const [draws, stepA, stepB, scaleA, scaleB] = [sum.length, a.column.generator, b.column.generator, a.scale, b.scale];
  for (let i = 0, atA = a.column.shift, atB = b.column.shift; i < draws; i += 1) {
    sum[i] = (sum[i] as number) + scaleA * (scores[atA] as number) + scaleB * (scores[atB] as number);
    atA += stepA;
    if (atA >= draws) atA -= draws;
    atB += stepB;
    if (atB >= draws) atB -= draws;
  }
}

function multiplyBy(product: Float64Array, { quantity, power }: Factor, column: Column): void {
  if (quantity.kind === 'uniform' && power === 1) multiplyUniform(product, quantity, column);
  else multiply(product, valuesOf(quantity, power, product.length), column);
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
function multiplyUniform(product: Float64Array, range: Range, { generator, shift }: Column): void {
  const draws = product.length;
  const step = (range.hi - range.lo) / draws;
  const first = range.lo + step / 2;
  for (let i = 0, at = shift; i < draws; i += 1) {
    product[i] = (product[i] as number) * (first + step * at);
    at += generator;
    if (at >= draws) at -= draws;
  }
}

type Range = Pick<Extract<Quantity, { kind: 'uniform' }>, 'lo' | 'hi'>;

function sumOf(parts: readonly Float64Array[], draws: number): Float64Array {
  const [first, ...others] = parts;
  if (!first) return new Float64Array(draws);
  if (others.length === 0) return first;
  const sum = Float64Array.from(first);
  for (const part of others) add(sum, part);
  return sum;
}

/** Adds one array to another, draw by draw. */
export function add(sum: Float64Array, part: Float64Array): void {
  for (let i = 0; i < sum.length; i += 1) sum[i] = (sum[i] as number) + (part[i] as number);
}
