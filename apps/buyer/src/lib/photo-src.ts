import { addressOf } from '@lydite/client';

/** Address of a photo; `list` for rows, `page` within a page, `zoom` for looking closely. */
export const photoSrc = (photoId: string, size: 'list' | 'page' | 'zoom'): string =>
  addressOf('GET /photos/:photoId/:size', { photoId, size });
