import { MINUS } from './characters.ts';

export const LOCALE = 'en-GB';

const formats = new Map<string, Intl.NumberFormat>();

/** Building a number format costs far more than using it, so each kind is built once. */
function numberFormat(options: Intl.NumberFormatOptions): Intl.NumberFormat {
  const key = JSON.stringify(options);
  let format = formats.get(key);
  if (!format) {
    format = new Intl.NumberFormat(LOCALE, options);
    formats.set(key, format);
  }
  return format;
}

/** A figure with grouped thousands and a true minus sign. Negative zero is written as zero. */
export function formatNumber(value: number, options: Intl.NumberFormatOptions = {}): string {
  return numberFormat(options)
    .format(value === 0 ? 0 : value)
    .replace('-', MINUS);
}

/** Rounds to the given significant digits as text: `formatSignificant(1234, 2)` is "1,200", `(0.0456, 2)` is "0.046". */
export function formatSignificant(value: number, digits: number): string {
  return formatNumber(value, {
    maximumSignificantDigits: digits,
    minimumSignificantDigits: Math.min(digits, 2),
  }).replace(/^(\D?)(\d+)\.0$/, '$1$2');
}
