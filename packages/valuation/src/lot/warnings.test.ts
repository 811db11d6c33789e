import { expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import type { LineInput } from '../types.ts';
import { line } from './line.fixture.ts';
import { planLot } from './plan-lot.ts';

const warningsOf = (...lines: Partial<LineInput>[]) =>
  planLot({ lines: lines.map((given, i) => line({ id: `${i}`, ...given })) }, catalogue20261).warnings;

test('a plausible line warns of nothing', () => {
  expect(warningsOf({ massG: 2200, pieces: 100, plating: { kind: 'xrf', thicknessUm: 0.8 } })).toEqual([]);
});

test('a slip of the decimal point is shown with what it would be', () => {
  expect(warningsOf({ massG: 33_000, pieces: 160 })).toEqual([
    {
      code: 'mass-per-piece',
      lineId: '0',
      message:
        '33 kg for 160 pieces is 206 g each. Memory modules mostly weigh 13 to 37 g. 3.3 kg would be 20.6 g each.',
    },
  ]);
});

test('a mass per piece just inside three standard deviations passes, just outside it does not', () => {
  const limitG = 22 * 1.3 ** 3;
  expect(warningsOf({ massG: 100 * limitG * 0.999, pieces: 100 })).toEqual([]);
  expect(warningsOf({ massG: 100 * limitG * 1.001, pieces: 100 })[0]?.code).toBe('mass-per-piece');
  expect(warningsOf({ massG: 100 * limitG * 1.001, pieces: 100, pieceMassG: 50 })).toEqual([]);
});

test('a line of unknown amount asks for it, by its number', () => {
  expect(warningsOf({}, { massG: null })).toEqual([
    { code: 'nothing-given', lineId: '1', message: 'Give the mass or the number of pieces of line 2' },
  ]);
});

test('pieces alone do not do for a kind without a usual piece', () => {
  const [warning] = warningsOf({ classCode: 'network-boards', massG: null, pieces: 12 });
  expect(warning?.code).toBe('amount-needed');
  expect(warning?.message).toContain('Give the mass of line 1');
});

test.each([
  ['thicker than any standard', { plating: { kind: 'xrf', thicknessUm: 50 } }, 'plating-beyond-standards'],
  ['thicker than the kind carries', { plating: { kind: 'standard', minimumUm: 12.5 } }, 'plating-thick'],
  ['a range wider than the class’s', { plating: { kind: 'range', leastUm: 0, mostUm: 1 } }, 'range-wider-than-class'],
  ['a scale too coarse for the mass', { massG: 40, scaleResolutionG: 20 }, 'scale-too-coarse'],
  ['plating on a board told by its grade', { classCode: 'phone-boards', wear: 0.1 }, 'plating-unused'],
  ['contacts without the area of one', { contactsPerPiece: 240 }, 'area-incomplete'],
  ['an area per piece without pieces', { classCode: 'edge-contacts', areaCm2PerPiece: 4 }, 'pieces-needed'],
] as [string, Partial<LineInput>, string][])('%s warns', (_, given, code) => {
  expect(warningsOf(given).map((warning) => warning.code)).toEqual([code]);
});

test('tin, a plating of nothing, is a figure like any other', () => {
  expect(warningsOf({ plating: { kind: 'range', leastUm: 0, mostUm: 0 } })).toEqual([]);
});
