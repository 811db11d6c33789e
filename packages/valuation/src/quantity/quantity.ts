import { requireBetween, requirePositive } from '../argument.ts';
import type { Quantity } from '../types.ts';

/** A number known without spread. */
export function exact(value: number): Quantity {
  return requireQuantity('value', { kind: 'exact', value });
}

/** Anything from `lo` to `hi`, equally likely. */
export function uniform(lo: number, hi: number): Quantity {
  return requireQuantity('uniform', { kind: 'uniform', lo, hi });
}

export function triangular(lo: number, mode: number, hi: number): Quantity {
  return requireQuantity('triangular', { kind: 'triangular', lo, mode, hi });
}

/** Normal, cut off at 0. */
export function normal(mean: number, sd: number): Quantity {
  return requireQuantity('normal', { kind: 'normal', mean, sd });
}

/** Lognormal by its median and geometric standard deviation (1 is no spread). */
export function lognormal(median: number, gsd: number): Quantity {
  return requireQuantity('lognormal', { kind: 'lognormal', median, gsd });
}

/** "About x, give or take h": normal with the half-width as two standard deviations. */
export function about(value: number, halfWidth: number): Quantity {
  return normal(value, halfWidth / 2);
}

/** `value` within plus or minus `share` of it, equally likely. */
export function within(value: number, share: number): Quantity {
  const half = value * share;
  return half === 0 ? exact(value) : uniform(value - half, value + half);
}

/**
 * Hands the quantity back when its figures make sense: all finite and not negative, limits in order, gsd at least 1.
 * @throws {RangeError} naming `name` and the figure
 */
export function requireQuantity(name: string, quantity: Quantity): Quantity {
  switch (quantity.kind) {
    case 'exact':
      requireBetween(`${name}.value`, quantity.value, 0);
      break;
    case 'uniform':
      requireBetween(`${name}.lo`, quantity.lo, 0);
      requireBetween(`${name}.hi`, quantity.hi, quantity.lo);
      break;
    case 'triangular':
      requireBetween(`${name}.lo`, quantity.lo, 0);
      requireBetween(`${name}.mode`, quantity.mode, quantity.lo);
      requireBetween(`${name}.hi`, quantity.hi, quantity.mode);
      break;
    case 'normal':
      requireBetween(`${name}.mean`, quantity.mean, 0);
      requireBetween(`${name}.sd`, quantity.sd, 0);
      break;
    case 'lognormal':
      requirePositive(`${name}.median`, quantity.median);
      requireBetween(`${name}.gsd`, quantity.gsd, 1);
  }
  return quantity;
}
