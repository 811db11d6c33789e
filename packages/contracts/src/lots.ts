import { z } from 'zod';
import { amountMinor, chainStep, isoTime, lotCode, page, pageNumber, shortText } from './common.ts';
import { outline, photoView, storedEstimate } from './estimates.ts';
import { lineDraft, lotDraft, lotState, missingItem, saleForm } from './lot-draft.ts';
import { referencePrice } from './market.ts';

export const myLotRow = z
  .object({
    code: lotCode,
    title: z.string(),
    state: lotState,
    coverPhotoId: z.uuid().nullable(),
    massG: z.number().nullable(),
    goldG: z.object({ p10: z.number(), p50: z.number(), p90: z.number() }).nullable(),
    /** What its streak is drawn from; null for a draft, whose estimate is not frozen yet. */
    estimate: outline.nullable(),
    priceMinor: amountMinor.nullable(),
    bidders: z.int(),
    closesAt: isoTime.nullable(),
    dealCode: z.string().nullable(),
    dealState: z.string().nullable(),
    /** The next thing the seller has to do, as words; empty when it is somebody else's turn. */
    duty: z.string(),
    dutyBy: isoTime.nullable(),
    updatedAt: isoTime,
  })
  .meta({ id: 'MyLotRow' });
export type MyLotRow = z.infer<typeof myLotRow>;

export const myLotView = z
  .object({
    code: lotCode,
    state: lotState,
    version: z.int(),
    savedAt: isoTime,
    draft: lotDraft,
    photos: z.array(photoView),
    missing: z.array(missingItem),
    listedAt: isoTime.nullable(),
    closesAt: isoTime.nullable(),
    priceMinor: amountMinor.nullable(),
    bidders: z.int(),
    reserveReached: z.boolean().nullable(),
    dealCode: z.string().nullable(),
  })
  .meta({ id: 'MyLot' });
export type MyLotView = z.infer<typeof myLotView>;

/** Filters, sort and page of the list of lots; all of it lives in the URL. */
export const lotQuery = z.strictObject({
  q: shortText(80).optional(),
  class: z.string().max(60).optional(),
  form: saleForm.optional(),
  goldG: z.coerce.number().min(0).max(1_000_000).optional(),
  massKg: z.coerce.number().min(0).max(100_000).optional(),
  closing: z.enum(['today', '3-days', 'week']).optional(),
  mine: z.enum(['bid']).optional(),
  sort: z.enum(['closes', '-gold', '-grade', '-mass', 'price', '-listed']).default('closes'),
  page: pageNumber,
});
export type LotQuery = z.infer<typeof lotQuery>;

export const ownStanding = z.enum(['highest', 'outbid']);

export const lotRow = z
  .object({
    code: lotCode,
    title: z.string(),
    classCodes: z.array(z.string()),
    massG: z.number(),
    massEvidence: z.enum(['stated', 'weighed']),
    pieces: z.int().nullable(),
    place: z.string(),
    coverPhotoId: z.uuid().nullable(),
    form: saleForm,
    estimate: outline,
    /** Open bids: the highest bid, or null before the first. Asking price: the price. */
    priceMinor: amountMinor.nullable(),
    startMinor: amountMinor.nullable(),
    bidders: z.int(),
    closesAt: isoTime,
    you: z.object({ standing: ownStanding, ceilingMinor: amountMinor }).nullable(),
  })
  .meta({ id: 'LotRow' });
export type LotRow = z.infer<typeof lotRow>;

export const lotList = page(lotRow)
  .extend({ countsByView: z.record(z.string(), z.int()) })
  .meta({ id: 'LotList' });
export type LotList = z.infer<typeof lotList>;

export const publicLine = z
  .object({ ...lineDraft.omit({ massText: true, massUnit: true }).shape, className: z.string(), hazards: z.string() })
  .meta({ id: 'PublicLine' });
export type PublicLine = z.infer<typeof publicLine>;

export const publicBid = z
  .object({ alias: z.string(), amountMinor, at: isoTime, own: z.boolean() })
  .meta({ id: 'PublicBid' });
export type PublicBid = z.infer<typeof publicBid>;

export const lotView = z
  .object({
    code: lotCode,
    state: lotState,
    title: z.string(),
    description: z.string(),
    form: saleForm,
    basis: z.literal('outright'),
    place: z.string(),
    country: z.string(),
    delivery: z.object({ way: z.enum(['seller-sends', 'collection']), freightMinor: amountMinor, hours: z.string() }),
    massG: z.number(),
    pieces: z.int().nullable(),
    lines: z.array(publicLine),
    photos: z.array(photoView),
    estimate: storedEstimate,
    price: referencePrice,
    listedAt: isoTime,
    closesAt: isoTime,
    latestClosesAt: isoTime,
    priceMinor: amountMinor.nullable(),
    startMinor: amountMinor.nullable(),
    /** Least amount a next bid may name; null when bids are not taken. */
    leastNextMinor: amountMinor.nullable(),
    bidders: z.int(),
    bids: z.array(publicBid),
    reserve: z.enum(['none', 'reached', 'not-reached']),
    sellerRecord: z.object({ deliveredLots: z.int(), medianMassDifference: z.number().nullable() }),
    chain: z.array(chainStep),
    you: z
      .object({
        seller: z.boolean(),
        standing: ownStanding.nullable(),
        ceilingMinor: amountMinor.nullable(),
        roomMinor: amountMinor.nullable(),
        dealCode: z.string().nullable(),
      })
      .nullable(),
  })
  .meta({ id: 'Lot' });
export type LotView = z.infer<typeof lotView>;
