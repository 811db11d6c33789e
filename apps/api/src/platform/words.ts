import { formatDateTime } from '@lydite/ui/format-time';
import { formatMoney } from '@lydite/ui/format-money';
import { DateTime } from 'luxon';
import type { MarketTerms } from './market-terms.ts';

const nbsp = '\u00a0';
const minus = '\u2212';
const figure = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 6 });

/** A mass to the milligram it was recorded with, as mails and documents print it: "412.5 g", "12.345 kg". */
export function massWords(massG: number): string {
  const size = Math.abs(massG);
  const sign = massG < 0 ? minus : '';
  return size < 1000 ? `${sign}${figure.format(size)}${nbsp}g` : `${sign}${figure.format(size / 1000)}${nbsp}kg`;
}

/** A rate in hundredths of a per cent: "4 %", "2.5 %". */
export const rateWords = (bp: number): string => `${figure.format(bp / 100)}${nbsp}%`;

/** Amounts and moments as the market's mails and documents print them. */
export const createWords = ({ zone, currency }: MarketTerms) => ({
  money: (amountMinor: number): string => formatMoney(amountMinor, currency, { cents: 'always' }),
  moment: (at: Date): string => formatDateTime(at.toISOString(), zone),
  /** With the year, for papers that are kept. */
  date: (at: Date): string => DateTime.fromJSDate(at, { zone }).setLocale('en-GB').toFormat('d LLL yyyy, HH:mm ZZZZ'),
});
export type Words = ReturnType<typeof createWords>;
