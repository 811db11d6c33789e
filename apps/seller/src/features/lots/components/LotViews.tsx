import type { MyLotRow } from '@lydite/contracts';
import { Link } from 'react-router-dom';
import { isInView, viewNames, views, type View } from '../lot-stage.ts';

/** The views of the list as links, each with how many it holds; empty ones are left out. */
export function LotViews({ lots, current }: { lots: readonly MyLotRow[]; current: View }) {
  const shown = views
    .map((view) => ({ view, count: lots.filter((lot) => isInView(lot, view)).length }))
    .filter(({ view, count }) => count > 0 || view === current);
  return (
    <nav className="tabs mt-6" aria-label="Views of your lots">
      {shown.map(({ view, count }) => (
        <Link
          key={view}
          to={view === 'all' ? '/lots' : `/lots?view=${view}`}
          aria-current={view === current ? 'page' : undefined}
        >
          {viewNames[view]}
          <span className="count">{count}</span>
        </Link>
      ))}
    </nav>
  );
}
