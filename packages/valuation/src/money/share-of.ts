import { Decimal } from 'decimal.js';
import { requireBetween } from '../argument.ts';

/**
 * A share of an amount, rounded once, half to even, to the minor unit.
 * @param amountMinor whole minor units, at least 0
 * @param share 0 … 1
 * @throws {RangeError} naming the argument that is out of its range
 */
export function shareOf(amountMinor: number, share: number): number {
  requireMinor('amountMinor', amountMinor);
  requireBetween('share', share, 0, 1);
  return new Decimal(amountMinor).times(share).toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN).toNumber();
}

/** @throws {RangeError} unless the amount is a whole number of minor units, at least 0 */
export function requireMinor(name: string, amountMinor: number): void {
  requireBetween(name, amountMinor, 0);
  if (!Number.isSafeInteger(amountMinor)) throw new RangeError(`${name} must be whole minor units, not ${amountMinor}`);
}
