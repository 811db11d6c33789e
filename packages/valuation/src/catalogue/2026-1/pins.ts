import type { MaterialClass, Parameter, PlatingComponent } from '../catalogue.types.ts';
import { pinHazards } from './hazards.ts';
import { between, fixed, hardDeposit, ln } from './parameters.ts';

/** Surface of a gram of square pin: 4 / (density · side). */
const pinAreaCm2PerG = 4 / (8.5 * 0.064);

const plating = (extra: { coveredFraction?: Parameter; share?: Parameter }): PlatingComponent => ({
  kind: 'plating',
  id: 'plating',
  name: 'gold-plated pins',
  parameters: {
    areaCm2PerG: fixed(pinAreaCm2PerG, 'modelled: square brass pin of 0.64 mm at 8.5 g/cm³'),
    thicknessUm: ln(0.4, 1.9, 'ASTM B488 classes 0.25 to 0.75 µm; median and spread assumed'),
    ...hardDeposit,
    ...extra,
  },
});

const selective = between(0.15, 0.35, 'assumed: gold on the mating end only');

export const pinClasses: MaterialClass[] = [
  {
    code: 'pins-full',
    name: 'Contact pins, plated all over',
    group: 'pins',
    unit: { one: 'fully plated pin', many: 'fully plated pins' },
    hazards: pinHazards,
    pieceMassG: null,
    components: [plating({})],
  },
  {
    code: 'pins-selective',
    name: 'Contact pins, selectively plated',
    group: 'pins',
    unit: { one: 'selectively plated pin', many: 'selectively plated pins' },
    hazards: pinHazards,
    pieceMassG: null,
    components: [plating({ coveredFraction: selective })],
  },
  {
    code: 'connectors',
    name: 'Gold-plated connectors, whole',
    group: 'pins',
    unit: { one: 'connector', many: 'connectors' },
    hazards: pinHazards,
    pieceMassG: null,
    components: [
      plating({
        coveredFraction: selective,
        share: between(0.1, 0.3, 'assumed: pins in the mass of a whole connector, the rest is plastic'),
      }),
    ],
  },
];
