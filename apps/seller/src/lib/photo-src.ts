import { addressOf } from '@lydite/client';

/** Address of a photo in one of its three sizes. */
export const photoSrc = (photoId: string, size: 'list' | 'page' | 'zoom'): string =>
  addressOf('GET /photos/:photoId/:size', { photoId, size });
