import { MINUS, NBSP } from './characters.ts';
import { formatNumber } from './format-number.ts';

const symbols: Record<string, string> = { USD: '$', EUR: '€', GBP: '£' };

/** The sign written before an amount, or the currency's code and a space. */
export function currencySign(currency: string): string {
  return symbols[currency] ?? `${currency}${NBSP}`;
}

interface MoneyFormat {
  /** `always` shows cents, `whole` drops them when they are zero, `never` rounds to whole units. */
  cents?: 'always' | 'whole' | 'never';
  /** Writes + before a gain. */
  signed?: boolean;
}

/**
 * An amount of integer minor units as text, "$6,200" or "−$440.50".
 * @param amountMinor integer minor units (hundredths); may be negative
 */
export function formatMoney(amountMinor: number, currency: string, format: MoneyFormat = {}): string {
  const { cents = 'whole', signed = false } = format;
  const size = Math.abs(amountMinor);
  const hasCents = cents === 'always' || (cents === 'whole' && size % 100 !== 0);
  const digits = hasCents ? 2 : 0;
  const figure = formatNumber(size / 100, { minimumFractionDigits: digits, maximumFractionDigits: digits });
  const isZero = digits === 0 ? Math.round(size / 100) === 0 : size === 0;
  const sign = isZero ? '' : amountMinor < 0 ? MINUS : signed ? '+' : '';
  return `${sign}${currencySign(currency)}${figure}`;
}

/** A worked-out figure, rounded to tens of whole units, for results that carry no cent's worth of sureness: "+$1,350". */
export function formatAbout(amountMinor: number, currency: string, format: Pick<MoneyFormat, 'signed'> = {}): string {
  return formatMoney(Math.round(amountMinor / 1000) * 1000, currency, { ...format, cents: 'never' });
}
