import type { LotQuery } from '@lydite/contracts';

export interface ListContext {
  now: Date;
  /** Midnight of the market's zone. */
  endOfToday: Date;
  memberId: string | null;
}

const dayMs = 24 * 3_600_000;
const codePattern = /^\s*l-?(\d{1,9})\s*$/i;

/**
 * The conditions of a list of lots as SQL over `l` (lots) and `e` (estimates), and the values they refer to. Nothing of
 * the query but its values' places gets into the SQL. A lot whose close has passed is not on the market, whether or not the job that
 * closes it has run.
 */
export function filtersOf(query: LotQuery, { now, endOfToday, memberId }: ListContext) {
  const values: unknown[] = [];
  const place = (value: unknown): string => `$${values.push(value)}`;
  const conditions = [`l.state = 'open'`, `l.closes_at > ${place(now)}`];
  const code = codePattern.exec(query.q ?? '')?.[1];
  if (code) conditions.push(`l.code = ${place(`L-${code}`)}`);
  else if (query.q) conditions.push(`${searched} @@ websearch_to_tsquery('english', ${place(query.q)})`);
  if (query.class !== undefined) conditions.push(`l.class_codes @> array[${place(query.class)}]`);
  if (query.form) conditions.push(`l.form = ${place(query.form)}`);
  if (query.goldG !== undefined) conditions.push(`e.gold_p50_g >= ${place(query.goldG)}`);
  if (query.massKg !== undefined) conditions.push(`l.mass_g >= ${place(query.massKg * 1000)}`);
  if (query.closing) {
    const until = {
      today: endOfToday,
      '3-days': new Date(now.getTime() + 3 * dayMs),
      week: new Date(now.getTime() + 7 * dayMs),
    };
    conditions.push(`l.closes_at <= ${place(until[query.closing])}`);
  }
  if (query.mine === 'bid')
    conditions.push(`exists (select from bids b where b.lot_id = l.id and b.bidder_id = ${place(memberId)})`);
  return { where: conditions.join(' and '), values };
}

/** The expression of the index lots_search_idx. */
const searched = `to_tsvector('english', coalesce(l.title, '') || ' ' || coalesce(l.description, ''))`;

const sorts: Record<LotQuery['sort'], string> = {
  closes: 'l.closes_at, l.id',
  '-gold': 'e.gold_p50_g desc, l.id',
  '-grade': 'e.grade_p50_g_per_t desc, l.id',
  '-mass': 'l.mass_g desc, l.id',
  price: 'coalesce(l.asking_minor, l.price_minor, l.start_minor), l.id',
  '-listed': 'l.listed_at desc, l.id',
};

/** What to order by; always ends with the id, so that no lot is on two pages. */
export const sortOf = (sort: LotQuery['sort']): string => sorts[sort];
