import { z } from 'zod';
import { isoTime } from './common.ts';
import { endpoints } from './endpoint.ts';

export const referencePrice = z
  .object({
    /** Minor units of the market's currency per fine gram; may carry fractions of a minor unit. */
    perGramMinor: z.number().positive(),
    at: isoTime,
    source: z.string(),
    /** More than 36 h old, not counting days without a price. */
    stale: z.boolean(),
  })
  .meta({ id: 'ReferencePrice' });
export type ReferencePrice = z.infer<typeof referencePrice>;

export const marketView = z
  .object({
    currency: z.string(),
    zone: z.string(),
    now: isoTime,
    buyerFeeBp: z.int(),
    sellerFeeBp: z.int(),
    price: referencePrice.nullable(),
    /** Local stand-ins that a demo links to; null in production. */
    demo: z
      .object({ mailUrl: z.string(), signIns: z.array(z.object({ role: z.string(), email: z.string() })) })
      .nullable(),
  })
  .meta({ id: 'Market' });
export type MarketView = z.infer<typeof marketView>;

/** The catalogue is plain JSON in the shape of `@lydite/valuation`'s `Catalogue`; the valuation package gives it its type. */
export const catalogueView = z
  .object({ version: z.string(), classes: z.array(z.looseObject({ code: z.string(), name: z.string() })) })
  .meta({ id: 'Catalogue' });
export type CatalogueView = z.infer<typeof catalogueView>;

export const marketEndpoints = endpoints({
  'GET /market': {
    summary: 'Currency, zone, fees and the reference price in force',
    access: 'public',
    response: marketView,
  },
  'GET /catalogue': { summary: 'The material classes in force', access: 'public', response: catalogueView },
  'GET /catalogue/:version': {
    summary: 'A version of the catalogue, as frozen estimates name it',
    access: 'public',
    params: z.object({ version: z.string().regex(/^\d{4}\.\d{1,3}$/) }),
    response: catalogueView,
  },
});
