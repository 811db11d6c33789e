/** Throws a RangeError naming the argument unless `value` is a finite number from `least` to `most`, both included. */
export function requireBetween(name: string, value: number, least: number, most: number = Infinity): void {
  if (Number.isFinite(value) && value >= least && value <= most) return;
  const range = most === Infinity ? `at least ${least}` : `between ${least} and ${most}`;
  throw new RangeError(`${name} must be a number ${range}, not ${value}`);
}

/** Throws a RangeError naming the argument unless `value` is a finite number above 0. */
export function requirePositive(name: string, value: number): void {
  if (Number.isFinite(value) && value > 0) return;
  throw new RangeError(`${name} must be a number above 0, not ${value}`);
}
