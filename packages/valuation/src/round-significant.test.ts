import { expect, test } from 'vitest';
import { roundSignificant } from './round-significant.ts';

test.each([
  [206.25, 2, 210],
  [0.024_49, 2, 0.024],
  [99.6, 2, 100],
  [0, 2, 0],
  [-1234, 2, -1200],
  [Infinity, 2, Infinity],
])('%s to %i figures is %s', (value, figures, rounded) => {
  expect(roundSignificant(value, figures)).toBe(rounded);
});

test('no figures at all are refused', () => {
  expect(() => roundSignificant(1, 0)).toThrow('figures');
});
