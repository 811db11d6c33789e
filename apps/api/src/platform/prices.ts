import { z } from 'zod';

const answer = z.object({
  at: z.iso.datetime({ offset: true }),
  perGram: z.union([z.number(), z.string()]),
  currency: z.string(),
  source: z.string(),
});
const series = z.object({ prices: z.array(answer) });

export interface QuotedPrice {
  at: Date;
  /** Minor units per fine gram, as decimal text. */
  perGramMinor: string;
  currency: string;
  source: string;
}

export interface PriceSource {
  /** Every price published since then, oldest first. @throws when the service does not answer in five seconds. */
  since(from: Date): Promise<QuotedPrice[]>;
}

/** The price service over HTTP: `GET /v1/gold?from=…`. */
export const createPriceSource = (url: string): PriceSource => ({
  async since(from) {
    const response = await fetch(`${url}/v1/gold?from=${encodeURIComponent(from.toISOString())}`, {
      signal: AbortSignal.timeout(5000),
      redirect: 'error',
    });
    if (!response.ok) throw new Error(`The price service answered ${response.status}`);
    const { prices } = series.parse(await response.json());
    return prices.map((price) => ({
      at: new Date(price.at),
      perGramMinor: (Number(price.perGram) * 100).toFixed(4),
      currency: price.currency,
      source: price.source,
    }));
  },
});
