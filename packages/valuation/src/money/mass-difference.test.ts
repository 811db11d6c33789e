import fc from 'fast-check';
import { expect, test } from 'vitest';
import { massDifference } from './mass-difference.ts';

test('the tolerance is the greater of 0.5 % and twice the resolution', () => {
  expect(massDifference(10_000, 10_000, { resolutionG: 10 }).toleranceG).toBe(50);
  expect(massDifference(10_000, 10_000, { resolutionG: 100 }).toleranceG).toBe(200);
});

test('just the tolerance is within it; a gram more is the whole shortage', () => {
  expect(massDifference(10_000, 9950, { resolutionG: 1 })).toEqual({
    differenceG: -50,
    toleranceG: 50,
    withinTolerance: true,
    loss: 0,
  });
  expect(massDifference(10_000, 9949, { resolutionG: 1 })).toMatchObject({ withinTolerance: false, loss: 0.0051 });
});

test('an excess is seen and is never a loss', () => {
  expect(massDifference(10_000, 11_000, { resolutionG: 1 })).toMatchObject({ withinTolerance: false, loss: 0 });
});

test('the loss lies between nothing and all', () => {
  const mass = fc.double({ min: 0.001, max: 1e6, noNaN: true });
  fc.assert(
    fc.property(mass, mass, (declaredG, foundG) => {
      const { loss } = massDifference(declaredG, foundG, { resolutionG: 0.01 });
      expect(loss).toBeGreaterThanOrEqual(0);
      expect(loss).toBeLessThanOrEqual(1);
    }),
  );
});

test('a declared mass of nothing is refused', () => {
  expect(() => massDifference(0, 1, { resolutionG: 1 })).toThrow('declaredG');
  expect(() => massDifference(1, -1, { resolutionG: 1 })).toThrow('foundG');
});
