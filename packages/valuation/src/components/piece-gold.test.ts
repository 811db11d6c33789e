import { expect, test } from 'vitest';
import { pieceGold } from './piece-gold.ts';

test('twenty pieces of 45 mg hold 0.9 g', () => {
  expect(pieceGold({ pieces: 20, goldGPerPiece: 0.045 })).toBeCloseTo(0.9, 12);
});

test('a count or an amount below 0 is refused by name', () => {
  expect(() => pieceGold({ pieces: -1, goldGPerPiece: 1 })).toThrow(/^pieces must be/);
  expect(() => pieceGold({ pieces: 1, goldGPerPiece: Number.NaN })).toThrow(/^goldGPerPiece must be/);
});
