import { NumberParser } from '@internationalized/number';
import { LOCALE } from '../text/format-number.ts';

export interface ParsedNumber {
  value: number;
  /** True when the text reads differently elsewhere ("1,234") and the locale decided: echo such a figure. */
  isAmbiguous: boolean;
}

const GROUP_SPACES = /[\s\u00a0\u2009\u202f'’]/g;
const GROUPED = /^-?\d{1,3}(?:[.,]\d{3})+$/;

/** With one kind of separator, once, before three digits, only the reader's own habit can tell thousands from thousandths. */
const AMBIGUOUS = /^-?[1-9]\d{0,2}[.,]\d{3}$/;

function canonical(text: string, locale: string): { figure: string; isAmbiguous: boolean } {
  const lastComma = text.lastIndexOf(',');
  const lastPoint = text.lastIndexOf('.');
  if (lastComma < 0 && lastPoint < 0) return { figure: text, isAmbiguous: false };
  if (lastComma >= 0 && lastPoint >= 0) {
    const [group, decimal] = lastComma > lastPoint ? ['.', ','] : [',', '.'];
    const [whole = '', fraction = '', ...rest] = text.split(decimal);
    const isSound = rest.length === 0 && GROUPED.test(whole);
    return { figure: isSound ? `${whole.replaceAll(group, '')}.${fraction}` : text, isAmbiguous: false };
  }
  if (AMBIGUOUS.test(text)) {
    const separator = lastComma >= 0 ? ',' : '.';
    // A group separator is dropped by the locale's own parser, a decimal one is not.
    const isGroup = new NumberParser(locale).parse(`1${separator}000`) === 1000;
    return { figure: text.replace(separator, isGroup ? '' : '.'), isAmbiguous: true };
  }
  if (GROUPED.test(text) && !/^-?0/.test(text)) return { figure: text.replace(/[.,]/g, ''), isAmbiguous: false };
  return { figure: text.replace(',', '.'), isAmbiguous: false };
}

/**
 * Reads a typed figure in any of the usual ways of writing it: "1 234,5", "1,234.5", "1'234.5", "−3".
 * @returns null when the text is no figure
 */
export function parseNumber(text: string, locale: string = LOCALE): ParsedNumber | null {
  const bare = text.trim().replace(GROUP_SPACES, '').replace('\u2212', '-');
  const { figure, isAmbiguous } = canonical(bare, locale);
  if (!/^-?(?:\d+\.?\d*|\.\d+)$/.test(figure)) return null;
  return { value: Number(figure), isAmbiguous };
}

/**
 * Reads a typed amount of money as integer minor units; a currency sign or code is accepted and ignored.
 * @returns null when the text is no amount, is negative, has more than two decimals or passes 99 999 999 minor units
 */
export function parseMoneyMinor(text: string, locale: string = LOCALE): number | null {
  const parsed = parseNumber(text.replace(/^\s*(?:[$€£]|[A-Z]{3})\s*|\s*(?:[$€£]|[A-Z]{3})\s*$/g, ''), locale);
  if (!parsed || parsed.value < 0) return null;
  const minor = Math.round(parsed.value * 100);
  const isWhole = Math.abs(parsed.value * 100 - minor) < 1e-6;
  return isWhole && minor <= 99_999_999 ? minor : null;
}
