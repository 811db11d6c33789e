import { Decimal } from 'decimal.js';

/** A fee or tax on an amount, in minor units, rounded half even (rules.md, Money). `bp`: hundredths of a per cent. */
export const feeMinor = (amountMinor: number, bp: number): number =>
  new Decimal(amountMinor).times(bp).div(10_000).toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN).toNumber();
