import fc from 'fast-check';
import { quantileSorted } from 'simple-statistics';
import { expect, test } from 'vitest';
import { createQuantileFinder, interpolate } from './quantile-finder.ts';

const anyValues = fc.oneof(
  fc.float64Array({ min: 0, max: 1e6, noNaN: true, minLength: 1, maxLength: 500 }),
  fc.float64Array({ min: 100, max: 101, noNaN: true, minLength: 1, maxLength: 500 }),
  fc.float64Array({ min: -5, max: 5, noNaN: true, minLength: 1, maxLength: 100 }),
  fc.array(fc.constantFrom(0, 1, 1e9), { minLength: 1, maxLength: 500 }).map((values) => Float64Array.from(values)),
  fc
    .array(fc.double({ min: -3, max: 9, noNaN: true }), { minLength: 1, maxLength: 500 })
    .map((logs) => Float64Array.from(logs, (log) => 10 ** log)),
);
const anyProbabilities = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 1, maxLength: 70 });

test('type 7 interpolates between the neighbours, as in Hyndman and Fan’s definition', () => {
  const find = createQuantileFinder(4);
  expect(find(Float64Array.of(3, 1, 4, 2), [0, 1, 0.25])).toEqual([1, 4, 1.75]);
  expect(find(Float64Array.of(3, 1, 4, 2), [0.9])[0]).toBeCloseTo(3.7, 12);
});

test('finds what sorting and interpolating finds, and leaves its input alone', () => {
  fc.assert(
    fc.property(anyValues, anyProbabilities, (values, probabilities) => {
      const before = Float64Array.from(values);
      const sorted = values.toSorted();
      const expected = probabilities.map((each) => interpolate((rank) => sorted[rank] as number, each, sorted.length));
      expect(createQuantileFinder(values.length)(values, probabilities)).toEqual(expected);
      expect(values).toEqual(before);
    }),
    { numRuns: 300 },
  );
});

test('the median is the one simple-statistics finds', () => {
  fc.assert(
    fc.property(anyValues, (values) => {
      const [median] = createQuantileFinder(values.length)(values, [0.5]) as [number];
      expect(median).toBeCloseTo(quantileSorted([...values.toSorted()], 0.5), 6);
    }),
  );
});

test('nothing with a minus sign is nothing', () => {
  expect(createQuantileFinder(3)(Float64Array.of(0, -0, 5e9), [0, 0.5, 1]).map((value) => value + 0)).toEqual([
    0, 0, 5e9,
  ]);
  expect(createQuantileFinder(2)(Float64Array.of(5e-324, -0), [1])).toEqual([5e-324]);
});

test('one finder serves many arrays, a heap of equal values with outliers among them', () => {
  const find = createQuantileFinder(5000);
  const heap = new Float64Array(5000).fill(7);
  heap[17] = 1e12;
  heap[18] = 0;
  expect(find(heap, [0, 0.5, 1])).toEqual([0, 7, 1e12]);
  expect(
    find(
      Float64Array.from(heap, (_, i) => i),
      [0, 0.5, 1],
    ),
  ).toEqual([0, 2499.5, 4999]);
  expect(find(heap, [0, 0.5, 1])).toEqual([0, 7, 1e12]);
});
