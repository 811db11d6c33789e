import { requireBetween } from '../argument.ts';

/** Micrometres in one unit, exact: 1 in = 25.4 mm. Source: NIST Handbook 44, appendix C. */
const micrometresIn = { um: 1, uin: 0.0254, mm: 1000, in: 25_400 } as const;

export type LengthUnit = keyof typeof micrometresIn;

export const lengthUnits: readonly { id: LengthUnit; label: string; name: string }[] = [
  { id: 'um', label: 'µm', name: 'micrometres' },
  { id: 'uin', label: 'µin', name: 'micro-inches' },
  { id: 'mm', label: 'mm', name: 'millimetres' },
  { id: 'in', label: 'in', name: 'inches' },
];

/** Length in micrometres. @throws {RangeError} when the value is negative or not finite. */
export function toMicrometres(value: number, unit: LengthUnit): number {
  requireBetween('length', value, 0);
  return value * micrometresIn[unit];
}

/** Micrometres in another unit. @throws {RangeError} when the length is negative or not finite. */
export function fromMicrometres(lengthUm: number, unit: LengthUnit): number {
  requireBetween('lengthUm', lengthUm, 0);
  return lengthUm / micrometresIn[unit];
}
