import { Decimal } from 'decimal.js';

/** A figure as it was written down: a number, or decimal digits as a database hands them out. */
export type Written = number | string;

/** @throws {RangeError} naming the argument unless it is a finite decimal from `least` to `most` */
export function toDecimal(name: string, written: Written, least: number, most: number = Infinity): Decimal {
  const value = readDecimal(written);
  if (value?.isFinite() && value.gte(least) && value.lte(most)) return value;
  const range = most === Infinity ? `at least ${least}` : `between ${least} and ${most}`;
  throw new RangeError(`${name} must be a number ${range}, not ${written}`);
}

function readDecimal(written: Written): Decimal | null {
  try {
    return new Decimal(written);
  } catch {
    return null;
  }
}
