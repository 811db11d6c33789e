import { call } from '@lydite/client';
import { queryOptions } from '@tanstack/react-query';
import type { DeskSearch } from '../../lib/use-desk-search.ts';

const everyMs = 10_000;

export const outboxQuery = (search: DeskSearch) =>
  queryOptions({
    queryKey: ['desk', 'outbox', search],
    queryFn: () => call('GET /desk/outbox', { query: search }),
    refetchInterval: everyMs,
  });

export const jobsQuery = queryOptions({
  queryKey: ['desk', 'jobs'],
  queryFn: () => call('GET /desk/jobs'),
  refetchInterval: everyMs,
});
