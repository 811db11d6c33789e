import { z } from 'zod';
import {
  amountMinor,
  chainStep,
  isoTime,
  lotCode,
  nothing,
  page,
  pageNumber,
  positiveMinor,
  shortText,
} from './common.ts';
import { endpoints } from './endpoint.ts';
import { outline, photoView, storedEstimate } from './estimates.ts';
import { referencePrice } from './market.ts';

export const lotState = z.enum(['draft', 'in_review', 'open', 'frozen', 'awarded', 'offered', 'unsold', 'withdrawn']);
export const saleForm = z.enum(['open-bids', 'asking-price']);
export type SaleForm = z.infer<typeof saleForm>;

const grams = z.number().positive().max(100_000_000);
const share = z.number().min(0).max(1);

/** How the thickness is known, in micrometres. */
export const platingEvidence = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('standard'), minimumUm: z.number().positive().max(100) }),
  z.strictObject({
    kind: z.literal('range'),
    leastUm: z.number().min(0).max(100),
    mostUm: z.number().positive().max(100),
  }),
  z.strictObject({ kind: z.literal('xrf'), thicknessUm: z.number().min(0).max(100) }),
]);

/** A line as the seller describes it: the fields of the valuation's `LineInput`, a label, and the mass as it was typed. */
export const lineDraft = z
  .strictObject({
    id: z.uuid(),
    label: shortText(80),
    classCode: z.string().max(60).nullable(),
    identityEvidence: z.enum(['stated', 'photographed', 'inspected']),
    massG: grams.nullable(),
    massText: shortText(40).nullable(),
    massUnit: z.enum(['g', 'kg', 'lb', 'oz', 'ozt']),
    massEvidence: z.enum(['stated', 'weighed']),
    scaleResolutionG: z.number().positive().max(100_000).nullable(),
    pieces: z.int().positive().max(10_000_000).nullable(),
    countEvidence: z.enum(['stated', 'counted-on-photo', 'counted']),
    plating: platingEvidence.nullable(),
    contactsPerPiece: z.int().positive().max(5000).nullable(),
    padAreaMm2: z.number().positive().max(10_000).nullable(),
    areaCm2PerPiece: z.number().positive().max(10_000).nullable(),
    pieceMassG: z.number().positive().max(100_000).nullable(),
    wear: share.nullable(),
    assay: z
      .strictObject({ gradeGPerT: z.number().min(0).max(1_000_000), relativeSd: z.number().positive().max(1) })
      .nullable(),
  })
  .meta({ id: 'LineDraft' });
export type LineDraft = z.infer<typeof lineDraft>;

export const hazard = z.enum(['none', 'packed', 'present']);

/** Everything the seller can enter before listing. Every part may be empty while it is a draft. */
export const lotDraft = z
  .strictObject({
    title: shortText(90),
    description: shortText(2000),
    lines: z.array(lineDraft).max(30, 'At most 30 lines.'),
    sale: z.strictObject({
      form: saleForm,
      startMinor: positiveMinor.nullable(),
      reserveMinor: positiveMinor.nullable(),
      askingMinor: positiveMinor.nullable(),
      days: z.int().min(1).max(14),
    }),
    delivery: z.strictObject({
      way: z.enum(['seller-sends', 'collection']),
      freightMinor: amountMinor.nullable(),
      place: shortText(60),
      hours: shortText(120),
    }),
    declarations: z.strictObject({
      rightToSell: z.boolean(),
      batteries: z.enum(['removed', 'packed']).nullable(),
      batteriesNote: shortText(200),
      mercuryOrBeryllium: z.enum(['none', 'present']).nullable(),
      hazardNote: shortText(200),
      country: z.string().regex(/^([A-Z]{2})?$/, 'Two letters, like AT.'),
    }),
  })
  .meta({ id: 'LotDraft' });
export type LotDraft = z.infer<typeof lotDraft>;

export const saveDraftRequest = z.strictObject({ version: z.int().min(1), draft: lotDraft });

/** What stands between a draft and the market, by part of the task list. */
export const missingItem = z.object({
  part: z.enum(['photos', 'contents', 'weight', 'sale', 'declarations']),
  path: z.string(),
  message: z.string(),
});
export type MissingItem = z.infer<typeof missingItem>;

export const myLotRow = z
  .object({
    code: lotCode,
    title: z.string(),
    state: lotState,
    coverPhotoId: z.uuid().nullable(),
    massG: z.number().nullable(),
    goldG: z.object({ p10: z.number(), p50: z.number(), p90: z.number() }).nullable(),
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

const ofDraft = { kind: 'lot-draft', param: 'lotCode' } as const;
const lotParams = z.object({ lotCode });

export const lotEndpoints = endpoints({
  'GET /lots': {
    summary: 'Lots open for bids or at an asking price',
    access: 'public',
    query: lotQuery,
    response: lotList,
  },
  'GET /lots/:lotCode': {
    summary: 'One lot',
    access: 'public',
    owned: { kind: 'lot', param: 'lotCode' },
    params: lotParams,
    response: lotView,
  },
  'GET /my/lots': { summary: 'Own lots, drafts included', access: ['seller'], response: z.array(myLotRow) },
  'POST /my/lots': { summary: 'Begin a draft', access: ['seller'], body: nothing, response: myLotView, status: 201 },
  'GET /my/lots/:lotCode': {
    summary: 'An own lot',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    response: myLotView,
  },
  'PUT /my/lots/:lotCode': {
    summary: 'Save a draft; 409 with the newest version when another tab saved first',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    body: saveDraftRequest,
    response: myLotView,
  },
  'DELETE /my/lots/:lotCode': {
    summary: 'Delete a draft',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    response: 'none',
    status: 204,
  },
  'POST /my/lots/:lotCode/list': {
    summary: 'Open a draft to the market; its estimate is frozen',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    body: z.strictObject({ version: z.int().min(1) }),
    response: myLotView,
  },
  'POST /my/lots/:lotCode/withdraw': {
    summary: 'Withdraw before the first bid',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    body: nothing,
    response: myLotView,
  },
  'POST /my/lots/:lotCode/copy': {
    summary: 'Begin a draft from an earlier lot',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    body: nothing,
    response: myLotView,
    status: 201,
  },
  'POST /my/lots/:lotCode/photos': {
    summary: 'Add a photo (form field `photo`, optional `slot`)',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    consumes: 'multipart',
    response: photoView,
    status: 201,
  },
  'PUT /my/lots/:lotCode/photos': {
    summary: 'Order and describe the photos; the first is the cover',
    access: ['seller'],
    owned: ofDraft,
    params: lotParams,
    body: z.strictObject({ photos: z.array(z.strictObject({ id: z.uuid(), description: shortText(200) })).max(24) }),
    response: z.array(photoView),
  },
  'DELETE /my/lots/:lotCode/photos/:photoId': {
    summary: 'Remove a photo from a draft',
    access: ['seller'],
    owned: ofDraft,
    params: z.object({ lotCode, photoId: z.uuid() }),
    response: 'none',
    status: 204,
  },
  'GET /photos/:photoId/:size': {
    summary: 'A photo as WebP',
    access: 'public',
    owned: { kind: 'photo', param: 'photoId' },
    params: z.object({ photoId: z.uuid(), size: z.enum(['list', 'page', 'zoom']) }),
    response: 'file',
  },
});
