import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../call/call.ts';

export const sessionsQuery = queryOptions({ queryKey: ['sessions'], queryFn: () => call('GET /sessions') });

export const secondStepQuery = queryOptions({ queryKey: ['second-step'], queryFn: () => call('GET /my/totp') });

export function useEndSession() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (sessionId: string) => call('DELETE /sessions/:sessionId', { params: { sessionId } }),
    onSuccess: () => cache.invalidateQueries({ queryKey: sessionsQuery.queryKey }),
  });
}
