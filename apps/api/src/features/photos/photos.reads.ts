import type { PhotoView } from '@lydite/contracts';
import { In, IsNull, type EntityManager, type FindOptionsWhere } from 'typeorm';
import { Photo } from './photo.entity.ts';

export const toPhotoView = ({ id, slot, description, width, height, colour }: Photo): PhotoView => ({
  id,
  slot,
  description,
  width,
  height,
  colour,
});

/** The photos of a lot, of a deal, or with these ids, in their order. Removed ones are left out. */
export async function photosOf(
  tx: EntityManager,
  of: { lotId: string } | { dealId: string } | { ids: readonly string[] },
): Promise<PhotoView[]> {
  const where: FindOptionsWhere<Photo> =
    'lotId' in of ? { lotId: of.lotId } : 'dealId' in of ? { dealId: of.dealId } : { id: In(of.ids) };
  const rows = await tx.find(Photo, {
    where: { ...where, removedAt: IsNull() },
    order: { position: 'ASC', id: 'ASC' },
  });
  return rows.map(toPhotoView);
}
