import { requireBetween, requirePositive } from '../argument.ts';

export interface Plating {
  areaCm2: number;
  thicknessUm: number;
  densityGPerCm3: number;
  goldFraction: number;
  /** Share of the plating worn away, 0 … 1. */
  wear: number;
}

/**
 * Gold in a plated contact area: areaCm2 · thicknessUm · 1e-4 · densityGPerCm3 · goldFraction · (1 − wear).
 * @param plating area in cm² (≥ 0, both sides counted), thickness in µm (≥ 0), density of the deposit in g/cm³ (> 0), gold fraction and wear 0 … 1
 * @returns grams of gold; 0 for a tinned contact (thickness or fraction 0)
 * @throws {RangeError} naming the argument that is not finite or outside its range
 * Source: ASTM B488 (mass per area = thickness × density).
 */
export function platedGold({ areaCm2, thicknessUm, densityGPerCm3, goldFraction, wear }: Plating): number {
  requireBetween('areaCm2', areaCm2, 0);
  requireBetween('thicknessUm', thicknessUm, 0);
  requirePositive('densityGPerCm3', densityGPerCm3);
  requireBetween('goldFraction', goldFraction, 0, 1);
  requireBetween('wear', wear, 0, 1);
  return areaCm2 * thicknessUm * 1e-4 * densityGPerCm3 * goldFraction * (1 - wear);
}
