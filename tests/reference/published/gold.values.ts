import {
  bondWireGold,
  catalogue20261,
  estimateLot,
  fromGrams,
  gradedGold,
  platedGold,
  quantileOf,
  toMicrometres,
} from '@lydite/valuation';
import { kilogram } from './kilogram.ts';
import type { PublishedInside, PublishedValue } from './published-value.ts';

const plated = (areaMm2: number, thicknessUin: number) =>
  platedGold({
    areaCm2: areaMm2 / 100,
    thicknessUm: toMicrometres(thicknessUin, 'uin'),
    densityGPerCm3: 19.32,
    goldFraction: 1,
    wear: 0,
  });
const wire = (wires: number, lengthMm: number, diameterUm: number) =>
  bondWireGold({ wires, lengthMm, diameterUm, densityGPerCm3: 19.32 });

const kicad = 'KiCad footprint library, Connector_PCBEdge; gold at 19.32 g/cm³ recomputed';
const perArea = 'ASTM B488: mass per area is thickness × density; at 19.32 g/cm³ recomputed';
const declaration = 'maker’s material declaration, TSSOP20 with gold wire (NXP S9S08SL16F1CTJ)';
const holgersson = 'Holgersson, Steenari, Björkman, Cullbrand 2018, Resour. Conserv. Recycl. 133:300–308';

export const goldValues: PublishedValue[] = [
  {
    what: 'gold 1 µm thick',
    published: '1.932',
    unit: 'mg/cm²',
    source: perArea,
    ours: () => plated(100, 1 / 0.0254) * 1e3,
  },
  {
    what: 'gold 30 µin thick',
    published: '1.472184',
    unit: 'mg/cm²',
    source: perArea,
    ours: () => plated(100, 30) * 1e3,
  },
  {
    what: 'gold 50 µin thick',
    published: '2.453640',
    unit: 'mg/cm²',
    source: perArea,
    ours: () => plated(100, 50) * 1e3,
  },
  {
    what: 'PCIe x16 edge at 30 µin',
    published: '7.245',
    unit: 'mg',
    source: kicad,
    ours: () => plated(492.1, 30) * 1e3,
  },
  { what: 'PCIe x16 edge at 2 µin', published: '0.483', unit: 'mg', source: kicad, ours: () => plated(492.1, 2) * 1e3 },
  { what: '1 000 PCIe x16 edges', published: '7.245', unit: 'g', source: kicad, ours: () => 1000 * plated(492.1, 30) },
  {
    what: '1 000 PCIe x16 edges',
    published: '0.2329',
    unit: 'ozt',
    source: kicad,
    ours: () => fromGrams(1000 * plated(492.1, 30), 'ozt'),
  },
  {
    what: 'bond wire of 25.4 µm',
    published: '9.790',
    unit: 'µg/mm',
    source: 'cylinder at 19.32 g/cm³, recomputed',
    ours: () => wire(1, 1, 25.4) * 1e6,
  },
  {
    what: 'bond wire of 25 µm',
    published: '9.484',
    unit: 'µg/mm',
    source: 'cylinder at 19.32 g/cm³, recomputed',
    ours: () => wire(1, 1, 25) * 1e6,
  },
  {
    what: 'TSSOP20, 20 wires of 2.04 mm',
    published: '0.399988',
    unit: 'mg',
    source: `${declaration}; to 0.2 %, the wire’s length is a round figure`,
    ours: () => wire(20, 2.04, 25.4) * 1e3,
    within: 0.0008,
  },
  {
    what: 'TSSOP20, gold of its mass',
    published: '0.399988',
    unit: 'mg',
    source: `${declaration}: 5 098.6 g/t of 78.450028 mg; the grade has five figures`,
    ours: () => gradedGold({ massG: 0.078450028, gradeGPerT: 5098.6 }) * 1e3,
    within: 0.000005,
  },
  {
    what: 'mobile phone of 90 g at 266.7 g/t',
    published: '24',
    unit: 'mg',
    source: 'Hagelüken & Buchert 2008, in Buchert et al., Öko-Institut 2012',
    ours: () => gradedGold({ massG: 90, gradeGPerT: 266.7 }) * 1e3,
  },
  ...(
    [
      ['feature phones', 1051, '220.7'],
      ['smartphones', 1083, '227.4'],
    ] as const
  ).map(([what, gradeGPerT, published]): PublishedValue => ({
    what: `${what}: boards are 21 % of the device`,
    published,
    unit: 'g/t',
    source: `${holgersson}, recomputed`,
    ours: () => gradedGold({ massG: 0.21e6, gradeGPerT }),
  })),
];

const gradeRange = (classCode: string) => (): [number, number] => {
  const { p01, p99 } = estimateLot({ lines: [kilogram(classCode)] }, catalogue20261, { seed: 1 }).gradeGPerT;
  return [p01, p99];
};
const grade = (classCode: string, published: number, source: string): PublishedInside => ({
  what: classCode,
  published,
  unit: 'g/t',
  source,
  range: gradeRange(classCode),
});

const thickness = (classCode: string, published: number): PublishedInside => ({
  what: `${classCode}, plating`,
  published,
  unit: 'µin',
  source: 'common practice, no source: older contacts carry 50–60 µin',
  range: () => {
    const plating = catalogue20261.classes
      .find(({ code }) => code === classCode)
      ?.components.find(({ kind }) => kind === 'plating');
    if (plating?.kind !== 'plating') throw new Error(`${classCode} is not plated`);
    const { quantity } = plating.parameters.thicknessUm;
    return [quantileOf(quantity, 0.01) / 0.0254, quantileOf(quantity, 0.99) / 0.0254];
  },
});

export const goldInside: PublishedInside[] = [
  grade('network-boards', 199, `${holgersson}: router, modem, hub boards, n = 10`),
  grade('phone-boards', 1051, `${holgersson}: feature-phone boards, n = 30`),
  grade('phone-boards', 1083, `${holgersson}: smartphone boards, n = 30`),
  grade('phone-boards', 475, 'Laubertová et al., Metall. Mater. Eng.: mobile-phone boards'),
  grade('phone-boards', 90, 'Vats & Singh 2015, Waste Management 45:280–288, least'),
  grade('phone-boards', 170, 'Vats & Singh 2015, Waste Management 45:280–288, most'),
  grade('mixed-boards', 68, 'review of eight sets, Adv. Mater. Sci. Eng. 2022, 6550089, Table 1, least'),
  grade('phone-boards', 1000, 'review of eight sets, Adv. Mater. Sci. Eng. 2022, 6550089, Table 1, most'),
  grade('plastic-chips', 5098.6, declaration),
  grade('package-tops', 8000, 'common practice, no source: 8 g of gold a kilogram'),
  grade('package-tops', (0.6 / 75) * 1e6, 'common practice, no source: 0.6 g from 75 g'),
  thickness('memory-modules', 50),
  thickness('memory-modules', 60),
  thickness('expansion-cards', 50),
  thickness('expansion-cards', 60),
];
