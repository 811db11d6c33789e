import { requireBetween, requirePositive } from '../argument.ts';

export interface Finish {
  areaCm2: number;
  sides: number;
  coveredFraction: number;
  thicknessUm: number;
  densityGPerCm3: number;
}

/**
 * Gold in a thin finish over a board or package: areaCm2 · sides · coveredFraction · thicknessUm · 1e-4 · densityGPerCm3.
 * @param finish area of one side in cm² (≥ 0), sides 1 or 2, covered fraction 0 … 1, thickness in µm (≥ 0), density in g/cm³ (> 0)
 * @returns grams of gold
 * @throws {RangeError} naming the argument that is not finite or outside its range
 * Source: IPC-4552 (immersion gold, thickness over the covered area).
 */
export function finishGold({ areaCm2, sides, coveredFraction, thicknessUm, densityGPerCm3 }: Finish): number {
  requireBetween('areaCm2', areaCm2, 0);
  requireBetween('sides', sides, 1, 2);
  requireBetween('coveredFraction', coveredFraction, 0, 1);
  requireBetween('thicknessUm', thicknessUm, 0);
  requirePositive('densityGPerCm3', densityGPerCm3);
  return areaCm2 * sides * coveredFraction * thicknessUm * 1e-4 * densityGPerCm3;
}
