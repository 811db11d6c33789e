import { useTitle } from '@lydite/client';
import { EmptyState, Page } from '@lydite/ui';
import { useSuspenseQueries } from '@tanstack/react-query';
import { jobsQuery, outboxQuery } from '../features/effects/effects.queries.ts';
import { JobsTable } from '../features/effects/JobsTable.tsx';
import { OutboxTable } from '../features/effects/OutboxTable.tsx';
import { DeskPager } from '../lib/DeskPager.tsx';
import { Nothing } from '../lib/Nothing.tsx';
import { SearchForm } from '../lib/SearchForm.tsx';
import { useDeskSearch } from '../lib/use-desk-search.ts';

/** What the market still owes the world outside, and the queues that do it. */
export function Component() {
  const [{ data: outbox }, { data: jobs }] = useSuspenseQueries({ queries: [outboxQuery(useDeskSearch()), jobsQuery] });
  useTitle('Outbox and jobs');
  return (
    <Page>
      <h1>Outbox and jobs</h1>
      <section aria-labelledby="jobs-title" className="mt-6">
        <h2 id="jobs-title">Job queues</h2>
        {jobs.length === 0 ? (
          <div className="mt-2">
            <EmptyState title="No queues yet">They stand here once a worker has run.</EmptyState>
          </div>
        ) : (
          <JobsTable jobs={jobs} />
        )}
      </section>
      <section aria-labelledby="outbox-title" className="mt-10">
        <h2 id="outbox-title">Outbox</h2>
        <p className="lead">
          Mails, payments, transfers and refunds: those set aside first, then those still to do, then the newest.
        </p>
        <SearchForm hint="effect, key or state" />
        {outbox.rows.length === 0 ? (
          <Nothing noun="effects">The first mail or payment stands here.</Nothing>
        ) : (
          <>
            <OutboxTable rows={outbox.rows} />
            <DeskPager page={outbox} noun="effects" />
          </>
        )}
      </section>
    </Page>
  );
}
