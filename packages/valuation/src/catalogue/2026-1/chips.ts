import type { BondWireComponent, MaterialClass } from '../catalogue.types.ts';
import { packageHazards } from './hazards.ts';
import { between, fixed, goldWire, ln, pureDensity, weighedPieces } from './parameters.ts';

/** Wires of a ball-grid package; its stripped top keeps all of them. */
const ballGridWires: BondWireComponent = {
  kind: 'bondWire',
  id: 'bondWire',
  name: 'bond wires',
  parameters: {
    wiresPerPiece: ln(
      420,
      1.35,
      'common practice, no source: 8 g of gold a kilogram of stripped tops; modelled from it',
    ),
    lengthMm: ln(3, 1.25, 'assumed: loop from die to substrate'),
    diameterUm: fixed(25, goldWire),
    ...pureDensity,
  },
};

export const chipClasses: MaterialClass[] = [
  {
    code: 'wire-bonded-packages',
    name: 'Wire-bonded ball-grid packages, whole',
    group: 'chips',
    unit: { one: 'ball-grid package', many: 'ball-grid packages' },
    hazards: packageHazards,
    pieceMassG: ln(3.2, 1.4, weighedPieces),
    components: [
      ballGridWires,
      {
        kind: 'finish',
        id: 'finish',
        name: 'gold on the substrate',
        parameters: {
          areaCm2PerPiece: ln(0.9, 1.4, 'modelled: bond fingers and ball lands; spread assumed'),
          thicknessUm: ln(0.5, 1.5, 'assumed: bondable soft gold'),
          ...pureDensity,
        },
      },
    ],
  },
  {
    code: 'package-tops',
    name: 'Stripped package tops',
    group: 'chips',
    unit: { one: 'package top', many: 'package tops' },
    hazards: packageHazards,
    pieceMassG: ln(1.7, 1.35, weighedPieces),
    components: [ballGridWires],
  },
  {
    code: 'plastic-chips',
    name: 'Leaded plastic chips',
    group: 'chips',
    unit: { one: 'plastic chip', many: 'plastic chips' },
    hazards: packageHazards,
    pieceMassG: ln(0.55, 1.6, weighedPieces),
    components: [
      {
        kind: 'bondWire',
        id: 'bondWire',
        name: 'bond wires',
        parameters: {
          wiresPerPiece: ln(44, 1.6, 'assumed: one wire a lead, 8 to 208 leads'),
          lengthMm: ln(
            2.2,
            1.25,
            'modelled: 20 wires of 2.04 mm in a TSSOP20 (maker’s material declaration, 0.399988 mg)',
          ),
          diameterUm: fixed(25, goldWire),
          ...pureDensity,
          share: between(0.3, 1, 'assumed: share of gold-wired pieces; with copper wire of the order of 1 g/t'),
        },
      },
    ],
  },
  {
    code: 'card-modules',
    name: 'SIM and smart-card modules, cut out',
    group: 'chips',
    unit: { one: 'card module', many: 'card modules' },
    hazards: packageHazards,
    pieceMassG: ln(0.065, 1.3, weighedPieces),
    components: [
      {
        kind: 'finish',
        id: 'finish',
        name: 'gold contact field',
        parameters: {
          areaCm2PerPiece: ln(1.1, 1.2, 'modelled: contact field of a card module, about 13 × 12 mm less its gaps'),
          thicknessUm: ln(0.08, 1.8, 'IPC-4552: 0.05 µm at least, typical 0.075–0.125 µm; spread assumed'),
          ...pureDensity,
        },
      },
      {
        kind: 'bondWire',
        id: 'bondWire',
        name: 'bond wires',
        parameters: {
          wiresPerPiece: fixed(6, 'assumed: six of eight contacts bonded'),
          lengthMm: fixed(1.5, 'assumed: loop from die to contact'),
          diameterUm: fixed(25, goldWire),
          ...pureDensity,
        },
      },
    ],
  },
];
