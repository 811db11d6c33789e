import { momentOf } from '../quantity/moment.ts';
import type { Factor, LinesPlan, Term } from './lot-plan.types.ts';

export interface FactorShare {
  /** One of the factors with this key: the parameter and its quantity. */
  factor: Factor;
  share: number;
}

/**
 * First-order share of the variance of a lot's gold by figure, largest first: Var(E[gold | figure]) / Var(gold), computed
 * without draws, since the gold is a sum of products of independent figures. Shares sum to at most 1; the rest is interaction.
 * Source: I. M. Sobol', Sensitivity estimates for nonlinear mathematical models, 1993.
 */
export function varianceShares(plan: LinesPlan): FactorShare[] {
  const figures = figuresOf(plan.lines.flatMap(({ gold }) => gold));
  const variance = totalVariance(figures);
  if (!(variance > 0)) return [];
  const shares = [...figures.values()].map((figure) => ({
    factor: figure.factor,
    share: varianceAlone(figure) / variance,
  }));
  return shares.sort((a, b) => b.share - a.share);
}

/** A figure and the terms it occurs in, each by its number, its mean and the figure's power in it. */
interface Figure {
  factor: Factor;
  uses: { term: number; mean: number; power: number }[];
  /** E[x^(p+q)] / (E[x^p]·E[x^q]). */
  ratio: (p: number, q: number) => number;
}

function figuresOf(terms: readonly Term[]): Map<string, Figure> {
  const figures = new Map<string, Figure>();
  const figureOf = (factor: Factor) => figures.get(factor.key) ?? { factor, uses: [], ratio: momentRatio(factor) };
  terms.forEach((each, term) => {
    const mean = each.factors.reduce(
      (product, { quantity, power }) => product * momentOf(quantity, power),
      each.constant,
    );
    for (const factor of each.factors) {
      const figure = figureOf(factor);
      figure.uses.push({ term, mean, power: factor.power });
      figures.set(factor.key, figure);
    }
  });
  return figures;
}

function momentRatio({ quantity }: Factor): Figure['ratio'] {
  const known = new Map<number, number>();
  const moment = (power: number) => {
    const value = known.get(power) ?? momentOf(quantity, power);
    known.set(power, value);
    return value;
  };
  return (p, q) => moment(p + q) / (moment(p) * moment(q));
}

/** Variance of the gold when this figure alone varies and all others stand at their means. */
function varianceAlone({ uses, ratio }: Figure): number {
  let variance = 0;
  for (const a of uses) for (const b of uses) variance += a.mean * b.mean * (ratio(a.power, b.power) - 1);
  return variance;
}

/** Var(Σ terms): over all pairs of terms, the ratios of the figures they share multiply. */
function totalVariance(figures: Map<string, Figure>): number {
  const pairs = new Map<string, { means: number; ratio: number }>();
  for (const { uses, ratio } of figures.values()) {
    for (const a of uses) {
      for (const b of uses) {
        const key = `${a.term},${b.term}`;
        const pair = pairs.get(key) ?? { means: a.mean * b.mean, ratio: 1 };
        pair.ratio *= ratio(a.power, b.power);
        pairs.set(key, pair);
      }
    }
  }
  return [...pairs.values()].reduce((sum, { means, ratio }) => sum + means * (ratio - 1), 0);
}
