import fc from 'fast-check';
import { expect, test } from 'vitest';
import { toMicrometres } from '../units/length.ts';
import { platedGold, type Plating } from './plated-gold.ts';

const card: Plating = { areaCm2: 4.921, thicknessUm: 0.762, densityGPerCm3: 19.32, goldFraction: 1, wear: 0 };
const size = fc.double({ min: 0, max: 1000, noNaN: true });

test('gold is linear in the area and in the thickness', () => {
  fc.assert(
    fc.property(size, size, (areaCm2, thicknessUm) => {
      const once = platedGold({ ...card, areaCm2, thicknessUm });
      expect(platedGold({ ...card, areaCm2: 3 * areaCm2, thicknessUm })).toBeCloseTo(3 * once, 9);
      expect(platedGold({ ...card, areaCm2, thicknessUm: 3 * thicknessUm })).toBeCloseTo(3 * once, 9);
    }),
  );
});

test('the unit of entry does not matter', () => {
  const micro = platedGold({ ...card, thicknessUm: toMicrometres(30, 'uin') });
  expect(micro).toBeCloseTo(platedGold({ ...card, thicknessUm: 0.762 }), 15);
});

test('a tinned contact holds nothing, a worn one what is left', () => {
  expect(platedGold({ ...card, thicknessUm: 0 })).toBe(0);
  expect(platedGold({ ...card, goldFraction: 0 })).toBe(0);
  expect(platedGold({ ...card, wear: 0.25 })).toBeCloseTo(0.75 * platedGold(card), 15);
});

test.each([
  ['areaCm2', -1],
  ['thicknessUm', Number.NaN],
  ['densityGPerCm3', 0],
  ['goldFraction', 1.1],
  ['wear', -0.1],
] as const)('%s of %s is refused by name', (field, value) => {
  expect(() => platedGold({ ...card, [field]: value })).toThrow(new RegExp(`^${field} must be`));
});
