export type MeasureKind = 'mass' | 'gold' | 'plating' | 'length' | 'area' | 'grade';

export interface MeasureUnit {
  id: string;
  label: string;
  /** How many base units one of it is; exact by definition of the unit. */
  perUnit: number;
  /** Other ways of typing it, lower case. */
  aliases: readonly string[];
  /** Unit the reading is echoed in. */
  echo: string | null;
}

const G_PER_LB = 453.59237;
const G_PER_OZT = 31.1034768;

const g: MeasureUnit = { id: 'g', label: 'g', perUnit: 1, aliases: ['gram', 'grams', 'gr.', 'gm'], echo: 'oz' };
const ozt: MeasureUnit = {
  id: 'ozt',
  label: 'ozt',
  perUnit: G_PER_OZT,
  aliases: ['ozt.', 'oz t', 'troy oz', 'troy ounces'],
  echo: 'g',
};

/** Base units: grams, micrometres (plating), millimetres (length), square centimetres (area), grams per tonne. */
const units: Record<MeasureKind, readonly MeasureUnit[]> = {
  mass: [
    { id: 'kg', label: 'kg', perUnit: 1000, aliases: ['kilo', 'kilos', 'kgs', 'kilogram', 'kilograms'], echo: 'lb' },
    g,
    { id: 'lb', label: 'lb', perUnit: G_PER_LB, aliases: ['lbs', 'pound', 'pounds', 'lb.'], echo: 'kg' },
    { id: 'oz', label: 'oz (avdp)', perUnit: G_PER_LB / 16, aliases: ['ounce', 'ounces', 'oz.'], echo: 'g' },
    { ...ozt, label: 'ozt (troy)' },
  ],
  gold: [
    { ...g, echo: 'ozt' },
    ozt,
    { id: 'dwt', label: 'dwt', perUnit: 1.55517384, aliases: ['pennyweight'], echo: 'g' },
  ],
  plating: [
    { id: 'um', label: 'µm', perUnit: 1, aliases: ['µm', 'μm', 'micron', 'microns'], echo: 'uin' },
    { id: 'uin', label: 'µin', perUnit: 0.0254, aliases: ['µin', 'μin', 'microinch', 'microinches', 'µ"'], echo: 'um' },
  ],
  length: [
    { id: 'mm', label: 'mm', perUnit: 1, aliases: [], echo: 'in' },
    { id: 'cm', label: 'cm', perUnit: 10, aliases: [], echo: 'in' },
    { id: 'in', label: 'in', perUnit: 25.4, aliases: ['inch', 'inches', '"'], echo: 'mm' },
  ],
  area: [
    { id: 'cm2', label: 'cm²', perUnit: 1, aliases: ['cm²', 'sq cm'], echo: 'in2' },
    { id: 'mm2', label: 'mm²', perUnit: 0.01, aliases: ['mm²', 'sq mm'], echo: 'cm2' },
    { id: 'in2', label: 'in²', perUnit: 6.4516, aliases: ['in²', 'sq in'], echo: 'cm2' },
  ],
  grade: [
    { id: 'g/t', label: 'g/t', perUnit: 1, aliases: ['gpt'], echo: null },
    { id: 'ppm', label: 'ppm', perUnit: 1, aliases: ['mg/kg'], echo: 'g/t' },
    {
      id: 'ozt/ton',
      label: 'ozt per short ton',
      perUnit: G_PER_OZT / 0.90718474,
      aliases: ['oz/ton', 'opt'],
      echo: 'g/t',
    },
  ],
};

/** The units a kind of measure is entered in, the usual one first. */
export function unitsOf(kind: MeasureKind): readonly MeasureUnit[] {
  return units[kind];
}

/** Finds a unit by its id or by any way of typing it. */
export function findUnit(kind: MeasureKind, typed: string): MeasureUnit | undefined {
  const wanted = typed.trim().toLowerCase();
  return units[kind].find(({ id, aliases }) => id === wanted || aliases.includes(wanted));
}
