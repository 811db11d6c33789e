import { expect, test } from 'vitest';
import { requireBetween, requirePositive } from './argument.ts';

test('a value at either end of its range is accepted', () => {
  expect(() => requireBetween('share', 0, 0, 1)).not.toThrow();
  expect(() => requireBetween('share', 1, 0, 1)).not.toThrow();
});

test.each([Number.NaN, Infinity, -0.01, 1.01])('%s is refused with the name of the argument', (value) => {
  expect(() => requireBetween('share', value, 0, 1)).toThrow(
    new RangeError(`share must be a number between 0 and 1, not ${value}`),
  );
});

test('zero is not positive', () => {
  expect(() => requirePositive('draws', 0)).toThrow(/^draws must be a number above 0/);
  expect(() => requirePositive('draws', 1e-9)).not.toThrow();
});
