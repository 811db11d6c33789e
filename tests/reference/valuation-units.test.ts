import { fromGrams, toGrams } from '@lydite/valuation';
import { expect, test } from 'vitest';

test('a troy ounce is 20 pennyweights and 480 grains', () => {
  expect(fromGrams(toGrams(1, 'ozt'), 'dwt')).toBeCloseTo(20, 12);
  expect(fromGrams(toGrams(1, 'ozt'), 'gr')).toBeCloseTo(480, 12);
});
