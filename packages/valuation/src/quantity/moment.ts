import type { Quantity } from '../types.ts';
import { quantileOf } from './quantile.ts';

const points = 400;

/**
 * Expected value of the quantity raised to a power; closed for exact, uniform and lognormal, by quantiles otherwise (to about 1e-4).
 * Source: moments of the lognormal and the rectangular distribution, any handbook of statistics.
 */
export function momentOf(quantity: Quantity, power: number): number {
  if (quantity.kind === 'exact') return quantity.value ** power;
  if (quantity.kind === 'lognormal') {
    return quantity.median ** power * Math.exp((power * Math.log(quantity.gsd)) ** 2 / 2);
  }
  if (quantity.kind === 'uniform' && power !== -1 && quantity.hi > quantity.lo) {
    const { lo, hi } = quantity;
    return (hi ** (power + 1) - lo ** (power + 1)) / ((power + 1) * (hi - lo));
  }
  let sum = 0;
  for (let i = 0; i < points; i += 1) sum += quantileOf(quantity, (i + 0.5) / points) ** power;
  return sum / points;
}
