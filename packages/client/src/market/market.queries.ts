import type { MarketView } from '@lydite/contracts';
import type { Catalogue } from '@lydite/valuation';
import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../call/call.ts';

/** The market as every page needs it; `aheadMs` is how far its clock is ahead of this device's. */
export interface Market extends MarketView {
  aheadMs: number;
}

async function readMarket(): Promise<Market> {
  const market = await call('GET /market');
  return { ...market, aheadMs: Date.parse(market.now) - Date.now() };
}

export const marketQuery = queryOptions({ queryKey: ['market'], queryFn: readMarket, staleTime: 60_000 });

/** Suspends the page until the market is known: no amount is shown without its currency, no time without its zone. */
export const useMarket = (): Market => useSuspenseQuery(marketQuery).data;

/** A version never changes once it is in force, so it is fetched once. Without a version: the one in force. */
export const catalogueQuery = (version?: string) =>
  queryOptions({
    queryKey: ['catalogue', version ?? 'in force'],
    queryFn: async () =>
      (version
        ? await call('GET /catalogue/:version', { params: { version } })
        : await call('GET /catalogue')) as unknown as Catalogue,
    staleTime: version ? Infinity : 3_600_000,
  });
