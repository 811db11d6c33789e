import { call, shrinkPhoto, upload } from '@lydite/client';
import type { PhotoView } from '@lydite/contracts';
import { forgetOthers, openDeviceStore } from '../../lib/device-store.ts';
import type { QueueParts, WaitingPhoto } from './photo-queue.ts';
import { described } from './photo-order.ts';
import { shotOf } from './photo-slots.ts';

const device = openDeviceStore('photos');

/** How the queue reaches the market and this device. */
export function queueCalls(memberId: string, lotCode: string): QueueParts {
  const key = (id: string) => `${memberId}/${lotCode}/${id}`;
  return {
    send: async (photo, options) => {
      const file = shotOf(photo.slot).isCloseUp ? photo.file : await shrinkPhoto(photo.file);
      return upload('POST /my/lots/:lotCode/photos', { lotCode }, file, { fields: { slot: photo.slot }, ...options });
    },
    keep: (photo) => device.write(key(photo.id), photo),
    forget: (id) => device.remove([key(id)]),
  };
}

/** Photos this device kept from an earlier visit, because they were not sent yet. */
export async function keptPhotos(memberId: string, lotCode: string): Promise<WaitingPhoto[]> {
  await forgetOthers(device, memberId);
  const keys = await device.keys(`${memberId}/${lotCode}/`);
  const photos = await Promise.all(keys.map((key) => device.read<WaitingPhoto>(key)));
  return photos.filter((photo) => photo !== undefined).toSorted((a, b) => a.chosenAtMs - b.chosenAtMs);
}

/** Puts the photos in this order with these descriptions. */
export const arrangePhotos = (lotCode: string, photos: readonly PhotoView[]): Promise<PhotoView[]> =>
  call('PUT /my/lots/:lotCode/photos', {
    params: { lotCode },
    body: { photos: described(photos).map(({ id, description }) => ({ id, description })) },
  });

export const removePhoto = (lotCode: string, photoId: string): Promise<undefined> =>
  call('DELETE /my/lots/:lotCode/photos/:photoId', { params: { lotCode, photoId } });
