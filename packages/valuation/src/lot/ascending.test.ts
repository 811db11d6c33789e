import fc from 'fast-check';
import { expect, test } from 'vitest';
import { ascending } from './ascending.ts';

const anyValues = fc.oneof(
  fc.float64Array({ min: 0, max: 1e6, noNaN: true, maxLength: 500 }),
  fc.float64Array({ min: 100, max: 101, noNaN: true, maxLength: 500 }),
  fc.float64Array({ min: -5, max: 5, noNaN: true, maxLength: 100 }),
  fc.array(fc.constantFrom(0, 1, 1e9), { maxLength: 500 }).map((values) => Float64Array.from(values)),
  fc
    .array(fc.double({ min: -3, max: 9, noNaN: true }), { maxLength: 500 })
    .map((logs) => Float64Array.from(logs, (log) => 10 ** log)),
);

test('sorts as the library does and leaves its input alone', () => {
  fc.assert(
    fc.property(anyValues, (values) => {
      const before = Float64Array.from(values);
      const plus = before.map((value) => value + 0);
      expect(ascending(plus)).toEqual(plus.toSorted());
      expect(values).toEqual(before);
    }),
    { numRuns: 300 },
  );
});

test('sorts a large heap of equal values with one outlier', () => {
  const values = new Float64Array(5000).fill(7);
  values[17] = 1e12;
  values[18] = 0;
  expect(ascending(values)).toEqual(values.toSorted());
});
