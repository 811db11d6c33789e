import { expect, test } from 'vitest';
import { quantileOf } from '../quantity/quantile.ts';
import { assayQuantity, countQuantity, identityQuantity, massQuantity, thicknessQuantity } from './evidence.ts';
import { line } from './line.fixture.ts';

test.each([
  ['stated', 1.25],
  ['photographed', 1.12],
  ['inspected', 1.05],
] as const)('a %s class is doubted by a factor of %s', (identityEvidence, gsd) => {
  expect(identityQuantity(line({ identityEvidence }))).toEqual({ kind: 'lognormal', median: 1, gsd });
});

test('who counted every piece has seen what it is', () => {
  const counted = line({ identityEvidence: 'stated', pieces: 40, countEvidence: 'counted' });
  expect(identityQuantity(counted)).toEqual({ kind: 'lognormal', median: 1, gsd: 1.05 });
});

test('a weighed mass is uniform over the scale’s resolution, a stated one within 5 %', () => {
  expect(massQuantity(2000, line({ scaleResolutionG: 10 }))).toEqual({ kind: 'uniform', lo: 1995, hi: 2005 });
  expect(massQuantity(2000, line({ massEvidence: 'stated' }))).toEqual({ kind: 'uniform', lo: 1900, hi: 2100 });
  expect(massQuantity(2, line({ scaleResolutionG: 10 }))).toEqual({ kind: 'uniform', lo: 0, hi: 7 });
});

test('a scale of unknown resolution is trusted to the weighing tolerance', () => {
  expect(massQuantity(2000, line({ scaleResolutionG: null }))).toEqual({ kind: 'uniform', lo: 1990, hi: 2010 });
});

test('a count is exact when counted, within 1 % on the photo, within 5 % when stated', () => {
  expect(countQuantity(100, { countEvidence: 'counted' })).toEqual({ kind: 'exact', value: 100 });
  expect(countQuantity(100, { countEvidence: 'counted-on-photo' })).toEqual({ kind: 'uniform', lo: 99, hi: 101 });
  expect(countQuantity(100, { countEvidence: 'stated' })).toEqual({ kind: 'uniform', lo: 95, hi: 105 });
});

test('thickness follows a standard’s minimum, the range given, or the reading', () => {
  expect(thicknessQuantity({ kind: 'standard', minimumUm: 1 })).toEqual({ kind: 'uniform', lo: 1, hi: 1.6 });
  expect(thicknessQuantity({ kind: 'range', leastUm: 0.2, mostUm: 0.5 })).toEqual({
    kind: 'uniform',
    lo: 0.2,
    hi: 0.5,
  });
  expect(thicknessQuantity({ kind: 'xrf', thicknessUm: 2 })).toEqual({ kind: 'normal', mean: 2, sd: 0.1 });
});

test('an assay spreads around its result by the sd it was given', () => {
  const quantity = assayQuantity({ gradeGPerT: 500, relativeSd: 0.04 });
  expect(quantileOf(quantity, 0.5)).toBeCloseTo(500, 9);
  expect(quantileOf(quantity, 0.8413447) / 500).toBeCloseTo(1.0408, 3);
  expect(assayQuantity({ gradeGPerT: 0, relativeSd: 0.04 })).toEqual({ kind: 'exact', value: 0 });
});
