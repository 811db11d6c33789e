import { expect, test } from 'vitest';
import { toleranceOf } from './published/published-value.ts';
import { publishedInside, publishedValues } from './published/published-values.ts';

test.each(publishedValues)('$what: $published $unit ($source)', (value) => {
  expect(Math.abs(value.ours() - Number(value.published))).toBeLessThanOrEqual(toleranceOf(value));
});

test.each(publishedInside)('$what: $published $unit lies inside p01 to p99 ($source)', ({ published, range }) => {
  const [low, high] = range();
  expect(published).toBeGreaterThan(low);
  expect(published).toBeLessThan(high);
});

test('every value names its source, and the last printed digit says how closely it is met', () => {
  expect([...publishedValues, ...publishedInside].filter(({ source }) => source.trim().length < 4)).toEqual([]);
  expect(toleranceOf({ published: '9.790' })).toBeCloseTo(0.0005, 12);
  expect(toleranceOf({ published: '71' })).toBeCloseTo(0.5, 8);
  expect(toleranceOf({ published: '3.5', within: 0 })).toBe(0);
});
