import { z } from 'zod';
import { lotCode, nothing, shortText } from './common.ts';
import { endpoints } from './endpoint.ts';
import { photoView } from './estimates.ts';
import { saveDraftRequest } from './lot-draft.ts';
import { lotList, lotQuery, lotView, myLotRow, myLotView } from './lots.ts';

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
