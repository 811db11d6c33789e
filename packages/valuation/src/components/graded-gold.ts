import { requireBetween } from '../argument.ts';

/**
 * Gold in a mass of known grade: massG · gradeGPerT · 1e-6.
 * @param graded mass in grams (≥ 0) and grade in grams per tonne (0 … 1 000 000)
 * @returns grams of gold
 * @throws {RangeError} naming the argument that is not finite or outside its range
 */
export function gradedGold({ massG, gradeGPerT }: { massG: number; gradeGPerT: number }): number {
  requireBetween('massG', massG, 0);
  requireBetween('gradeGPerT', gradeGPerT, 0, 1e6);
  return massG * gradeGPerT * 1e-6;
}
