import { z } from 'zod';
import { amountMinor, isoTime, lotCode, positiveMinor } from './common.ts';
import { endpoints } from './endpoint.ts';
import { lotState } from './lot-draft.ts';
import { ownStanding } from './lots.ts';

/** `attempt` is chosen once per press of the button: sending it twice places one bid and gives the same answer. */
export const placeBidRequest = z.strictObject({ ceilingMinor: positiveMinor, attempt: z.uuid() });
export type PlaceBidRequest = z.infer<typeof placeBidRequest>;
export const takeLotRequest = z.strictObject({ priceMinor: positiveMinor, attempt: z.uuid() });

export const bidOutcome = z
  .object({
    standing: ownStanding,
    ceilingMinor: amountMinor,
    priceMinor: amountMinor,
    leastNextMinor: amountMinor,
    closesAt: isoTime,
    bidders: z.int(),
  })
  .meta({ id: 'BidOutcome' });
export type BidOutcome = z.infer<typeof bidOutcome>;

export const myBidRow = z
  .object({
    lotCode,
    title: z.string(),
    coverPhotoId: z.uuid().nullable(),
    lotState,
    standing: ownStanding,
    ceilingMinor: amountMinor,
    priceMinor: amountMinor.nullable(),
    leastNextMinor: amountMinor.nullable(),
    closesAt: isoTime,
    dealCode: z.string().nullable(),
    dealState: z.string().nullable(),
    /** An under-bidder's offer that waits for this buyer's answer. */
    offer: z.object({ priceMinor: amountMinor, answerBy: isoTime }).nullable(),
  })
  .meta({ id: 'MyBidRow' });
export type MyBidRow = z.infer<typeof myBidRow>;

export const myBids = z
  .object({
    rows: z.array(myBidRow),
    /** Limit less what own highest bids and unpaid awards already bind. */
    roomMinor: amountMinor,
    limitMinor: amountMinor,
    /** Sum that would go into holds if every lot now led were won. */
    ifAllWonMinor: amountMinor,
  })
  .meta({ id: 'MyBids' });
export type MyBids = z.infer<typeof myBids>;

/** A buyer's own terms: shares as fractions 0 … 1, money in minor units. */
export const buyingTerms = z
  .strictObject({
    recoveryYield: z.number().min(0).max(1),
    accountableShare: z.number().min(0).max(1),
    processingPerKgMinor: amountMinor,
    batchCostMinor: amountMinor,
    wantedChance: z.number().min(0.5).max(0.99),
    marginShare: z.number().min(0).max(5),
    rivals: z.int().min(0).max(50),
    curseOn: z.boolean(),
  })
  .meta({ id: 'BuyingTerms' });
export type BuyingTerms = z.infer<typeof buyingTerms>;

const lotParams = z.object({ lotCode });

export const bidEndpoints = endpoints({
  'POST /lots/:lotCode/bids': {
    summary: 'Bid with a bid ceiling; binding',
    access: ['buyer'],
    owned: { kind: 'lot', param: 'lotCode' },
    params: lotParams,
    body: placeBidRequest,
    response: bidOutcome,
    status: 201,
  },
  'POST /lots/:lotCode/take': {
    summary: 'Take the lot at its asking price; binding',
    access: ['buyer'],
    owned: { kind: 'lot', param: 'lotCode' },
    params: lotParams,
    body: takeLotRequest,
    response: z.object({ dealCode: z.string() }),
    status: 201,
  },
  'POST /lots/:lotCode/offer-answer': {
    summary: 'Answer an under-bidder’s offer',
    access: ['buyer'],
    owned: { kind: 'lot', param: 'lotCode' },
    params: lotParams,
    body: z.strictObject({ accept: z.boolean() }),
    response: z.object({ dealCode: z.string().nullable() }),
  },
  'GET /my/bids': { summary: 'Own bids', access: ['buyer'], response: myBids },
  'GET /my/terms': { summary: 'Own buying terms', access: ['buyer'], response: buyingTerms },
  'PUT /my/terms': { summary: 'Keep own buying terms', access: ['buyer'], body: buyingTerms, response: buyingTerms },
});
