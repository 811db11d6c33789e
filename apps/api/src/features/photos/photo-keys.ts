import type { PhotoSize } from './process-photo.ts';

/** Where the file store keeps the re-encoded photo. */
export const sizeKey = (photoId: string, size: PhotoSize): string => `photos/${photoId}/${size}.webp`;

/** Where the file as it was sent is kept, for evidence; it is never served. */
export const originalKey = (photoId: string): string => `originals/${photoId}`;
