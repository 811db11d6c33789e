import type { Quantiles } from '@lydite/valuation';
import { normalCdf } from './normal-cdf.ts';
import type { StreakOutline } from './streak-types.ts';

export interface Distribution {
  /** Ends of the drawn part, p0.15 and p99.85, grams. */
  fromG: number;
  toG: number;
  /** Smoothed density per unit of ln(gold); per gram it is this over the grams. */
  logDensityAt: (goldG: number) => number;
  /** Grams at a probability of 0 … 1 within the drawn part. */
  quantileAt: (probability: number) => number;
}

const anchors: [keyof Quantiles, number][] = [
  ['p0_15', 0.0015],
  ['p01', 0.01],
  ['p05', 0.05],
  ['p10', 0.1],
  ['p25', 0.25],
  ['p50', 0.5],
  ['p75', 0.75],
  ['p90', 0.9],
  ['p95', 0.95],
  ['p99', 0.99],
  ['p99_5', 0.995],
  ['p99_85', 0.9985],
];

/** Width of the smoothing kernel as a share of the spread, and how often the result is tabled. */
const KERNEL = 0.12;
const TABLE_STEPS = 96;

/** A stretch of ln(gold) that holds its mass evenly. */
interface Piece {
  from: number;
  to: number;
  mass: number;
}

/**
 * The stored bins are even in grams, so a skew lot's lower tail falls into a handful of them. Between two quantiles the mass is
 * known exactly; the bins only say how it lies there.
 */
function piecesOf({ goldG, density }: StreakOutline): Piece[] {
  const binG = (density.toG - density.fromG) / density.perG.length;
  const least = goldG.p50 * 1e-4;
  const pieces: Piece[] = [];
  anchors.slice(1).forEach(([name, upper], i) => {
    const [belowName, lower] = anchors[i] as [keyof Quantiles, number];
    const [fromG, toG] = [Math.max(goldG[belowName], least), Math.max(goldG[name], least)];
    if (!(toG > fromG)) return;
    const inner = density.perG.map((_, bin) => density.fromG + bin * binG).filter((edge) => edge > fromG && edge < toG);
    const edges = [fromG, ...inner, toG];
    const weights = edges.slice(1).map((edge, k) => {
      const start = edges[k] ?? fromG;
      const bin = Math.floor(((start + edge) / 2 - density.fromG) / binG);
      return Math.max(density.perG[bin] ?? 0, 1e-12) * (edge - start);
    });
    const total = weights.reduce((sum, weight) => sum + weight, 0);
    weights.forEach((weight, k) => {
      const mass = ((upper - lower) * weight) / total;
      pieces.push({ from: Math.log(edges[k] ?? fromG), to: Math.log(edges[k + 1] ?? toG), mass });
    });
  });
  return pieces;
}

function smoothedDensity(pieces: readonly Piece[], kernel: number, at: number): number {
  return pieces.reduce((sum, { from, to, mass }) => {
    if (at < from - 5 * kernel || at > to + 5 * kernel) return sum;
    return sum + (mass * (normalCdf((at - from) / kernel) - normalCdf((at - to) / kernel))) / (to - from);
  }, 0);
}

/** Reads a stored estimate as a continuous density and its inverse sum. */
export function distributionOf(outline: StreakOutline): Distribution {
  const pieces = piecesOf(outline);
  const { p0_15: fromG, p10, p50, p90, p99_85: toG } = outline.goldG;
  const [first, last] = [pieces[0], pieces.at(-1)];
  if (!first || !last || !(p90 > p10 * (1 + 1e-9))) return { fromG, toG, logDensityAt: () => 0, quantileAt: () => p50 };

  // 2.563 standard deviations lie between p10 and p90 of a normal.
  const kernel = (KERNEL * Math.log(p90 / Math.max(p10, p50 * 1e-4))) / 2.563;
  const step = (last.to - first.from) / TABLE_STEPS;
  const table = Array.from({ length: TABLE_STEPS + 1 }, (_, i) =>
    smoothedDensity(pieces, kernel, first.from + i * step),
  );
  const logDensityAt = (goldG: number) => {
    const position = (Math.log(goldG) - first.from) / step;
    const left = Math.floor(position);
    const [low, high] = [table[left] ?? 0, table[left + 1] ?? table[left] ?? 0];
    return goldG > 0 ? low + (high - low) * (position - left) : 0;
  };

  const total = pieces.reduce((sum, { mass }) => sum + mass, 0);
  const quantileAt = (probability: number) => {
    let below = 0;
    for (const { from, to, mass } of pieces) {
      const wanted = probability * total - below;
      if (wanted <= mass) return Math.exp(from + (to - from) * (wanted / mass));
      below += mass;
    }
    return Math.exp(last.to);
  };
  return { fromG: Math.exp(first.from), toG: Math.exp(last.to), logDensityAt, quantileAt };
}
