import * as ucum from '@lhncbc/ucum-lhc';
import {
  gradeUnits,
  lengthUnits,
  massUnits,
  platingStandards,
  toGrams,
  toGramsPerTonne,
  toMicrometres,
} from '@lydite/valuation';
import { fromLibrary, type PublishedValue } from './published-value.ts';

const oracle = ucum.UcumLhcUtils.getInstance();
const ucumValue = (code: string, target: string) => oracle.convertUnitTo(code, 1, target).toVal ?? Number.NaN;

const codes = {
  mass: { g: 'g', kg: 'kg', lb: '[lb_av]', oz: '[oz_av]', ozt: '[oz_tr]', dwt: '[pwt_tr]', gr: '[gr]' },
  length: { um: 'um', uin: 'u[in_i]', mm: 'mm', in: '[in_i]' },
  grade: { 'g/t': 'g/t', ppm: '[ppm]', 'mg/kg': 'mg/kg', 'g/kg': 'g/kg', 'ozt/ton': '[oz_tr]/[ston_av]' },
};
const byUcum = (what: string, code: string, unit: string, ours: () => number): PublishedValue => ({
  what,
  ...fromLibrary(ucumValue(code, unit)),
  unit,
  source: `UCUM ${code}, by @lhncbc/ucum-lhc`,
  ours,
});

const handbook = 'NIST Handbook 44, appendix C';
const exactly = { within: 0, source: handbook };
const mil = 'MIL-DTL-45204D, least thickness';
const astm = 'ASTM B488, least thickness';

const thicknessOf = (id: string) => () => platingStandards.find((each) => each.id === id)?.minimumUm ?? Number.NaN;

export const unitValues: PublishedValue[] = [
  { what: 'troy ounce', published: '31.1034768', unit: 'g', ours: () => toGrams(1, 'ozt'), ...exactly },
  { what: 'pennyweight', published: '1.55517384', unit: 'g', ours: () => toGrams(1, 'dwt'), ...exactly },
  { what: 'grain', published: '0.06479891', unit: 'g', ours: () => toGrams(1, 'gr'), ...exactly },
  { what: 'avoirdupois ounce', published: '28.349523125', unit: 'g', ours: () => toGrams(1, 'oz'), ...exactly },
  { what: 'avoirdupois pound', published: '453.59237', unit: 'g', ours: () => toGrams(1, 'lb'), ...exactly },
  { what: 'micro-inch', published: '0.0254', unit: 'µm', ours: () => toMicrometres(1, 'uin'), ...exactly },
  {
    what: 'mil',
    published: '25.4',
    unit: 'µm',
    ours: () => toMicrometres(0.001, 'in'),
    source: handbook,
    within: 1e-12,
  },
  {
    what: 'square inch',
    published: '645.16',
    unit: 'mm²',
    source: handbook,
    ours: () => (toMicrometres(1, 'in') / 1000) ** 2,
  },
  {
    what: 'troy ounce per short ton',
    published: '34.285714',
    unit: 'g/t',
    source: `${handbook}: 31.1034768 g in 907.18474 kg, 240/7`,
    ours: () => toGramsPerTonne(1, 'ozt/ton'),
  },
  {
    what: 'copper foil, 1 oz/ft²',
    published: '305.1517',
    unit: 'g/m²',
    source: 'UCUM [oz_av]/[sft_i], recomputed',
    ours: () => toGrams(1, 'oz') / (toMicrometres(12, 'in') * 1e-6) ** 2,
  },
  ...massUnits.map(({ id, name }) => byUcum(name, codes.mass[id], 'g', () => toGrams(1, id))),
  ...lengthUnits.map(({ id, name }) => byUcum(name, codes.length[id], 'um', () => toMicrometres(1, id))),
  ...gradeUnits.map(({ id, name }) => byUcum(name, codes.grade[id], 'g/t', () => toGramsPerTonne(1, id))),
  ...['20', '30', '50', '100', '200', '300', '500', '1500'].map((uin, i): PublishedValue => {
    const id = `mil-${['00', '0', '1', '2', '3', '4', '5', '6'][i]}`;
    return { what: id, published: uin, unit: 'µin', source: mil, ours: () => thicknessOf(id)() / 0.0254, within: 1e-9 };
  }),
  ...['0.25', '0.5', '0.75', '1', '1.25', '2.5', '5'].map((um): PublishedValue => {
    const id = `astm-${um}`;
    return { what: id, published: um, unit: 'µm', source: astm, ours: thicknessOf(id), within: 0 };
  }),
];
