import { z } from 'zod';
import { dealCode, nothing } from './common.ts';
import { dealRow, dealView, dispatchRequest, payoutAccount, weighInRequest } from './deals.ts';
import { endpoints } from './endpoint.ts';
import { photoView } from './estimates.ts';

const params = z.object({ dealCode });
const owned = { kind: 'deal', param: 'dealCode' } as const;
const parties = ['seller', 'buyer'] as const;

export const dealEndpoints = endpoints({
  'GET /my/deals': {
    summary: 'Own deals on either side',
    access: parties,
    query: z.strictObject({ side: z.enum(['seller', 'buyer']).optional() }),
    response: z.array(dealRow),
  },
  'GET /deals/:dealCode': {
    summary: 'A deal, seen from the own side',
    access: parties,
    owned,
    params,
    response: dealView,
  },
  'POST /deals/:dealCode/payment': {
    summary: 'Open the payment page of the processor',
    access: ['buyer'],
    owned,
    fresh: true,
    params,
    body: nothing,
    response: z.object({ url: z.string() }),
  },
  'POST /deals/:dealCode/dispatch': {
    summary: 'Mark as dispatched',
    access: ['seller'],
    owned,
    params,
    body: dispatchRequest,
    response: dealView,
  },
  'POST /deals/:dealCode/ready': {
    summary: 'Mark as ready for collection',
    access: ['seller'],
    owned,
    params,
    body: nothing,
    response: dealView,
  },
  'POST /deals/:dealCode/receive': {
    summary: 'Record the receipt',
    access: ['buyer'],
    owned,
    params,
    body: nothing,
    response: dealView,
  },
  'POST /deals/:dealCode/photos': {
    summary: 'Add a photo for the weigh-in',
    access: ['buyer'],
    owned,
    params,
    consumes: 'multipart',
    response: photoView,
    status: 201,
  },
  'POST /deals/:dealCode/weigh-in': {
    summary: 'Enter the weigh-in',
    access: ['buyer'],
    owned,
    params,
    body: weighInRequest,
    response: dealView,
  },
  'POST /deals/:dealCode/accept': {
    summary: 'Accept the delivery: the hold is settled',
    access: ['buyer'],
    owned,
    fresh: true,
    params,
    body: nothing,
    response: dealView,
  },
  'POST /deals/:dealCode/claim': {
    summary: 'Claim a mass short beyond the tolerance',
    access: ['buyer'],
    owned,
    params,
    body: z.strictObject({ ground: z.literal('mass') }),
    response: dealView,
  },
  'POST /deals/:dealCode/countersign': {
    summary: 'Countersign the weigh-in',
    access: ['seller'],
    owned,
    params,
    body: nothing,
    response: dealView,
  },
  'POST /deals/:dealCode/accept-claim': {
    summary: 'Accept the claim: the hold is settled with it',
    access: ['seller'],
    owned,
    fresh: true,
    params,
    body: nothing,
    response: dealView,
  },
  'POST /deals/:dealCode/cancel': {
    summary: 'Cancel when dispatch is late: all goes back',
    access: ['buyer'],
    owned,
    fresh: true,
    params,
    body: nothing,
    response: dealView,
  },
  'GET /deals/:dealCode/packing-slip.pdf': {
    summary: 'Packing slip with the lot’s code',
    access: ['seller'],
    owned,
    params,
    response: 'file',
  },
  'GET /deals/:dealCode/statement.pdf': {
    summary: 'Settlement statement',
    access: parties,
    owned,
    params,
    response: 'file',
  },
  'GET /my/payout-account': {
    summary: 'State of the own account for payouts',
    access: ['seller'],
    response: payoutAccount,
  },
  'POST /my/payout-account/link': {
    summary: 'Open the processor’s onboarding page',
    access: ['seller'],
    fresh: true,
    body: nothing,
    response: z.object({ url: z.string() }),
  },
  'POST /webhooks/payments': {
    summary: 'Events of the payment processor; by signature',
    access: 'public',
    consumes: 'raw',
    response: 'none',
    status: 200,
  },
});
