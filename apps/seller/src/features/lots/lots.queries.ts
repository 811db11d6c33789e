import { call } from '@lydite/client';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { useOnce } from '../../lib/use-once.ts';

/** Own lots of all states. Bids and deadlines move while the page is open. */
export const myLotsQuery = queryOptions({
  queryKey: ['lots', 'own'],
  queryFn: () => call('GET /my/lots'),
  refetchInterval: 15_000,
});

/** An own lot as its seller sees it. */
export const myLotQuery = (lotCode: string) =>
  queryOptions({
    queryKey: ['lots', 'own', lotCode],
    queryFn: () => call('GET /my/lots/:lotCode', { params: { lotCode } }),
    refetchInterval: 10_000,
  });

/** A listed lot as buyers see it. */
export const listedLotQuery = (lotCode: string) =>
  queryOptions({
    queryKey: ['lots', 'listed', lotCode],
    queryFn: () => call('GET /lots/:lotCode', { params: { lotCode } }),
    refetchInterval: 10_000,
  });

/** Whatever shows lots is asked for again, but for a draft that is being edited: its form is ahead of the market. */
function useLotChange<Answer>(send: () => Promise<Answer>) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: useOnce(send),
    onSuccess: () =>
      cache.invalidateQueries({ predicate: ({ queryKey: [noun, view] }) => noun === 'lots' && view !== 'opened' }),
  });
}

export const useBeginLot = () => useLotChange(() => call('POST /my/lots'));

export const useCopyLot = (lotCode: string) =>
  useLotChange(() => call('POST /my/lots/:lotCode/copy', { params: { lotCode } }));

export const useWithdrawLot = (lotCode: string) =>
  useLotChange(() => call('POST /my/lots/:lotCode/withdraw', { params: { lotCode } }));

export const useDeleteDraft = (lotCode: string) =>
  useLotChange(() => call('DELETE /my/lots/:lotCode', { params: { lotCode } }));
