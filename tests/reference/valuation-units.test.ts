import * as ucum from '@lhncbc/ucum-lhc';
import {
  fromGrams,
  gradeUnits,
  lengthUnits,
  massUnits,
  platingStandards,
  toGrams,
  toGramsPerTonne,
  toMicrometres,
} from '@lydite/valuation';
import { expect, test } from 'vitest';

const oracle = ucum.UcumLhcUtils.getInstance();

/** What the UCUM library of the U.S. National Library of Medicine makes of one unit. */
function ucumValue(code: string, target: string): number {
  const { status, toVal } = oracle.convertUnitTo(code, 1, target);
  if (status !== 'succeeded' || toVal === null) throw new Error(`${code} to ${target}: ${status}`);
  return toVal;
}

const massCodes = { g: 'g', kg: 'kg', lb: '[lb_av]', oz: '[oz_av]', ozt: '[oz_tr]', dwt: '[pwt_tr]', gr: '[gr]' };
const lengthCodes = { um: 'um', uin: 'u[in_i]', mm: 'mm', in: '[in_i]' };
const gradeCodes = { 'g/t': 'g/t', ppm: '[ppm]', 'mg/kg': 'mg/kg', 'g/kg': 'g/kg', 'ozt/ton': '[oz_tr]/[ston_av]' };

test.each(massUnits)('a $name is what UCUM says', ({ id }) => {
  expect(toGrams(1, id) / ucumValue(massCodes[id], 'g')).toBeCloseTo(1, 13);
});

test.each(lengthUnits)('$name are what UCUM says', ({ id }) => {
  expect(toMicrometres(1, id) / ucumValue(lengthCodes[id], 'um')).toBeCloseTo(1, 13);
});

test.each(gradeUnits)('$name are what UCUM says', ({ id }) => {
  expect(toGramsPerTonne(1, id) / ucumValue(gradeCodes[id], 'g/t')).toBeCloseTo(1, 13);
});

// NIST Handbook 44, appendix C: exact values.
test.each([
  ['ozt', 31.1034768],
  ['dwt', 1.55517384],
  ['gr', 0.064_798_91],
  ['oz', 28.349_523_125],
  ['lb', 453.592_37],
] as const)('one %s is %s g exactly', (unit, grams) => {
  expect(toGrams(1, unit)).toBe(grams);
});

test('a troy ounce is 20 pennyweights and 480 grains', () => {
  expect(fromGrams(toGrams(1, 'ozt'), 'dwt')).toBeCloseTo(20, 12);
  expect(fromGrams(toGrams(1, 'ozt'), 'gr')).toBeCloseTo(480, 12);
});

test('one troy ounce per short ton is 240/7 g/t (arithmetic on NIST Handbook 44: 31.1034768 g in 907.18474 kg)', () => {
  expect(toGramsPerTonne(1, 'ozt/ton')).toBeCloseTo((31.1034768 / 907.184_74) * 1000, 10);
  expect(toGramsPerTonne(1, 'ozt/ton')).toBeCloseTo(34.285_714, 6);
});

test('a micro-inch is 0.0254 µm and a mil 25.4 µm (NIST Handbook 44)', () => {
  expect(toMicrometres(1, 'uin')).toBe(0.0254);
  expect(toMicrometres(0.001, 'in')).toBeCloseTo(25.4, 12);
});

test('plating classes are those of MIL-DTL-45204D in µin and of ASTM B488 in µm', () => {
  const of = (prefix: string) =>
    platingStandards.filter(({ id }) => id.startsWith(prefix)).map(({ minimumUm }) => minimumUm);
  expect(of('mil').map((um) => Math.round(um / 0.0254))).toEqual([20, 30, 50, 100, 200, 300, 500, 1500]);
  expect(of('astm')).toEqual([0.25, 0.5, 0.75, 1, 1.25, 2.5, 5]);
});
