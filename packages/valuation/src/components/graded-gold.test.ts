import { expect, test } from 'vitest';
import { gradedGold } from './graded-gold.ts';

test('a tonne at 250 g/t holds 250 g', () => {
  expect(gradedGold({ massG: 1e6, gradeGPerT: 250 })).toBe(250);
});

test('a mass below 0 and a grade above pure gold are refused by name', () => {
  expect(() => gradedGold({ massG: -1, gradeGPerT: 1 })).toThrow(/^massG must be/);
  expect(() => gradedGold({ massG: 1, gradeGPerT: 1_000_001 })).toThrow(/^gradeGPerT must be/);
});
