import { lotQuery, type LotQuery } from '@lydite/contracts';

export const leastSearch: LotQuery = { sort: 'closes', page: 1 };

/** The list's filters, sort and page out of an address. What can't be read is left out, the rest holds. */
export function readLotSearch(search: URLSearchParams): LotQuery {
  const given = Object.fromEntries(search);
  const parsed = lotQuery.safeParse(given);
  if (parsed.success) return parsed.data;
  const refused = new Set(
    parsed.error.issues.flatMap((issue) => (issue.code === 'unrecognized_keys' ? issue.keys : [String(issue.path[0])])),
  );
  return lotQuery.parse(Object.fromEntries(Object.entries(given).filter(([key]) => !refused.has(key))));
}

/** The address of a list with a few things changed. Anything but the page itself leads back to the first page. */
export function lotSearch(query: LotQuery, change: Partial<LotQuery>): string {
  const next: Partial<LotQuery> = { ...query, page: 1, ...change };
  const entries = Object.entries(next).filter(
    ([key, value]) => value !== undefined && value !== '' && value !== leastSearch[key as keyof LotQuery],
  );
  const text = new URLSearchParams(entries.map(([key, value]) => [key, String(value)])).toString();
  return text === '' ? '' : `?${text}`;
}

const filterKeys = ['class', 'form', 'goldG', 'massKg', 'closing', 'mine'] as const;
export type LotFilter = (typeof filterKeys)[number];

export const filtersOn = (query: LotQuery): LotFilter[] => filterKeys.filter((key) => query[key] !== undefined);

export interface LotViewTab {
  /** Key of the API's counts. */
  key: string;
  name: string;
  filters: Partial<LotQuery>;
  membersOnly?: boolean;
}

export const lotViews: readonly LotViewTab[] = [
  { key: 'all', name: 'All open', filters: {} },
  { key: 'over-10-g', name: 'Gold over 10 g', filters: { goldG: 10 } },
  { key: 'closing-today', name: 'Closing today', filters: { closing: 'today' } },
  { key: 'bid', name: 'I have bid', filters: { mine: 'bid' }, membersOnly: true },
];

/** The view whose filters are exactly these. */
export const viewOf = (query: LotQuery): LotViewTab | undefined =>
  lotViews.find(({ filters }) => filterKeys.every((key) => filters[key] === query[key]));
