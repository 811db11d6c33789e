import { call } from '@lydite/client';
import { queryOptions } from '@tanstack/react-query';
import type { DeskSearch } from '../../lib/use-desk-search.ts';

export const deskDealsQuery = (search: DeskSearch) =>
  queryOptions({
    queryKey: ['desk', 'deals', search],
    queryFn: () => call('GET /desk/deals', { query: search }),
    refetchInterval: 15_000,
  });
