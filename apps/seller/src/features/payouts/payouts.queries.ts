import { call, usePageReturn, withFreshPassword } from '@lydite/client';
import { queryOptions, useMutation } from '@tanstack/react-query';
import { useOnce } from '../../lib/use-once.ts';

export const payoutAccountQuery = queryOptions({
  queryKey: ['payouts', 'account'],
  queryFn: () => call('GET /my/payout-account'),
  refetchInterval: 15_000,
});

/** Sold lots with what they brought: the statements stand with them. */
export const soldQuery = queryOptions({
  queryKey: ['deals', 'own', 'seller'],
  queryFn: () => call('GET /my/deals', { query: { side: 'seller' } }),
});

/** Asks for the processor's own page, which opens once and for minutes, and goes there. */
export function useSetUpPayouts() {
  const open = useOnce(() => withFreshPassword(() => call('POST /my/payout-account/link')));
  const setUp = useMutation({ mutationFn: open, onSuccess: ({ url }) => location.assign(url) });
  usePageReturn(setUp.reset);
  return setUp;
}
