import { useTitle } from '@lydite/client';
import { EmptyState, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { DealCase } from '../features/deals/DealCase.tsx';
import { DealQueue } from '../features/deals/DealQueue.tsx';
import { deskDealsQuery } from '../features/deals/deals.queries.ts';
import { DeskPager } from '../lib/DeskPager.tsx';
import { Nothing } from '../lib/Nothing.tsx';
import { SearchForm } from '../lib/SearchForm.tsx';
import { useDeskSearch } from '../lib/use-desk-search.ts';

/** The queue at the left, the chosen deal at the right, the most urgent unless one is chosen; on phones one or the other. */
export function DealsPage() {
  const { data: deals } = useSuspenseQuery(deskDealsQuery(useDeskSearch()));
  const [search] = useSearchParams();
  const selected = search.get('deal');
  const shown = selected ?? deals.rows[0]?.code;
  useTitle(selected ? `Deal ${selected}` : 'Deals');
  const back = new URLSearchParams(search);
  back.delete('deal');
  return (
    <Page>
      <h1>Deals</h1>
      <p className="lead">By the next deadline; ended ones last.</p>
      <div className="mt-2 grid grid-cols-1 gap-x-12 lg:grid-cols-[25rem_minmax(0,1fr)]">
        <div className={selected ? 'max-lg:hidden' : undefined}>
          <SearchForm hint="deal, lot, title or member" />
          {deals.rows.length === 0 ? (
            <Nothing noun="deals">A deal begins when a lot is awarded or taken.</Nothing>
          ) : (
            <>
              <DealQueue deals={deals.rows} selected={shown} />
              <DeskPager page={deals} noun="deals" />
            </>
          )}
        </div>
        <div className={selected ? 'mt-5' : 'mt-5 max-lg:hidden'}>
          <p className="mb-4 lg:hidden">
            <Link to={`?${back.toString()}`}>All deals</Link>
          </p>
          {shown && <Chosen code={shown} />}
        </div>
      </div>
    </Page>
  );
}

/** Found by its code, so that a link to a deal works whatever page of the queue it is on. */
function Chosen({ code }: { code: string }) {
  const { data } = useSuspenseQuery(deskDealsQuery({ page: 1, q: code.slice(0, 80) }));
  const deal = data.rows.find((row) => row.code === code);
  return deal ? <DealCase deal={deal} /> : <EmptyState title={`There is no deal ${code}`} />;
}
