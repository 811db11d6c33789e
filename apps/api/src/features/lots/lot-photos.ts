import { photoSlot, type PhotoView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import type { Upload } from '../../platform/routes.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { arrangePhotos, removeFiles, removePhotos, storePhoto } from '../photos/photos.commands.ts';
import { photosOf } from '../photos/photos.reads.ts';
import { assertDraft, findOwnLot, type OwnLot } from './own-lot.ts';

async function ownDraftId(tx: EntityManager, own: OwnLot): Promise<string> {
  const lot = await findOwnLot(tx, own);
  assertDraft(lot);
  return lot.id;
}

/** Asked before a photo's bytes are taken. @throws AppError lot.not_found, lot.wrong_state */
export async function assertMayAddPhoto({ db }: Pick<World, 'db'>, own: OwnLot): Promise<void> {
  await ownDraftId(db.manager, own);
}

/** Adds a photo to a draft, as its last. */
export async function addPhoto(
  world: Pick<World, 'db' | 'files'>,
  { upload, slot = 'other', ...own }: OwnLot & { upload: Upload | undefined; slot: string | undefined },
): Promise<PhotoView> {
  if (!upload) throw new AppError('photo.missing', 'Send the photo in the form field named photo.');
  const known = photoSlot.safeParse(slot);
  if (!known.success)
    throw new AppError('request.invalid', 'slot: not a place for a photo.', {
      fields: [{ path: 'slot', message: `One of ${photoSlot.options.join(', ')}.` }],
    });
  return storePhoto(world, {
    ownerId: own.sellerId,
    lotId: await ownDraftId(world.db.manager, own),
    slot: known.data,
    upload,
    stillAllowed: async (tx) => void (await ownDraftId(tx, own)),
  });
}

/** Puts the photos of a draft in this order, with these descriptions. @throws AppError lot.changed when it has others */
export const arrangeLotPhotos = (
  { db }: Pick<World, 'db'>,
  { photos, ...own }: OwnLot & { photos: { id: string; description: string }[] },
): Promise<PhotoView[]> =>
  inTransaction(db, async (tx) => {
    const lot = await findOwnLot(tx, own, { lock: true });
    assertDraft(lot);
    await arrangePhotos(tx, { lotId: lot.id, photos });
    return photosOf(tx, { lotId: lot.id });
  });

export async function removeLotPhoto(
  { db, files }: Pick<World, 'db' | 'files'>,
  { photoId, ...own }: OwnLot & { photoId: string },
): Promise<void> {
  await inTransaction(db, async (tx) => {
    const lot = await findOwnLot(tx, own, { lock: true });
    assertDraft(lot);
    const removed = await removePhotos(tx, { lotId: lot.id, id: photoId });
    if (removed.length === 0) throw new AppError('photo.not_found', 'This lot has no such photo.');
  });
  await removeFiles(files, photoId);
}
