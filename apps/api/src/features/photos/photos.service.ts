import { AppError } from '../../platform/app-error.ts';
import type { Actor } from '../../platform/actor.ts';
import type { FileAnswer } from '../../platform/send-file.ts';
import type { World } from '../../platform/world.ts';
import { sizeKey } from './photo-keys.ts';
import type { PhotoSize } from './process-photo.ts';

interface Visibility {
  lotState: string | null;
  parties: string[];
}

const hiddenStates = ['draft', 'in_review', 'deleted'];

/** A photo's file: of a listed lot to anybody, of a draft to its owner, of a deal to its two sides; operators see all. */
export async function readPhoto(
  { db, files }: Pick<World, 'db' | 'files'>,
  { photoId, size, actor }: { photoId: string; size: PhotoSize; actor: Actor | null },
): Promise<FileAnswer> {
  const rows: Visibility[] = await db.query(
    `select l.state as "lotState", array_remove(array[p.owner_id, d.seller_id, d.buyer_id], null)::text[] as parties
       from photos p left join lots l on l.id = p.lot_id left join deals d on d.id = p.deal_id
      where p.id = $1 and p.removed_at is null`,
    [photoId],
  );
  const visibility = rows[0];
  const isPublic = visibility?.lotState != null && !hiddenStates.includes(visibility.lotState);
  const mayRead =
    isPublic ||
    (actor !== null && visibility && (visibility.parties.includes(actor.id) || actor.roles.includes('operator')));
  const file = mayRead ? await files.read(sizeKey(photoId, size)) : null;
  if (!file) throw new AppError('photo.not_found', 'There is no such photo.');
  return { contentType: 'image/webp', content: file, cache: isPublic ? 'immutable' : 'private-immutable' };
}
