import type { LotQuery } from '@lydite/contracts';
import { formatNumber } from '@lydite/ui';
import { Link } from 'react-router-dom';
import { lotSearch, lotViews, viewOf } from '../lot-search.ts';

interface LotViewsProps {
  query: LotQuery;
  counts: Record<string, number>;
  isMember: boolean;
}

/** Ready-made views of the list as named addresses, each with how many lots it holds. */
export function LotViews({ query, counts, isMember }: LotViewsProps) {
  const current = viewOf(query);
  return (
    <nav className="tabs mt-4" aria-label="Views">
      {lotViews
        .filter(({ membersOnly }) => isMember || !membersOnly)
        .map((view) => (
          <Link
            key={view.key}
            to={{ search: lotSearch({ sort: query.sort, page: 1 }, view.filters) }}
            aria-current={view === current ? 'page' : undefined}
          >
            {view.name}
            <span className="count">{formatNumber(counts[view.key] ?? 0)}</span>
          </Link>
        ))}
    </nav>
  );
}
