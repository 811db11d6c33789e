import type { MaterialClass } from '../catalogue.types.ts';
import { ceramicHazards, packageHazards } from './hazards.ts';
import { fixed, ln, pureDensity, pureDeposit, weighedPieces } from './parameters.ts';

/** Side of a round pin in mm². */
const pinAreaMm2 = (diameterMm: number, lengthMm: number) => Math.PI * diameterMm * lengthMm;

export const processorClasses: MaterialClass[] = [
  {
    code: 'ceramic-processors',
    name: 'Ceramic processors, pinned',
    group: 'processors',
    unit: { one: 'ceramic processor', many: 'ceramic processors' },
    hazards: ceramicHazards,
    pieceMassG: ln(28, 1.35, weighedPieces),
    components: [
      {
        kind: 'plating',
        id: 'plating',
        name: 'gold-plated pins',
        parameters: {
          contactsPerPiece: ln(270, 1.25, 'assumed: pins of the ceramic generations, 168 to 387'),
          padAreaMm2: fixed(pinAreaMm2(0.46, 3.2), 'modelled: round pin of 0.46 mm, 3.2 mm long'),
          thicknessUm: ln(1.2, 1.4, 'MIL-DTL-45204D class 1, 50 µin minimum (1.27 µm); spread assumed'),
          ...pureDeposit,
        },
      },
      {
        kind: 'perPiece',
        id: 'inside',
        name: 'lid, cavity and die attach',
        parameters: { goldGPerPiece: ln(0.045, 1.8, 'assumed') },
      },
    ],
  },
  {
    code: 'fibre-processors-pinned',
    name: 'Fibre processors, pinned',
    group: 'processors',
    unit: { one: 'pinned fibre processor', many: 'pinned fibre processors' },
    hazards: packageHazards,
    pieceMassG: ln(24, 1.3, weighedPieces),
    components: [
      {
        kind: 'plating',
        id: 'plating',
        name: 'gold-plated pins',
        parameters: {
          contactsPerPiece: ln(600, 1.35, 'assumed: pins of the fibre generations, 321 to 1 331'),
          padAreaMm2: fixed(pinAreaMm2(0.31, 2), 'modelled: round pin of 0.31 mm, 2.0 mm long'),
          thicknessUm: ln(0.25, 1.7, 'ASTM B488 class 0.25 µm; spread assumed'),
          ...pureDeposit,
        },
      },
      {
        kind: 'perPiece',
        id: 'inside',
        name: 'inside the package',
        parameters: { goldGPerPiece: ln(0.006, 1.8, 'assumed') },
      },
    ],
  },
  {
    code: 'fibre-processors-land',
    name: 'Fibre processors, land pads',
    group: 'processors',
    unit: { one: 'land-pad processor', many: 'land-pad processors' },
    hazards: packageHazards,
    pieceMassG: ln(26, 1.35, weighedPieces),
    components: [
      {
        kind: 'finish',
        id: 'finish',
        name: 'gold land pads',
        parameters: {
          areaCm2PerPiece: ln(6, 1.4, 'modelled: about 775 to 1 700 lands of 0.5 mm²; spread assumed'),
          thicknessUm: ln(0.15, 1.7, 'IPC-4552 typical 0.075–0.125 µm, thicker on contact lands; assumed'),
          ...pureDensity,
        },
      },
      {
        kind: 'perPiece',
        id: 'inside',
        name: 'inside the package',
        parameters: { goldGPerPiece: ln(0.003, 2, 'assumed') },
      },
    ],
  },
];
