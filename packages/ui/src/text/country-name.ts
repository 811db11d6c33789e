import { LOCALE } from './format-number.ts';

const names = new Intl.DisplayNames([LOCALE], { type: 'region' });

/** The name of a country by its ISO 3166-1 alpha-2 code, or the code where the browser has none; nothing for no code. */
export const countryName = (code: string): string => (code ? (names.of(code) ?? code) : '');
