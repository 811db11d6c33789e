import { call } from '@lydite/client';
import { queryOptions } from '@tanstack/react-query';

/** Runs the check anew each time it is asked for: what it said a while ago is no proof. */
export const ledgerQuery = queryOptions({
  queryKey: ['desk', 'ledger'],
  queryFn: () => call('GET /desk/ledger'),
  staleTime: 0,
  refetchOnWindowFocus: false,
});
