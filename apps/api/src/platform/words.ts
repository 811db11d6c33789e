import { formatDateTime } from '@lydite/ui/format-time';
import { formatMoney } from '@lydite/ui/format-money';
import type { MarketTerms } from './market-terms.ts';

const nbsp = '\u00a0';
const figure = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 3 });

/** A mass to the milligram it was recorded with, as mails and documents print it: "412.5 g", "12.345 kg". */
export const massWords = (massG: number): string =>
  massG < 1000 ? `${figure.format(massG)}${nbsp}g` : `${figure.format(massG / 1000)}${nbsp}kg`;

/** A rate in hundredths of a per cent: "4 %", "2.5 %". */
export const rateWords = (bp: number): string => `${figure.format(bp / 100)}${nbsp}%`;

/** Amounts and moments as the market's mails and documents print them. */
export const createWords = ({ zone, currency }: MarketTerms) => ({
  money: (amountMinor: number): string => formatMoney(amountMinor, currency, { cents: 'always' }),
  moment: (at: Date): string => formatDateTime(at.toISOString(), zone),
});
export type Words = ReturnType<typeof createWords>;
