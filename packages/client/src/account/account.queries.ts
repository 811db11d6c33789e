import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../call/call.ts';

export const sessionsQuery = queryOptions({ queryKey: ['sessions'], queryFn: () => call('GET /sessions') });

export function useEndSession() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (sessionId: string) => call('DELETE /sessions/:sessionId', { params: { sessionId } }),
    onSuccess: () => cache.invalidateQueries({ queryKey: sessionsQuery.queryKey }),
  });
}
