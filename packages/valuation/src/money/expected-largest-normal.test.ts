import { expect, test } from 'vitest';
import { expectedLargestNormal } from './expected-largest-normal.ts';

test('one alone is on average in the middle, and more make the largest larger', () => {
  expect(expectedLargestNormal(1)).toBeCloseTo(0, 12);
  for (let count = 1; count < 40; count += 1) {
    expect(expectedLargestNormal(count + 1)).toBeGreaterThan(expectedLargestNormal(count));
  }
});

test('of two it is one over the root of π, of three one and a half over it, exactly', () => {
  expect(expectedLargestNormal(2)).toBeCloseTo(1 / Math.sqrt(Math.PI), 12);
  expect(expectedLargestNormal(3)).toBeCloseTo(1.5 / Math.sqrt(Math.PI), 12);
});

test.each([0, 1.5, 10_001, Number.NaN])('a count of %s is refused', (count) => {
  expect(() => expectedLargestNormal(count)).toThrow(/^count must be/);
});
