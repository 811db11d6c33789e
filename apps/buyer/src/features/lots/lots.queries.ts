import { call } from '@lydite/client';
import type { LotQuery, LotView } from '@lydite/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { refreshMs } from '../../lib/use-refresh.ts';

interface Refresh {
  paused: boolean;
}

export const lotsQuery = (query: Partial<LotQuery>, { paused }: Refresh = { paused: false }) =>
  queryOptions({
    queryKey: ['lots', 'market', query],
    queryFn: ({ signal }) => call('GET /lots', { query, signal }),
    refetchInterval: paused ? false : refreshMs,
    placeholderData: keepPreviousData,
  });

/** Near its close a lot is asked for more often, and after it until the result is out. */
function lotRefreshMs(lot: LotView | undefined, aheadMs: number): number | false {
  if (!lot) return false;
  const leftMs = Date.parse(lot.closesAt) - Date.now() - aheadMs;
  if (lot.state === 'open' && leftMs < 5 * 60_000) return refreshMs / 5;
  return ['open', 'frozen', 'offered'].includes(lot.state) ? refreshMs : false;
}

export const lotQuery = (
  lotCode: string,
  { paused, aheadMs = 0 }: Refresh & { aheadMs?: number } = { paused: false },
) =>
  queryOptions({
    queryKey: ['lots', lotCode],
    queryFn: ({ signal }) => call('GET /lots/:lotCode', { params: { lotCode }, signal }),
    refetchInterval: ({ state }) => (paused ? false : lotRefreshMs(state.data, aheadMs)),
  });
