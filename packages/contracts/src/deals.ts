import { z } from 'zod';
import { amountMinor, chainStep, dealCode, isoTime, lotCode, shortText } from './common.ts';
import { photoView } from './estimates.ts';

export const dealState = z.enum([
  'awaiting_payment',
  'held',
  'dispatched',
  'ready',
  'received',
  'weighed_in',
  'in_dispute',
  'settling',
  'needs_approval',
  'settled',
  'cancelled',
  'refunded',
]);
export type DealState = z.infer<typeof dealState>;

export const dealAction = z.enum([
  'pay',
  'dispatch',
  'mark_ready',
  'receive',
  'weigh_in',
  'accept',
  'claim_mass',
  'countersign',
  'accept_claim',
  'cancel_late',
]);
export type DealAction = z.infer<typeof dealAction>;

export const dispatchRequest = z.strictObject({
  carrier: shortText(60).min(2, 'Name the carrier.'),
  trackingCode: shortText(60).min(2, 'Enter the tracking code.'),
});

export const weighInRequest = z.strictObject({
  grossG: z.number().positive().max(100_000_000),
  tareG: z.number().min(0).max(100_000_000),
  scaleResolutionG: z.number().positive().max(100_000),
  scaleSerial: shortText(60),
  note: shortText(500),
  photoIds: z.array(z.uuid()).min(1, 'Add a photo of the scale or the ticket.').max(8),
});
export type WeighInRequest = z.infer<typeof weighInRequest>;

export const weighInView = z
  .object({
    grossG: z.number(),
    tareG: z.number(),
    netG: z.number(),
    scaleResolutionG: z.number(),
    scaleSerial: z.string(),
    note: z.string(),
    photos: z.array(photoView),
    at: isoTime,
    countersignedAt: isoTime.nullable(),
    declaredG: z.number(),
    differenceG: z.number(),
    toleranceG: z.number(),
    /** What the shortage would take off the price if claimed; 0 within the tolerance. */
    claimableMinor: amountMinor,
  })
  .meta({ id: 'WeighIn' });
export type WeighInView = z.infer<typeof weighInView>;

/** One line of a settlement's arithmetic; `amountMinor` is signed for the reader. */
export const statementStep = z.object({
  label: z.string(),
  detail: z.string(),
  amountMinor: z.int().min(-99_999_999).max(99_999_999),
  total: z.boolean(),
});

export const settlementView = z
  .object({
    settledAt: isoTime,
    valueMinor: amountMinor,
    sellerGetsMinor: amountMinor,
    refundMinor: amountMinor,
    sellerSteps: z.array(statementStep),
    buyerSteps: z.array(statementStep),
    hash: z.string(),
    transfer: z
      .object({ state: z.enum(['waiting', 'queued', 'sent', 'failed']), reason: z.string(), at: isoTime.nullable() })
      .nullable(),
    refund: z.object({ state: z.enum(['queued', 'sent', 'failed']), at: isoTime.nullable() }).nullable(),
  })
  .meta({ id: 'Settlement' });
export type SettlementView = z.infer<typeof settlementView>;

export const dealEvent = z
  .object({ at: isoTime, by: z.string(), title: z.string(), detail: z.string() })
  .meta({ id: 'DealEvent' });

export const dealRow = z
  .object({
    code: dealCode,
    lotCode,
    title: z.string(),
    coverPhotoId: z.uuid().nullable(),
    state: dealState,
    side: z.enum(['seller', 'buyer']),
    priceMinor: amountMinor,
    holdMinor: amountMinor,
    duty: z.string(),
    dutyBy: isoTime.nullable(),
    updatedAt: isoTime,
    sellerGetsMinor: amountMinor.nullable(),
    refundMinor: amountMinor.nullable(),
    payoutState: z.string().nullable(),
  })
  .meta({ id: 'DealRow' });
export type DealRow = z.infer<typeof dealRow>;

export const dealView = z
  .object({
    code: dealCode,
    lotCode,
    title: z.string(),
    coverPhotoId: z.uuid().nullable(),
    massG: z.number(),
    pieces: z.int().nullable(),
    state: dealState,
    frozen: z.boolean(),
    side: z.enum(['seller', 'buyer']),
    /** The other side's name and place; shown once the hold is paid. */
    counterparty: z.object({ name: z.string(), place: z.string() }).nullable(),
    priceMinor: amountMinor,
    freightMinor: amountMinor,
    buyerFeeMinor: amountMinor,
    sellerFeeMinor: amountMinor,
    holdMinor: amountMinor,
    payment: z.object({ state: z.enum(['none', 'open', 'processing', 'failed', 'succeeded']), message: z.string() }),
    delivery: z.object({
      way: z.enum(['seller-sends', 'collection']),
      place: z.string(),
      hours: z.string(),
      carrier: z.string().nullable(),
      trackingCode: z.string().nullable(),
    }),
    weighIn: weighInView.nullable(),
    claim: z.object({ ground: z.literal('mass'), adjustmentMinor: amountMinor, at: isoTime }).nullable(),
    settlement: settlementView.nullable(),
    due: z.object({ what: z.string(), at: isoTime, ifMissed: z.string() }).nullable(),
    chain: z.array(chainStep),
    events: z.array(dealEvent),
    actions: z.array(dealAction),
  })
  .meta({ id: 'Deal' });
export type DealView = z.infer<typeof dealView>;

export const payoutAccount = z
  .object({
    state: z.enum(['none', 'requirements', 'ready']),
    requirements: z.array(z.string()),
    verified: z.boolean(),
    /** Sums of several deals, and so larger than one amount may be. */
    waitingMinor: z.int().min(0),
    payouts: z.array(z.object({ id: z.string(), amountMinor: z.int(), state: z.string(), at: isoTime })),
  })
  .meta({ id: 'PayoutAccount' });
export type PayoutAccount = z.infer<typeof payoutAccount>;
