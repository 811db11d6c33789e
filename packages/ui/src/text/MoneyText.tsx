import { formatMoney } from './format-money.ts';

interface MoneyTextProps {
  amountMinor: number;
  currency: string;
  cents?: 'always' | 'whole' | 'never';
  /** Writes + before a gain. */
  signed?: boolean;
}

/** An amount out of the ledger or a bid, in the figures' own face. */
export function MoneyText({ amountMinor, currency, cents, signed }: MoneyTextProps) {
  return <span className="num nowrap">{formatMoney(amountMinor, currency, { cents, signed })}</span>;
}
