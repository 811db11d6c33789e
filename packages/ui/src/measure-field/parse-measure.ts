import { NBSP } from '../text/characters.ts';
import { formatNumber, LOCALE } from '../text/format-number.ts';
import { inWords } from './in-words.ts';
import { parseNumber } from './parse-number.ts';
import { findUnit, type MeasureKind, type MeasureUnit } from './units.ts';

export interface Measure {
  /** In the kind's base unit: g, µm, mm, cm² or g/t. */
  value: number;
  /** What was typed, kept beside the value. */
  text: string;
  /** Unit the figure was entered in; a typed unit wins over the selected one. */
  unit: string;
  /** The reading in a second unit, or spelt out where it could be misread. */
  echo: string | null;
}

interface MeasureInput {
  kind: MeasureKind;
  /** The selected unit, used when none is typed. */
  unit: string;
  locale?: string;
}

/** A figure and the unit behind it; digits and letters never share a part. */
const PART = /([\d.,'’\s\u00a0\u2009\u202f−-]*\d)\s*([a-zµμ"²/][a-zµμ"²/.\d ]*?)?(?=\s*(?:[\d−-]|$))/giy;

const significant = (value: number) => formatNumber(value, { maximumSignificantDigits: 3 });

interface Part {
  value: number;
  unit: MeasureUnit;
  isAmbiguous: boolean;
}

function partsOf(text: string, { kind, unit, locale = LOCALE }: MeasureInput): Part[] | null {
  const parts: Part[] = [];
  PART.lastIndex = 0;
  while (PART.lastIndex < text.length) {
    const match = PART.exec(text);
    if (!match) return null;
    const [, figure = '', typed] = match;
    const parsed = parseNumber(figure, locale);
    const found = findUnit(kind, typed ?? unit);
    if (!parsed || !found) return null;
    parts.push({ value: parsed.value, unit: found, isAmbiguous: parsed.isAmbiguous });
  }
  return parts;
}

function echoOf(value: number, { unit, isAmbiguous, value: figure }: Part, kind: MeasureKind): string | null {
  if (isAmbiguous)
    return `${formatNumber(figure, { maximumFractionDigits: 3 })}${NBSP}${unit.label}, ${inWords(figure)}`;
  const second = unit.echo ? findUnit(kind, unit.echo) : undefined;
  return second && value !== 0 ? `${significant(value / second.perUnit)}${NBSP}${second.label}` : null;
}

/**
 * Reads a typed measure: "1 234,5", "12.4 kg", "27 lb 5 oz".
 * @returns null when the text is no such measure or is negative
 */
export function parseMeasure(text: string, input: MeasureInput): Measure | null {
  const trimmed = text.trim();
  const parts = partsOf(trimmed, input);
  const [first] = parts ?? [];
  if (!parts || !first) return null;
  // Parts of one measure get smaller: "27 lb 5 oz", never "5 oz 27 lb", which is a slip.
  const isFalling = parts.every(({ unit }, i) => i === 0 || unit.perUnit < (parts[i - 1]?.unit.perUnit ?? 0));
  const value = parts.reduce((sum, part) => sum + part.value * part.unit.perUnit, 0);
  if (!isFalling || parts.some((part) => part.value < 0)) return null;
  return { value, text: trimmed, unit: first.unit.id, echo: echoOf(value, first, input.kind) };
}

/** A figure in another unit, rounded to what the eye can use, for "Convert 12 lb to 5.44 kg?". */
export function convertText(value: number, unit: MeasureUnit): string {
  return formatNumber(value / unit.perUnit, { maximumSignificantDigits: 4 });
}
