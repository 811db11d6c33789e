import { requireBetween } from '../argument.ts';

/** Grams per tonne in one unit. One troy ounce per short ton is 31.1034768 g / 0.90718474 t = 240/7 g/t exactly. */
const gramsPerTonneIn = { 'g/t': 1, ppm: 1, 'mg/kg': 1, 'g/kg': 1000, 'ozt/ton': 240 / 7 } as const;

export type GradeUnit = keyof typeof gramsPerTonneIn;

export const gradeUnits: readonly { id: GradeUnit; label: string; name: string }[] = [
  { id: 'g/t', label: 'g/t', name: 'grams per tonne' },
  { id: 'g/kg', label: 'g/kg', name: 'grams per kilogram' },
  { id: 'mg/kg', label: 'mg/kg', name: 'milligrams per kilogram' },
  { id: 'ppm', label: 'ppm', name: 'parts per million by mass' },
  { id: 'ozt/ton', label: 'ozt/short ton', name: 'troy ounces per short ton' },
];

/** Grade in grams per tonne. @throws {RangeError} when the value is negative or not finite. */
export function toGramsPerTonne(value: number, unit: GradeUnit): number {
  requireBetween('grade', value, 0);
  return value * gramsPerTonneIn[unit];
}

/** Grams per tonne in another unit. @throws {RangeError} when the grade is negative or not finite. */
export function fromGramsPerTonne(gradeGPerT: number, unit: GradeUnit): number {
  requireBetween('gradeGPerT', gradeGPerT, 0);
  return gradeGPerT / gramsPerTonneIn[unit];
}
