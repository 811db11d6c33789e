import type { DealView } from '@lydite/contracts';
import { queryOptions, useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { call } from '../call/call.ts';

export type Side = DealView['side'];

const final: readonly DealView['state'][] = ['settled', 'cancelled', 'refunded'];
const pollMs = 5_000;

/** Whether the next word is somebody else's: the other side's, the processor's or the clock's. */
const waitsForOthers = (deal: DealView): boolean =>
  !final.includes(deal.state) ||
  ['waiting', 'queued'].includes(deal.settlement?.transfer?.state ?? '') ||
  deal.settlement?.refund?.state === 'queued';

const dealKey = (code: string) => ['deals', code] as const;

export const dealsQuery = (side: Side) =>
  queryOptions({
    queryKey: ['deals', 'own', side],
    queryFn: () => call('GET /my/deals', { query: { side } }),
    refetchInterval: 15_000,
  });

/** A deal, asked for again while it moves; only in a visible tab. */
export const dealQuery = (code: string) =>
  queryOptions({
    queryKey: dealKey(code),
    queryFn: () => call('GET /deals/:dealCode', { params: { dealCode: code } }),
    refetchInterval: ({ state }) => (state.data && waitsForOthers(state.data) ? pollMs : false),
  });

/** Keeps a deal as a step has answered it; whatever else shows deals, lots or bids is asked for again. */
export function rememberDeal(cache: QueryClient, deal: DealView): void {
  cache.setQueryData(dealKey(deal.code), deal);
  void cache.invalidateQueries({
    predicate: ({ queryKey: [noun, key] }) => noun !== 'market' && noun !== 'catalogue' && key !== deal.code,
  });
}

/** Takes a step in a deal. */
export function useDealStep<Input = void>(send: (input: Input) => Promise<DealView>) {
  const cache = useQueryClient();
  return useMutation({ mutationFn: send, onSuccess: (deal) => rememberDeal(cache, deal) });
}
