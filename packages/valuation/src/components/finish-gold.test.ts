import { expect, test } from 'vitest';
import { finishGold, type Finish } from './finish-gold.ts';

const board: Finish = { areaCm2: 100, sides: 2, coveredFraction: 0.1, thicknessUm: 0.1, densityGPerCm3: 19.32 };

test('a square decimetre covered to a tenth on both sides with 0.1 µm holds 3.864 mg', () => {
  expect(finishGold(board)).toBeCloseTo(0.003864, 12);
});

test('one side holds half of two', () => {
  expect(finishGold({ ...board, sides: 1 })).toBeCloseTo(0.5 * finishGold(board), 15);
});

test.each([
  ['areaCm2', -1],
  ['sides', 3],
  ['coveredFraction', 2],
  ['thicknessUm', -0.1],
  ['densityGPerCm3', 0],
] as const)('%s of %s is refused by name', (field, value) => {
  expect(() => finishGold({ ...board, [field]: value })).toThrow(new RegExp(`^${field} must be`));
});
