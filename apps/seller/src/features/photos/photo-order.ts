import type { PhotoView } from '@lydite/contracts';
import { shotOf } from './photo-slots.ts';

/** The photos with one of them moved one place up or down; unchanged at the ends. */
export function moved(photos: readonly PhotoView[], id: string, by: -1 | 1): PhotoView[] {
  const from = photos.findIndex((photo) => photo.id === id);
  const to = from + by;
  const next = [...photos];
  const [photo] = from < 0 || to < 0 || to >= photos.length ? [] : next.splice(from, 1);
  if (photo) next.splice(to, 0, photo);
  return next;
}

/** A photo taken anew stands where the old one stood, with its description; the old one goes. */
export function retaken(photos: readonly PhotoView[], added: PhotoView, replacesId: string): PhotoView[] {
  const old = photos.find(({ id }) => id === replacesId);
  const rest = photos.filter(({ id }) => id !== added.id);
  if (!old) return [...rest, added];
  return rest.map((photo) => (photo.id === replacesId ? { ...added, description: old.description } : photo));
}

/** Photos without a description get that of their shot, so that no picture is mute. */
export const described = (photos: readonly PhotoView[]): PhotoView[] =>
  photos.map((photo) => ({ ...photo, description: photo.description || shotOf(photo.slot).caption }));
