import type { SessionView } from '@lydite/contracts';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../call/call.ts';
import { sessionKey } from '../session/session.queries.ts';

export const noticesQuery = queryOptions({
  queryKey: ['notices'],
  queryFn: () => call('GET /my/notices'),
  refetchInterval: 30_000,
});

/** Marks all as read: only the count in the bar goes, so that the page still shows which ones are new to the reader. */
export function useMarkRead() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: () => call('POST /my/notices/read'),
    onSuccess: () =>
      cache.setQueryData<SessionView>(sessionKey, (session) => session && { ...session, unreadNotices: 0 }),
  });
}
