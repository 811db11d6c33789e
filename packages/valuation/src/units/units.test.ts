import fc from 'fast-check';
import { expect, test } from 'vitest';
import { fromGramsPerTonne, gradeUnits, toGramsPerTonne } from './grade.ts';
import { fromMicrometres, lengthUnits, toMicrometres } from './length.ts';
import { fromGrams, massUnits, toGrams } from './mass.ts';

const amount = fc.double({ min: 0, max: 1e9, noNaN: true });

test('a mass entered in any unit comes back as it was entered', () => {
  fc.assert(
    fc.property(amount, fc.constantFrom(...massUnits), (value, { id }) => {
      expect(fromGrams(toGrams(value, id), id)).toBeCloseTo(value, 6);
    }),
  );
});

test('a length and a grade come back as they were entered', () => {
  fc.assert(
    fc.property(amount, fc.constantFrom(...lengthUnits), fc.constantFrom(...gradeUnits), (value, length, grade) => {
      expect(fromMicrometres(toMicrometres(value, length.id), length.id)).toBeCloseTo(value, 6);
      expect(fromGramsPerTonne(toGramsPerTonne(value, grade.id), grade.id)).toBeCloseTo(value, 6);
    }),
  );
});

test('an ounce alone is the avoirdupois one, and its label says so', () => {
  expect(toGrams(1, 'oz')).toBe(28.349523125);
  expect(massUnits.find(({ id }) => id === 'oz')?.label).toContain('avoirdupois');
});

test('a negative or missing figure is refused by name', () => {
  expect(() => toGrams(-1, 'kg')).toThrow(/^mass must be/);
  expect(() => fromGrams(Number.NaN, 'kg')).toThrow(/^massG must be/);
  expect(() => toMicrometres(Infinity, 'um')).toThrow(/^length must be/);
  expect(() => toGramsPerTonne(-0.1, 'ppm')).toThrow(/^grade must be/);
});
