import { z } from 'zod';
import { amountMinor, positiveMinor, shortText } from './common.ts';

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
