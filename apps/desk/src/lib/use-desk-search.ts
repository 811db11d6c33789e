import { useSearchParams } from 'react-router-dom';

export interface DeskSearch {
  page: number;
  q?: string;
}

/** What a list shows, kept in the address: the page and the search text. Anything odd in it counts as not given. */
export function useDeskSearch(): DeskSearch {
  const [search] = useSearchParams();
  const page = Number(search.get('page'));
  const q = search.get('q')?.trim().slice(0, 80);
  return { page: Number.isInteger(page) && page >= 1 && page <= 1000 ? page : 1, ...(q ? { q } : {}) };
}
