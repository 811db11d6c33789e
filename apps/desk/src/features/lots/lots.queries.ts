import { call } from '@lydite/client';
import { queryOptions } from '@tanstack/react-query';
import type { DeskSearch } from '../../lib/use-desk-search.ts';

export const lotsQuery = (search: DeskSearch) =>
  queryOptions({
    queryKey: ['desk', 'lots', search],
    queryFn: () => call('GET /desk/lots', { query: search }),
    refetchInterval: 30_000,
  });
