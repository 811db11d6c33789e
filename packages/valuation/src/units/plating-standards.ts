import { toMicrometres } from './length.ts';

export interface PlatingStandard {
  id: string;
  /** How the drawing or the data sheet names it. */
  name: string;
  minimumUm: number;
}

const milClass = (name: string, minimumUin: number): PlatingStandard => ({
  id: `mil-${name}`,
  name: `MIL-DTL-45204D class ${name}, ${minimumUin} µin`,
  minimumUm: toMicrometres(minimumUin, 'uin'),
});
const astmClass = (minimumUm: number): PlatingStandard => ({
  id: `astm-${minimumUm}`,
  name: `ASTM B488 class ${minimumUm}`,
  minimumUm,
});

/** Classes of gold plating with the least thickness each demands. Sources: MIL-DTL-45204D; ASTM B488. */
export const platingStandards: readonly PlatingStandard[] = [
  milClass('00', 20),
  milClass('0', 30),
  milClass('1', 50),
  milClass('2', 100),
  milClass('3', 200),
  milClass('4', 300),
  milClass('5', 500),
  milClass('6', 1500),
  ...[0.25, 0.5, 0.75, 1, 1.25, 2.5, 5].map(astmClass),
];
