import { catalogueQuery, hasRole, useMarket, useMember, useTitle, useWords } from '@lydite/client';
import type { LotList, LotQuery } from '@lydite/contracts';
import { buttonClass, EmptyState, Page, PageHead, Pager, Skeleton } from '@lydite/ui';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { LotFilters } from '../features/lots/components/LotFilters.tsx';
import { LotsTable } from '../features/lots/components/LotsTable.tsx';
import { LotViews } from '../features/lots/components/LotViews.tsx';
import { filtersOn, lotSearch, readLotSearch } from '../features/lots/lot-search.ts';
import { lotsQuery } from '../features/lots/lots.queries.ts';
import { termsQuery } from '../features/terms/terms.queries.ts';
import { gradeLandmarks } from '../lib/worth/landmarks.ts';
import { rowMarks } from '../lib/worth/row-marks.ts';
import { RefreshLine } from '../lib/RefreshLine.tsx';
import { useRefresh } from '../lib/use-refresh.ts';

const rowPx = 80;

/** The rack: all lots that can be bid on or taken, on one stone. */
export function Component() {
  useTitle('Lots');
  const [search] = useSearchParams();
  const query = useMemo(() => readLotSearch(search), [search]);
  const { paused, toggle } = useRefresh();
  const { data: list, error, dataUpdatedAt } = useQuery(lotsQuery(query, { paused }));
  const { data: catalogue } = useQuery(catalogueQuery());
  const member = useMember();
  if (error && !list) throw error;
  return (
    <Page>
      <PageHead title="Lots open for bids" end={<ReferencePrice />} />
      <LotViews query={query} counts={list?.countsByView ?? {}} isMember={member != null} />
      <LotFilters query={query} catalogue={catalogue} />
      {list ? <LotRows list={list} query={query} /> : <Skeleton height={rowPx * 8} label="Loading the lots" />}
      {list && (
        <Pager
          {...pagesOf(list)}
          noun="lots"
          previous={<PageLink query={query} list={list} by={-1} />}
          next={<PageLink query={query} list={list} by={1} />}
          end={<RefreshLine atMs={dataUpdatedAt} paused={paused} onToggle={toggle} />}
        />
      )}
    </Page>
  );
}

function ReferencePrice() {
  const { price } = useMarket();
  const { money, moment } = useWords();
  if (!price) return 'No reference price yet';
  return (
    <span>
      Gold <b className="text-ink">{money(Math.round(price.perGramMinor))}/g</b>, reference price
      <br />
      of {moment(price.at)}, {price.source}
      {price.stale && <span className="bad"> More than 36 hours old.</span>}
    </span>
  );
}

function LotRows({ list, query }: { list: LotList; query: LotQuery }) {
  const { data: catalogue } = useQuery(catalogueQuery());
  const { price, buyerFeeBp } = useMarket();
  const { data: terms } = useQuery({ ...termsQuery, enabled: hasRole(useMember(), 'buyer') });
  const landmarks = useMemo(() => (catalogue ? gradeLandmarks(catalogue) : []), [catalogue]);
  const marksOf = useMemo(
    () => rowMarks(terms && price ? { terms, buyerFeeBp, pricePerGMinor: price.perGramMinor } : null),
    [terms, buyerFeeBp, price],
  );
  if (list.rows.length === 0) return <NoLots query={query} />;
  return <LotsTable query={query} rows={list.rows} landmarks={landmarks} marksOf={marksOf} />;
}

function NoLots({ query }: { query: LotQuery }) {
  const isNarrowed = filtersOn(query).length > 0 || query.q !== undefined;
  if (!isNarrowed)
    return (
      <EmptyState title="No lot is open just now">
        Lots that can be bid on or taken at a price appear here as sellers list them.
      </EmptyState>
    );
  return (
    <EmptyState
      title="No open lot fits"
      action={
        <Link className={buttonClass()} to={{ search: '' }}>
          Show all open lots
        </Link>
      }
    >
      Lots that fit these filters will be here as soon as one is listed. The address keeps the filters.
    </EmptyState>
  );
}

const pagesOf = ({ rows, total, page, pageSize }: LotList) => ({
  from: (page - 1) * pageSize + 1,
  to: (page - 1) * pageSize + rows.length,
  total,
});

function PageLink({ list, query, by }: { list: LotList; query: LotQuery; by: -1 | 1 }) {
  const page = list.page + by;
  if (page < 1 || (page - 1) * list.pageSize >= list.total) return null;
  return (
    <Link className={buttonClass()} to={{ search: lotSearch(query, { page }) }} rel={by < 0 ? 'prev' : 'next'}>
      {by < 0 ? 'Previous' : 'Next'}
    </Link>
  );
}
