import type { Actor } from '../../platform/actor.ts';
import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { beginDraft, copyLot, deleteDraft, readOwnLot, saveDraft } from './drafts.ts';
import { listLot } from './list-lot.ts';
import { addPhoto, arrangeLotPhotos, assertMayAddPhoto, removeLotPhoto } from './lot-photos.ts';
import { listMarket } from './market-list.ts';
import { myLots } from './my-lots.ts';
import { readLot } from './read-lot.ts';
import { withdrawLot } from './withdraw-lot.ts';

const own = ({ params, actor }: { params: { lotCode: string }; actor: Actor }) => ({
  lotCode: params.lotCode,
  sellerId: actor.id,
});

export function lotRoutes(on: On, world: World): void {
  on('GET /lots', ({ query, actor }) => listMarket(world, { query, actor }));
  on('GET /lots/:lotCode', ({ params, actor }) => readLot(world, { ...params, actor }));

  on('GET /my/lots', ({ actor }) => myLots(world, actor.id));
  on('POST /my/lots', ({ actor }) => beginDraft(world, actor.id));
  on('GET /my/lots/:lotCode', (call) => readOwnLot(world, own(call)));
  on('PUT /my/lots/:lotCode', (call) => saveDraft(world, { ...own(call), ...call.body }));
  on('DELETE /my/lots/:lotCode', (call) => deleteDraft(world, own(call)));
  on('POST /my/lots/:lotCode/list', ({ params, body, actor }) => listLot(world, { ...params, ...body, actor }));
  on('POST /my/lots/:lotCode/withdraw', ({ params, actor }) => withdrawLot(world, { ...params, actor }));
  on('POST /my/lots/:lotCode/copy', (call) => copyLot(world, own(call)));

  on(
    'POST /my/lots/:lotCode/photos',
    (call) => addPhoto(world, { ...own(call), upload: call.upload, slot: call.fields.slot }),
    { before: (call) => assertMayAddPhoto(world, own(call)) },
  );
  on('PUT /my/lots/:lotCode/photos', (call) => arrangeLotPhotos(world, { ...own(call), ...call.body }));
  on('DELETE /my/lots/:lotCode/photos/:photoId', (call) => removeLotPhoto(world, { ...own(call), ...call.params }));
}
