import { call } from '@lydite/client';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { refreshMs } from '../../lib/use-refresh.ts';

export const myBidsQuery = queryOptions({
  queryKey: ['bids', 'own'],
  queryFn: () => call('GET /my/bids'),
  refetchInterval: refreshMs,
});

/** What shows a lot's price or the buyer's standing is asked for again. */
function useAskAgain() {
  const cache = useQueryClient();
  return () =>
    cache.invalidateQueries({ predicate: ({ queryKey: [noun] }) => ['lots', 'bids', 'deals'].includes(String(noun)) });
}

export function usePlaceBid(lotCode: string) {
  const askAgain = useAskAgain();
  return useMutation({
    mutationFn: (body: { ceilingMinor: number; attempt: string }) =>
      call('POST /lots/:lotCode/bids', { params: { lotCode }, body }),
    onSettled: askAgain,
  });
}

export function useTakeLot(lotCode: string) {
  const askAgain = useAskAgain();
  return useMutation({
    mutationFn: (body: { priceMinor: number; attempt: string }) =>
      call('POST /lots/:lotCode/take', { params: { lotCode }, body }),
    onSettled: askAgain,
  });
}

export function useAnswerOffer(lotCode: string) {
  const askAgain = useAskAgain();
  return useMutation({
    mutationFn: (accept: boolean) =>
      call('POST /lots/:lotCode/offer-answer', { params: { lotCode }, body: { accept } }),
    onSettled: askAgain,
  });
}
