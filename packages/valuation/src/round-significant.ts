import { requireBetween } from './argument.ts';

/**
 * Rounds to a number of significant figures: roundSignificant(206.25, 2) is 210, roundSignificant(0.02449, 2) is 0.024.
 * @param figures 1 … 15
 * @throws {RangeError} when `figures` is outside its range
 */
export function roundSignificant(value: number, figures: number): number {
  requireBetween('figures', figures, 1, 15);
  return Number.isFinite(value) ? Number(value.toPrecision(figures)) : value;
}
