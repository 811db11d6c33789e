import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { AppError } from '../../platform/app-error.ts';
import { assertPlausible, massAdjustment, netOf, toleranceOf } from './weigh-in.rules.ts';

const refusal = (grossG: number, tareG: number, declaredG: number, scaleResolutionG = 1): AppError => {
  try {
    assertPlausible({ grossG, tareG, scaleResolutionG }, declaredG);
  } catch (error) {
    return error as AppError;
  }
  throw new Error('not refused');
};

describe('a weigh-in', () => {
  test('has an exact net mass', () => {
    expect(netOf({ grossG: 12_400.3, tareG: 0.1 })).toBe(12_400.2);
  });
  test('is refused when the tare is the gross mass or more, or the net is over three times the declared', () => {
    expect(refusal(400, 400, 1000).fields).toEqual([{ path: 'tareG', message: expect.stringContaining('swapped') }]);
    expect(refusal(3001.001, 0.001, 1000).fields[0]).toMatchObject({ path: 'grossG' });
    expect(() => assertPlausible({ grossG: 3000, tareG: 0, scaleResolutionG: 0.0001 }, 1000)).not.toThrow();
  });
  test('is refused below the milligram, which would not be kept', () => {
    expect(refusal(1000.0001, 0, 1000)).toMatchObject({ code: 'weigh_in.implausible', fields: [{ path: 'grossG' }] });
    expect(refusal(1000, 0, 1000, 0.00001)).toMatchObject({ fields: [{ path: 'scaleResolutionG' }] });
  });
});

describe('the weighing tolerance', () => {
  test('is the greater of 0.5 % and twice the resolution', () => {
    expect(toleranceOf(12_400, 1)).toBe(62);
    expect(toleranceOf(100, 1)).toBe(2);
  });
});

describe('the adjustment for mass', () => {
  const base = { declaredG: 10_000, toleranceG: 50, priceMinor: 100_000 };
  test('is nothing up to the tolerance, and the whole shortage beyond it', () => {
    expect(massAdjustment({ ...base, foundG: 9_950 })).toBe(0);
    expect(massAdjustment({ ...base, foundG: 9_949.999 })).toBe(500);
    expect(massAdjustment({ ...base, foundG: 9_500 })).toBe(5_000);
  });
  test('rounds half even', () => {
    expect(massAdjustment({ declaredG: 1000, foundG: 500, toleranceG: 5, priceMinor: 25 })).toBe(12);
    expect(massAdjustment({ declaredG: 1000, foundG: 500, toleranceG: 5, priceMinor: 27 })).toBe(14);
  });
  test('stays between nothing and the price, and an excess is not paid', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 99_999_999 }),
        fc.double({ min: 0.001, max: 1e8, noNaN: true }),
        fc.double({ min: 0.001, max: 3e8, noNaN: true }),
        (priceMinor, declaredG, foundG) => {
          const taken = massAdjustment({ declaredG, foundG, toleranceG: toleranceOf(declaredG, 1), priceMinor });
          expect(taken).toBeGreaterThanOrEqual(0);
          expect(taken).toBeLessThanOrEqual(priceMinor);
          if (foundG >= declaredG) expect(taken).toBe(0);
        },
      ),
    );
  });
});
