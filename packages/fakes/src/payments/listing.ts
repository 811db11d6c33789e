import type { Stripe } from 'stripe';
import { missing } from './errors.ts';
import type { Kind, Kinds } from './kinds.ts';
import type { Moment } from './parameters.ts';
import type { Work } from './work.ts';

export interface Page {
  limit?: number | undefined;
  starting_after?: string | undefined;
  ending_before?: string | undefined;
  created?: Moment | undefined;
}

/** Does a time in seconds fall within a filter such as `{gte: 5}`, or equal a plain number? */
export function within(timeS: number, moment: Moment | undefined): boolean {
  if (moment === undefined) return true;
  if (typeof moment === 'number') return timeS === moment;
  return (
    (moment.gt === undefined || timeS > moment.gt) &&
    (moment.gte === undefined || timeS >= moment.gte) &&
    (moment.lt === undefined || timeS < moment.lt) &&
    (moment.lte === undefined || timeS <= moment.lte)
  );
}

/** Objects of the account acted for that pass the filter, newest first, one page of them. */
export function listPage<K extends Kind>(
  work: Work,
  kind: K,
  query: { url: string; page: Page; keep?: (value: Kinds[K]) => boolean },
): Stripe.ApiList<Kinds[K]> {
  const { url, page } = query;
  const values = work.store
    .all(kind)
    .filter(({ owner }) => owner === work.owner)
    .map(({ value }) => value)
    .filter(
      (value) => within((value as { created?: number }).created ?? 0, page.created) && (query.keep?.(value) ?? true),
    )
    .toReversed();
  return pageOf(values, { url, page });
}

/** One page of a list that is newest first already. */
export function pageOf<T extends { id: string }>(
  values: T[],
  { url, page }: { url: string; page: Page },
): Stripe.ApiList<T> {
  const limit = page.limit ?? 10;
  const indexOf = (id: string, param: string) => {
    const index = values.findIndex((value) => value.id === id);
    if (index < 0) throw missing('object', id, param);
    return index;
  };
  if (page.ending_before) {
    const end = indexOf(page.ending_before, 'ending_before');
    const start = Math.max(0, end - limit);
    return { object: 'list', data: values.slice(start, end), has_more: start > 0, url };
  }
  const start = page.starting_after ? indexOf(page.starting_after, 'starting_after') + 1 : 0;
  return { object: 'list', data: values.slice(start, start + limit), has_more: start + limit < values.length, url };
}
