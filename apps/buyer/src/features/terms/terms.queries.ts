import { call } from '@lydite/client';
import type { BuyingTerms } from '@lydite/contracts';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';

const key = ['terms'] as const;

/** A buyer's own terms; nobody else ever sees them. */
export const termsQuery = queryOptions({ queryKey: key, queryFn: () => call('GET /my/terms'), staleTime: 300_000 });

export function useKeepTerms() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (body: BuyingTerms) => call('PUT /my/terms', { body }),
    onSuccess: (kept) => cache.setQueryData(key, kept),
  });
}
