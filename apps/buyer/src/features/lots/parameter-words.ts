import { quantileOf, type MaterialComponent, type Parameter, type Quantity } from '@lydite/valuation';
import { formatNumber } from '@lydite/ui';

const names: Record<string, readonly [name: string, unit: string]> = {
  pieceMassG: ['Mass of a piece', 'g'],
  share: ['Part that carries this gold', ''],
  areaCm2PerPiece: ['Plated area of a piece', 'cm²'],
  areaCm2PerG: ['Plated area per gram', 'cm²/g'],
  contactsPerPiece: ['Contacts of a piece', ''],
  padAreaMm2: ['Area of one contact', 'mm²'],
  coveredFraction: ['Covered part of the area', ''],
  thicknessUm: ['Thickness of the gold', 'µm'],
  densityGPerCm3: ['Density of the gold', 'g/cm³'],
  goldFraction: ['Gold in the plating', ''],
  sides: ['Sides', ''],
  wiresPerPiece: ['Bond wires of a piece', ''],
  lengthMm: ['Length of a wire', 'mm'],
  diameterUm: ['Diameter of a wire', 'µm'],
  gradeGPerT: ['Grade', 'g/t'],
  goldGPerPiece: ['Gold of a piece', 'g'],
};

const figure = (value: number): string => formatNumber(value, { maximumSignificantDigits: 3 });

/** A catalogue figure with its spread in words: "0.45 µm, 8 in 10 between 0.16 and 1.2". */
function quantityWords(quantity: Quantity, unit: string): string {
  const middle = `${figure(quantileOf(quantity, 0.5))}${unit && `\u00a0${unit}`}`;
  if (quantity.kind === 'exact') return middle;
  return `${middle}, 8 in 10 between ${figure(quantileOf(quantity, 0.1))} and ${figure(quantileOf(quantity, 0.9))}`;
}

export interface ParameterWords {
  key: string;
  name: string;
  value: string;
  source: string;
}

const toWords = (prefix: string, key: string, { quantity, source }: Parameter): ParameterWords => {
  const [name, unit] = names[key] ?? [key, ''];
  return { key: `${prefix}.${key}`, name, value: quantityWords(quantity, unit), source };
};

export const pieceMassWords = (pieceMassG: Parameter): ParameterWords => toWords('', 'pieceMassG', pieceMassG);

/** Every figure of a component as the catalogue has it, with its source. */
export const componentWords = ({ id, parameters }: MaterialComponent): ParameterWords[] =>
  Object.entries<Parameter>({ ...parameters }).map(([key, parameter]) => toWords(id, key, parameter));
