import { useTitle, useWords } from '@lydite/client';
import { Button, EmptyState, FactList, Notice, Page, PageHead } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { AccountsTable } from '../features/ledger/AccountsTable.tsx';
import { ChecksTable } from '../features/ledger/ChecksTable.tsx';
import { ledgerQuery } from '../features/ledger/ledger.queries.ts';

export function Component() {
  const { data: report, isFetching, error, refetch } = useSuspenseQuery(ledgerQuery);
  const { moment, exactMoney } = useWords();
  useTitle('Ledger check');
  const failed = report.checks.filter(({ ok }) => !ok).length;
  return (
    <Page>
      <PageHead
        title={report.balanced ? 'The ledger balances' : 'The ledger does not balance'}
        facts={[
          `${report.checks.length} checks, ${failed === 0 ? 'all hold' : `${failed} fail`}`,
          `Run ${moment(report.checkedAt)}`,
        ]}
        end={
          <Button busy={isFetching && 'Running the checks'} onClick={() => void refetch()}>
            Run again
          </Button>
        }
      />
      {error && (
        <div className="mt-4">
          <Notice tone="danger" live>
            {error.message} The figures below are from the run before.
          </Notice>
        </div>
      )}
      <section aria-labelledby="checks-title" className="mt-8">
        <h2 id="checks-title">Checks</h2>
        <ChecksTable checks={report.checks} />
      </section>
      <div className="grid grid-cols-1 gap-x-12 lg:grid-cols-[minmax(0,1fr)_21rem]">
        <section aria-labelledby="accounts-title" className="mt-10">
          <h2 id="accounts-title">Accounts</h2>
          {report.accounts.length === 0 ? (
            <div className="mt-2">
              <EmptyState title="No postings yet">The first payment into a hold opens the accounts.</EmptyState>
            </div>
          ) : (
            <AccountsTable accounts={report.accounts} />
          )}
        </section>
        <section aria-labelledby="processor-title" className="mt-10">
          <h2 id="processor-title">At the payment processor</h2>
          {report.processor ? (
            <FactList
              facts={[
                {
                  name: 'Available',
                  value: <span className="num">{exactMoney(report.processor.availableMinor)}</span>,
                },
                { name: 'Pending', value: <span className="num">{exactMoney(report.processor.pendingMinor)}</span> },
              ]}
            />
          ) : (
            <p className="mute mt-2">The processor could not be asked. Run the check again in a while.</p>
          )}
        </section>
      </div>
    </Page>
  );
}
