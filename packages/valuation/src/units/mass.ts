import { requireBetween } from '../argument.ts';

/** Grams in one unit, exact. Source: NIST Handbook 44, appendix C. */
const gramsIn = {
  g: 1,
  kg: 1000,
  lb: 453.59237,
  oz: 28.349523125,
  ozt: 31.1034768,
  dwt: 1.55517384,
  gr: 0.06479891,
} as const;

/** `oz` is the avoirdupois ounce and never the troy one, which is `ozt`. */
export type MassUnit = keyof typeof gramsIn;

export const massUnits: readonly { id: MassUnit; label: string; name: string }[] = [
  { id: 'kg', label: 'kg', name: 'kilograms' },
  { id: 'g', label: 'g', name: 'grams' },
  { id: 'lb', label: 'lb', name: 'pounds' },
  { id: 'oz', label: 'oz (avoirdupois)', name: 'avoirdupois ounces' },
  { id: 'ozt', label: 'ozt', name: 'troy ounces' },
  { id: 'dwt', label: 'dwt', name: 'pennyweights' },
  { id: 'gr', label: 'gr', name: 'grains' },
];

/** Mass in grams. @throws {RangeError} when the value is negative or not finite. */
export function toGrams(value: number, unit: MassUnit): number {
  requireBetween('mass', value, 0);
  return value * gramsIn[unit];
}

/** Grams in another unit. @throws {RangeError} when the mass is negative or not finite. */
export function fromGrams(massG: number, unit: MassUnit): number {
  requireBetween('massG', massG, 0);
  return massG / gramsIn[unit];
}
