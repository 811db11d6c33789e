import { EmptyState } from '@lydite/ui';
import { useDeskSearch } from './use-desk-search.ts';

/** An empty list: nothing there yet, or nothing that fits the search. */
export function Nothing({ noun, children }: { noun: string; children: string }) {
  const { q } = useDeskSearch();
  return (
    <div className="mt-5">
      {q ? (
        <EmptyState title={`No ${noun} for “${q}”`}>Try fewer letters.</EmptyState>
      ) : (
        <EmptyState title={`No ${noun} yet`}>{children}</EmptyState>
      )}
    </div>
  );
}
