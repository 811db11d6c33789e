import { requireBetween, requirePositive } from '../argument.ts';

export interface BondWires {
  wires: number;
  lengthMm: number;
  diameterUm: number;
  densityGPerCm3: number;
}

/**
 * Gold in the bond wires of a package: wires · length · π/4 · diameter² · density.
 * @param bondWires number of wires (≥ 0), length of one in mm (≥ 0), diameter in µm (≥ 0), density in g/cm³ (> 0)
 * @returns grams of gold
 * @throws {RangeError} naming the argument that is not finite or outside its range
 * Source: volume of a cylinder; 25.4 µm wire holds 9.790 µg per mm.
 */
export function bondWireGold({ wires, lengthMm, diameterUm, densityGPerCm3 }: BondWires): number {
  requireBetween('wires', wires, 0);
  requireBetween('lengthMm', lengthMm, 0);
  requireBetween('diameterUm', diameterUm, 0);
  requirePositive('densityGPerCm3', densityGPerCm3);
  const lengthCm = lengthMm * 0.1;
  const diameterCm = diameterUm * 1e-4;
  return wires * lengthCm * (Math.PI / 4) * diameterCm ** 2 * densityGPerCm3;
}
