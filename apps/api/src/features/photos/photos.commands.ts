import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import type { PhotoSlot, PhotoView } from '@lydite/contracts';
import { IsNull, type EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import type { FileStore } from '../../platform/files.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { Photo } from './photo.entity.ts';
import { photoKind } from './photo-kind.ts';
import { originalKey, sizeKey } from './photo-keys.ts';
import { toPhotoView } from './photos.reads.ts';
import { photoSizes, processPhoto, type PhotoSize } from './process-photo.ts';

/** Documented in DEVELOPERS.md. */
export const mostPhotos = 24;

interface PhotoOrder {
  ownerId: string;
  lotId?: string;
  dealId?: string;
  slot: PhotoSlot;
  description?: string;
  /** The file in quarantine; it is left there for the upload middleware to remove. */
  upload: { path: string };
  /**
   * Asked again in the transaction that adds the photo, when minutes of decoding may have passed since the caller first checked.
   * @throws AppError when the photo may not be added any more
   */
  stillAllowed?: (tx: EntityManager) => Promise<void>;
}

/**
 * Checks, re-encodes and keeps a photo of a lot or a deal, as the last in its order. A refusal leaves everything as it was.
 * @throws AppError photo.kind_refused, photo.too_many_pixels, photo.unreadable, photo.too_many
 */
export async function storePhoto({ db, files }: Pick<World, 'db' | 'files'>, order: PhotoOrder): Promise<PhotoView> {
  const { ownerId, lotId = null, dealId = null, slot, description = '', upload } = order;
  const kind = await photoKind(upload.path);
  const photo = await processPhoto(upload.path, kind);
  const id = randomUUID();
  try {
    await files.put(originalKey(id), await readFile(upload.path));
    for (const size of sizes) await files.put(sizeKey(id, size), photo.files[size]);
    return await inTransaction(db, async (tx) => {
      const position = await nextPosition(tx, { lotId, dealId });
      await order.stillAllowed?.(tx);
      const { width, height, colour } = photo;
      await tx.insert(Photo, { id, ownerId, lotId, dealId, slot, position, description, width, height, colour });
      return toPhotoView(await tx.findOneByOrFail(Photo, { id }));
    });
  } catch (error) {
    await removeFiles(files, id);
    throw error;
  }
}

/** Orders and describes a lot's photos; the first is the cover. The ids must be those the lot has. */
export async function arrangePhotos(
  tx: EntityManager,
  { lotId, photos }: { lotId: string; photos: readonly { id: string; description: string }[] },
): Promise<void> {
  const kept = await tx.findBy(Photo, { lotId, removedAt: IsNull() });
  const ids = new Set(photos.map(({ id }) => id));
  if (ids.size !== photos.length || ids.size !== kept.length || kept.some(({ id }) => !ids.has(id)))
    throw new AppError('lot.changed', 'The photos of this lot have changed meanwhile. Look at them again.', {
      context: { photoIds: kept.map(({ id }) => id) },
    });
  for (const [position, { id, description }] of photos.entries())
    await tx.update(Photo, { id }, { position, description });
}

/** Takes a photo off its lot. Its files are removed by `removeFiles` once that is committed. */
export async function removePhotos(tx: EntityManager, where: { lotId: string; id?: string }): Promise<string[]> {
  const photos = await tx.findBy(Photo, { ...where, removedAt: IsNull() });
  for (const { id } of photos) await tx.update(Photo, { id }, { removedAt: () => 'market_now()' });
  return photos.map(({ id }) => id);
}

/** Removes the files of a photo, its original included. */
export async function removeFiles(files: FileStore, photoId: string): Promise<void> {
  await files.remove(originalKey(photoId));
  await files.remove(`photos/${photoId}`);
}

/** Copies a lot's photos to another lot of the same owner, files and all. */
export async function copyPhotos(
  tx: EntityManager,
  files: FileStore,
  { fromLotId, toLotId }: { fromLotId: string; toLotId: string },
): Promise<void> {
  for (const photo of await tx.findBy(Photo, { lotId: fromLotId, removedAt: IsNull() })) {
    const id = randomUUID();
    await files.copy(originalKey(photo.id), originalKey(id));
    for (const size of sizes) await files.copy(sizeKey(photo.id, size), sizeKey(id, size));
    await tx.insert(Photo, { ...photo, id, lotId: toLotId });
  }
}

const sizes = Object.keys(photoSizes) as PhotoSize[];

/** Locks the object that the photo belongs to, so that photos sent at once are counted one after the other. */
async function nextPosition(
  tx: EntityManager,
  { lotId, dealId }: { lotId: string | null; dealId: string | null },
): Promise<number> {
  if (lotId) await tx.query('select 1 from lots where id = $1 for update', [lotId]);
  if (dealId) await tx.query('select 1 from deals where id = $1 for update', [dealId]);
  const rows: { count: number; next: number }[] = await tx.query(
    `select count(*)::int as count, coalesce(max(position) + 1, 0) as next from photos
      where (lot_id = $1 or deal_id = $2) and removed_at is null`,
    [lotId, dealId],
  );
  const { count, next } = rows[0]!;
  if (count >= mostPhotos)
    throw new AppError('photo.too_many', `There are ${mostPhotos} photos already. Remove one before you add another.`);
  return next;
}
