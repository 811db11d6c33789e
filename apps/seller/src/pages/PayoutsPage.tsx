import { useTitle } from '@lydite/client';
import { Notice, Page } from '@lydite/ui';
import { useSuspenseQueries } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { AccountState } from '../features/payouts/components/AccountState.tsx';
import { PayoutsTable, SettlementsTable } from '../features/payouts/components/PayoutTables.tsx';
import { payoutAccountQuery, soldQuery } from '../features/payouts/payouts.queries.ts';

/** Where the money of sold lots is, and what the seller has to do to get it. */
export function Component() {
  useTitle('Payouts');
  const [{ data: account }, { data: deals }] = useSuspenseQueries({ queries: [payoutAccountQuery, soldQuery] });
  const [search] = useSearchParams();
  return (
    <Page>
      <h1>Payouts</h1>
      <p className="lead">
        When a deal settles, its hold is released to your account with the payment processor, which pays it out to your
        bank.
      </p>
      <div className="my-6 max-w-[44rem]">
        <ReturnNotice search={search} isReady={account.state === 'ready'} />
      </div>
      <div className="max-w-[44rem]">
        <AccountState account={account} />
      </div>
      <SettlementsTable deals={deals} />
      <PayoutsTable payouts={account.payouts} />
    </Page>
  );
}

/** What the way back from the processor's page means; the state itself is the processor's word, not the return. */
function ReturnNotice({ search, isReady }: { search: URLSearchParams; isReady: boolean }) {
  if (search.has('again'))
    return <Notice tone="warn">That page of the processor was used up. Press the button again for a new one.</Notice>;
  if (search.get('from') !== 'processor' || isReady) return null;
  return <Notice live>Thank you. The processor is checking what you entered; this page follows by itself.</Notice>;
}
