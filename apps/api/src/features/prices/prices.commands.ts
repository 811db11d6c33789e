import type { EntityManager } from 'typeorm';
import type { QuotedPrice } from '../../platform/prices.ts';

/** Keeps published prices; one that is known already changes nothing. */
export async function recordPrices(tx: EntityManager, quotes: readonly QuotedPrice[]): Promise<void> {
  await tx.query(
    `insert into reference_prices (at, source, currency, per_gram_minor)
     select * from unnest($1::timestamptz[], $2::text[], $3::text[], $4::numeric[]) on conflict (source, at) do nothing`,
    [
      quotes.map((quote) => quote.at),
      quotes.map((quote) => quote.source),
      quotes.map((quote) => quote.currency),
      quotes.map((quote) => quote.perGramMinor),
    ],
  );
}
