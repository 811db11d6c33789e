import { expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import type { LineInput } from '../types.ts';
import { estimateLot } from './estimate-lot.ts';
import { line } from './line.fixture.ts';

const driversOf = (...lines: Partial<LineInput>[]) =>
  estimateLot({ lines: lines.map((given, i) => line({ id: `${i}`, ...given })) }, catalogue20261, { seed: 1 }).drivers;

test('pins of unknown plating: measure it first', () => {
  const [first] = driversOf({ classCode: 'pins-full' });
  expect(first).toMatchObject({
    lineId: '0',
    classCode: 'pins-full',
    parameter: 'plating.thicknessUm',
    question: 'Measure the plating on line 1',
  });
  expect(first?.share).toBeGreaterThan(0.95);
});

test('what is expected after a measurement is what the estimate says once it is made', () => {
  const [first] = driversOf({ classCode: 'pins-full' });
  const measured = { classCode: 'pins-full', plating: { kind: 'xrf', thicknessUm: 0.4 } as const };
  const after = estimateLot({ lines: [line(measured)] }, catalogue20261, { seed: 9 }).goldG.quantiles;
  expect(first!.afterG[0] / after.p10).toBeCloseTo(1, 1);
  expect(first!.afterG[1] / after.p90).toBeCloseTo(1, 1);
});

test('two lines of a kind share its grade, and one question answers both', () => {
  const [first] = driversOf({ classCode: 'phone-boards' }, { classCode: 'phone-boards', massG: 5000 });
  expect(first?.lineId).toBeNull();
  expect(first?.question).toBe('Have a sample of the phone boards assayed');
});

test.each([
  [
    'Weigh line 1',
    { classCode: 'low-grade-boards', massEvidence: 'stated', assay: { gradeGPerT: 20, relativeSd: 0.01 } },
  ],
  ['Count the pieces of line 1', { classCode: 'card-modules' }],
  ['Have line 1 inspected', { classCode: 'package-tops', identityEvidence: 'stated' }],
  ['Count the contacts of one piece from line 1', { classCode: 'ceramic-processors' }],
  ['Measure the plated area on line 1', { classCode: 'fibre-processors-land' }],
] as [string, Partial<LineInput>][])('"%s" is asked where it would narrow the range', (question, given) => {
  expect(driversOf(given).map((driver) => driver.question)).toContain(question);
});

test('no measurement is expected to widen the range', () => {
  for (const { code } of catalogue20261.classes) {
    for (const { nowG, afterG, question } of driversOf({ classCode: code, identityEvidence: 'stated' })) {
      expect(afterG[1] / afterG[0], `${code}: ${question}`).toBeLessThanOrEqual((nowG[1] / nowG[0]) * 1.005);
    }
  }
});

test('a lot without spread or without gold has nothing to measure', () => {
  expect(driversOf({ massG: 0 })).toEqual([]);
  expect(driversOf()).toEqual([]);
});
