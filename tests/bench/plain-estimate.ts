import type { Term } from '../../packages/valuation/src/lot/lot-plan.types.ts';
import type { BenchInput } from './bench-input.ts';

/** The way it is written first: one draw after another, Math.random, Box–Muller, sorted copies for the quantiles. */
export function plainEstimate({ plan, afterPlans, draws, driverDraws, probabilities, beads, bins }: BenchInput) {
  const drawn = drawLot(plan, draws);
  const spread = (values: number[]) => {
    const sorted = [...values].sort((a, b) => a - b);
    const mean = values.reduce((sum, value) => sum + value, 0) / draws;
    const sd = Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (draws - 1));
    return { mean, sd, quantiles: probabilities.map((each) => quantile(sorted, each)), sorted };
  };
  const total = spread(drawn.map(({ gold }) => gold));
  const grades = spread(drawn.map(({ gold, mass }) => (gold / mass) * 1e6)).quantiles;
  const lines = plan.lines.map((line, i) => ({
    gold: spread(drawn.map(({ lines: each }) => each[i]!.gold)),
    grades: spread(drawn.map(({ lines: each }) => (each[i]!.gold / each[i]!.mass) * 1e6)).quantiles,
    components: line.gold.map((_, j) => spread(drawn.map(({ lines: each }) => each[i]!.components[j]!))),
    share:
      drawn.reduce((sum, each) => sum + (each.gold - total.mean) * each.lines[i]!.gold, 0) /
      (draws - 1) /
      total.sd ** 2,
  }));
  const range = (of: typeof plan) => {
    const sorted = drawLot(of, driverDraws)
      .map(({ gold }) => gold)
      .sort((a, b) => a - b);
    return [quantile(sorted, 0.1), quantile(sorted, 0.9)];
  };
  return {
    ...total,
    grades,
    lines,
    beads: beads.map((each) => quantile(total.sorted, each)),
    density: density(total.sorted, bins),
    shares: sharesOf(drawn, total.mean, total.sd),
    now: range(plan),
    after: afterPlans.map(range),
  };
}

function drawLot({ lines }: BenchInput['plan'], draws: number) {
  const places = placesOf(lines);
  const figures = new Array<number>(Math.max(-1, ...places.values()) + 1);
  return Array.from({ length: draws }, () => {
    figures.fill(Number.NaN);
    const drawn = lines.map(({ gold, mass }) => {
      const components = gold.map((term) => drawTerm(term, figures, places));
      const sum = components.reduce((all, one) => all + one, 0);
      return { components, gold: sum, mass: mass ? drawTerm(mass, figures, places) : 0 };
    });
    const gold = drawn.reduce((sum, line) => sum + line.gold, 0);
    return { lines: drawn, gold, mass: drawn.reduce((sum, line) => sum + line.mass, 0), figures: [...figures] };
  });
}

/** Every figure has one place in a draw, whatever terms it occurs in. */
function placesOf(lines: BenchInput['plan']['lines']): Map<Term['factors'][number], number> {
  const byKey = new Map<string, number>();
  const places = new Map<Term['factors'][number], number>();
  for (const { gold, mass } of lines) {
    for (const factor of [...(mass ? [mass] : []), ...gold].flatMap(({ factors }) => factors)) {
      const place = byKey.get(factor.key) ?? byKey.size;
      byKey.set(factor.key, place);
      places.set(factor, place);
    }
  }
  return places;
}

function drawTerm({ constant, factors }: Term, figures: number[], places: ReturnType<typeof placesOf>): number {
  let product = constant;
  for (const factor of factors) {
    const place = places.get(factor)!;
    if (Number.isNaN(figures[place])) figures[place] = drawQuantity(factor.quantity);
    product *= figures[place]! ** factor.power;
  }
  return product;
}

function drawQuantity(quantity: Term['factors'][number]['quantity']): number {
  switch (quantity.kind) {
    case 'exact':
      return quantity.value;
    case 'uniform':
      return quantity.lo + (quantity.hi - quantity.lo) * Math.random();
    case 'normal':
      return Math.max(0, quantity.mean + quantity.sd * boxMuller());
    case 'lognormal':
      return quantity.median * quantity.gsd ** boxMuller();
    case 'triangular':
      throw new Error('no triangular figure in this lot');
  }
}

function boxMuller(): number {
  return Math.sqrt(-2 * Math.log(1 - Math.random())) * Math.cos(2 * Math.PI * Math.random());
}

function quantile(sorted: number[], probability: number): number {
  const position = (sorted.length - 1) * probability;
  const below = Math.floor(position);
  return sorted[below]! + (sorted[Math.min(below + 1, sorted.length - 1)]! - sorted[below]!) * (position - below);
}

function density(sorted: number[], bins: number): number[] {
  const [low, high] = [quantile(sorted, 0.0015), quantile(sorted, 0.9985)];
  const counts = new Array<number>(bins).fill(0);
  for (const value of sorted) {
    const bin = Math.floor(((value - low) / (high - low)) * bins);
    if (bin >= 0 && bin < bins) counts[bin] = counts[bin]! + 1;
  }
  return counts.map((count) => (count * bins) / (sorted.length * (high - low)));
}

/** First-order shares by squared correlation with each figure. */
function sharesOf(drawn: ReturnType<typeof drawLot>, mean: number, sd: number): number[] {
  return drawn[0]!.figures.map((_, place) => {
    const values = drawn.map(({ figures }) => figures[place]!);
    const middle = values.reduce((sum, value) => sum + value, 0) / values.length;
    const variance = values.reduce((sum, value) => sum + (value - middle) ** 2, 0) / values.length;
    const shared = drawn.reduce((sum, { gold }, i) => sum + (gold - mean) * (values[i]! - middle), 0) / values.length;
    return shared ** 2 / (variance * sd ** 2);
  });
}
