import { call, withFreshPassword } from '@lydite/client';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { DeskSearch } from '../../lib/use-desk-search.ts';

const key = ['desk', 'members'] as const;

export const membersQuery = (search: DeskSearch) =>
  queryOptions({ queryKey: [...key, search], queryFn: () => call('GET /desk/members', { query: search }) });

export interface Verification {
  limitMinor: number;
  reason: string;
}

export function useVerifyMember(memberId: string) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (body: Verification) =>
      withFreshPassword(() => call('POST /desk/members/:memberId/verify', { params: { memberId }, body })),
    onSuccess: () => cache.invalidateQueries({ queryKey: key }),
  });
}
