import { call, withFreshPassword } from '@lydite/client';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { DeskSearch } from '../../lib/use-desk-search.ts';

const key = ['desk', 'deals'] as const;

export const deskDealsQuery = (search: DeskSearch) =>
  queryOptions({
    queryKey: [...key, search],
    queryFn: () => call('GET /desk/deals', { query: search }),
    refetchInterval: 15_000,
  });

/** Lets a settlement above the limit run; money moves, so the password is asked for. */
export function useApproveSettlement(dealCode: string) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: () => withFreshPassword(() => call('POST /desk/deals/:dealCode/approve', { params: { dealCode } })),
    onSuccess: () => cache.invalidateQueries({ queryKey: key }),
  });
}
