import { expect, test } from 'vitest';
import { bondWireGold, type BondWires } from './bond-wire-gold.ts';

const wire: BondWires = { wires: 1, lengthMm: 1, diameterUm: 25.4, densityGPerCm3: 19.32 };

test('doubling the diameter makes four times the gold, doubling the length or the count twice', () => {
  const once = bondWireGold(wire);
  expect(bondWireGold({ ...wire, diameterUm: 50.8 })).toBeCloseTo(4 * once, 15);
  expect(bondWireGold({ ...wire, lengthMm: 2 })).toBeCloseTo(2 * once, 15);
  expect(bondWireGold({ ...wire, wires: 2 })).toBeCloseTo(2 * once, 15);
});

test.each([
  ['wires', -1],
  ['lengthMm', Number.NaN],
  ['diameterUm', -25],
  ['densityGPerCm3', 0],
] as const)('%s of %s is refused by name', (field, value) => {
  expect(() => bondWireGold({ ...wire, [field]: value })).toThrow(new RegExp(`^${field} must be`));
});
