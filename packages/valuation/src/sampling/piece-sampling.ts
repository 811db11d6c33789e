import { requireBetween } from '../argument.ts';

/**
 * Relative standard deviation of the mean of some pieces drawn at random, without putting any back:
 * cv / √n · √((N − n) / (N − 1)).
 * @param sampling cv, relative sd among the pieces (≥ 0); drawn, at least 1; of, pieces in the lot
 * @throws {RangeError} naming the figure that is out of its range
 * Source: W. G. Cochran, Sampling Techniques, 1977, theorem 2.2 (from memory).
 */
export function pieceSamplingSd({ cv, drawn, of }: { cv: number; drawn: number; of: number }): number {
  requireBetween('cv', cv, 0);
  requireWhole('of', of, 1, Infinity);
  requireWhole('drawn', drawn, 1, of);
  return of === 1 ? 0 : (cv / Math.sqrt(drawn)) * Math.sqrt((of - drawn) / (of - 1));
}

/**
 * Least number of pieces to draw for a wanted relative standard deviation of their mean.
 * @param sampling relativeSd, above 0
 * @throws {RangeError} naming the figure that is out of its range
 */
export function leastPieces({ cv, relativeSd, of }: { cv: number; relativeSd: number; of: number }): number {
  requireBetween('cv', cv, 0);
  requireBetween('relativeSd', relativeSd, Number.MIN_VALUE);
  requireWhole('of', of, 1, Infinity);
  if (of === 1) return 1;
  const boundless = (cv / relativeSd) ** 2;
  const least = (boundless * of) / (boundless + of - 1);
  // A trace above a whole number is rounding, not another piece.
  return Math.min(of, Math.max(1, Math.ceil(least - 1e-9)));
}

function requireWhole(name: string, value: number, least: number, most: number): void {
  requireBetween(name, value, least, most);
  if (!Number.isInteger(value)) throw new RangeError(`${name} must be a whole number, not ${value}`);
}
