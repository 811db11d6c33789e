import type { MaterialClass } from '../catalogue.types.ts';
import { boardHazards, edgeHazards } from './hazards.ts';
import { hardDeposit, ln, weighedPieces } from './parameters.ts';

export const edgeClasses: MaterialClass[] = [
  {
    code: 'edge-contacts',
    name: 'Edge contacts, trimmed',
    group: 'edge',
    unit: { one: 'trimmed edge contact', many: 'trimmed edge contacts' },
    hazards: edgeHazards,
    pieceMassG: null,
    components: [
      {
        kind: 'plating',
        id: 'plating',
        name: 'gold contacts',
        parameters: {
          areaCm2PerG: ln(
            2.4,
            1.25,
            'modelled: lands of 1.6 mm board at 1.85 g/cm³ (NEMA FR4), trimmed close to the gold',
          ),
          thicknessUm: ln(
            0.6,
            1.9,
            'common practice, no source: 50–60 µin on older contacts; median and spread assumed',
          ),
          ...hardDeposit,
        },
      },
    ],
  },
  {
    code: 'memory-modules',
    name: 'Memory modules, gold contacts',
    group: 'edge',
    unit: { one: 'memory module', many: 'memory modules' },
    hazards: boardHazards,
    pieceMassG: ln(22, 1.3, weighedPieces),
    components: [
      {
        kind: 'plating',
        id: 'plating',
        name: 'gold contacts',
        parameters: {
          areaCm2PerPiece: ln(4.8, 1.15, 'modelled: 168 to 288 contacts along 133.35 mm, both sides (not verified)'),
          thicknessUm: ln(
            0.45,
            2.2,
            'common practice, no source: 50–60 µin on older modules; flash on later ones, assumed',
          ),
          ...hardDeposit,
        },
      },
      {
        kind: 'grade',
        id: 'grade',
        name: 'chips and board',
        parameters: {
          gradeGPerT: ln(500, 1.6, 'assumed: bonded chips on a small board, above the range of whole boards'),
        },
      },
    ],
  },
  {
    code: 'expansion-cards',
    name: 'Expansion cards',
    group: 'edge',
    unit: { one: 'expansion card', many: 'expansion cards' },
    hazards: boardHazards,
    pieceMassG: ln(130, 1.5, weighedPieces),
    components: [
      {
        kind: 'plating',
        id: 'plating',
        name: 'gold contacts',
        parameters: {
          areaCm2PerPiece: ln(
            4.5,
            1.5,
            'modelled: PCIe x4 1.91, x8 2.93, x16 4.92 cm² (KiCad Connector_PCBEdge); older buses longer',
          ),
          thicknessUm: ln(
            0.5,
            1.9,
            'IPC-6012 class 1 and 2: 0.8 µm (not verified); common practice, no source: 50–60 µin when older',
          ),
          ...hardDeposit,
        },
      },
      {
        kind: 'grade',
        id: 'grade',
        name: 'chips and board',
        parameters: {
          gradeGPerT: ln(110, 1.8, 'assumed: lower half of the eight literature sets for boards (review, 2022)'),
        },
      },
    ],
  },
];
