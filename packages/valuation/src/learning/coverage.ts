import { requireBetween } from '../argument.ts';

export interface Coverage {
  outcomes: number;
  /** How many fell between p25 and p75, and between p10 and p90; a good estimate has a half and four fifths there. */
  insideHalf: number;
  insideEighty: number;
  /** Range of true shares that would give such counts, 95 %. */
  halfRange: [number, number];
  eightyRange: [number, number];
}

/** One row of a reliability table: of the assays, the share that should and the share that did lie below a quantile. */
export interface ReliabilityRow {
  expected: number;
  observed: number;
}

/**
 * How many assays fell inside the ranges of their estimates.
 * @param ranks share of its estimate below each assay, 0 … 1 (see `assayAgainstEstimate`)
 * @throws {RangeError} when a rank is outside 0 … 1
 */
export function coverageOf(ranks: readonly number[]): Coverage {
  requireRanks(ranks);
  const inside = (low: number, high: number) => ranks.filter((rank) => rank >= low && rank <= high).length;
  const [insideHalf, insideEighty] = [inside(0.25, 0.75), inside(0.1, 0.9)];
  return {
    outcomes: ranks.length,
    insideHalf,
    insideEighty,
    halfRange: wilsonRange(insideHalf, ranks.length),
    eightyRange: wilsonRange(insideEighty, ranks.length),
  };
}

/** Reliability at the nine deciles; empty without outcomes. */
export function reliabilityTable(ranks: readonly number[]): ReliabilityRow[] {
  requireRanks(ranks);
  if (ranks.length === 0) return [];
  return [1, 2, 3, 4, 5, 6, 7, 8, 9].map((tenth) => ({
    expected: tenth / 10,
    observed: ranks.filter((rank) => rank <= tenth / 10).length / ranks.length,
  }));
}

const z = 1.959963984540054;

/**
 * 95 % score interval of a share; the whole of 0 … 1 without trials.
 * Source: E. B. Wilson, Journal of the American Statistical Association 22 (1927) 209–212.
 */
export function wilsonRange(hits: number, trials: number): [number, number] {
  requireBetween('hits', hits, 0, trials);
  if (trials === 0) return [0, 1];
  const share = hits / trials;
  const middle = share + z ** 2 / (2 * trials);
  const half = z * Math.sqrt((share * (1 - share)) / trials + z ** 2 / (4 * trials ** 2));
  const scale = 1 + z ** 2 / trials;
  // At the ends the interval reaches the end itself; rounding must not stop short of it.
  return [hits === 0 ? 0 : (middle - half) / scale, hits === trials ? 1 : (middle + half) / scale];
}

function requireRanks(ranks: readonly number[]): void {
  ranks.forEach((rank, i) => requireBetween(`ranks[${i}]`, rank, 0, 1));
}
