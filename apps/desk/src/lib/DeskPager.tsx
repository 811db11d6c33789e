import { Pager } from '@lydite/ui';
import { Link } from 'react-router-dom';
import { useDeskSearch } from './use-desk-search.ts';

interface DeskPagerProps {
  page: { page: number; pageSize: number; total: number; rows: readonly unknown[] };
  noun: string;
}

const step = 'inline-flex min-h-11 items-center';

export function DeskPager({ page: { page, pageSize, total, rows }, noun }: DeskPagerProps) {
  const { q } = useDeskSearch();
  const to = (next: number) => `?${new URLSearchParams({ ...(q ? { q } : {}), page: String(next) }).toString()}`;
  const first = (page - 1) * pageSize;
  return (
    <Pager
      from={rows.length > 0 ? first + 1 : 0}
      to={first + rows.length}
      total={total}
      noun={noun}
      previous={
        page > 1 ? (
          <Link className={step} to={to(page - 1)}>
            Previous
          </Link>
        ) : null
      }
      next={
        first + rows.length < total ? (
          <Link className={step} to={to(page + 1)}>
            Next
          </Link>
        ) : null
      }
    />
  );
}
