import { formatDateTime, formatMoney, formatRelative } from '@lydite/ui';
import { useMemo } from 'react';
import { useMarket } from './market.queries.ts';
import { useNow } from './use-now.ts';

export interface Words {
  currency: string;
  /** Market time with its zone: "Thu 4 Dec, 16:00 CET". */
  moment: (iso: string) => string;
  /** The same without weekday and zone, for dense tables that name the zone in their heads. */
  shortMoment: (iso: string) => string;
  /** "in 2 days 4 hours"; moves on by itself once a minute. */
  relative: (iso: string) => string;
  money: (amountMinor: number) => string;
  /** With cents always, as ledgers and statements print it. */
  exactMoney: (amountMinor: number) => string;
}

/** Amounts in the market's currency and moments in its zone, as all pages write them. */
export function useWords(): Words {
  const { currency, zone } = useMarket();
  const now = useNow();
  return useMemo(
    () => ({
      currency,
      moment: (iso) => formatDateTime(iso, zone),
      shortMoment: (iso) => formatDateTime(iso, zone, { weekday: false, zone: false }),
      relative: (iso) => formatRelative(iso, now),
      money: (amountMinor) => formatMoney(amountMinor, currency),
      exactMoney: (amountMinor) => formatMoney(amountMinor, currency, { cents: 'always' }),
    }),
    [currency, zone, now],
  );
}
