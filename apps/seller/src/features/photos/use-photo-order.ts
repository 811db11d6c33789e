import { isApiError } from '@lydite/client';
import type { PhotoView } from '@lydite/contracts';
import { useState } from 'react';
import { arrangePhotos, removePhoto } from './photos.queries.ts';
import { moved, retaken } from './photo-order.ts';

interface PhotoOrderParts {
  lotCode: string;
  photos: readonly PhotoView[];
  /** Shows the photos as the market now has them. */
  onPhotos: (photos: PhotoView[]) => void;
  /** Asks the market for the lot again. */
  refresh: () => Promise<unknown>;
}

/** Orders, describes and removes the photos of a draft; one change at a time, each shown once the market has it. */
export function usePhotoOrder({ lotCode, photos, onPhotos, refresh }: PhotoOrderParts) {
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);

  const run = async (change: () => Promise<PhotoView[]>) => {
    setIsBusy(true);
    setProblem(null);
    try {
      onPhotos(await change());
    } catch (error) {
      setProblem(isApiError(error) ? error.message : 'The photos could not be changed. Try again.');
    }
    await refresh();
    setIsBusy(false);
  };
  const remove = async (id: string) => {
    await removePhoto(lotCode, id);
    return photos.filter((photo) => photo.id !== id);
  };

  return {
    isBusy,
    problem,
    move: (id: string, by: -1 | 1) => run(() => arrangePhotos(lotCode, moved(photos, id, by))),
    describe: (id: string, description: string) =>
      run(() =>
        arrangePhotos(
          lotCode,
          photos.map((photo) => (photo.id === id ? { ...photo, description } : photo)),
        ),
      ),
    remove: (id: string) => run(() => remove(id)),
    /** Puts a photo that was just sent into its place, and drops the one it replaces. */
    place: (added: PhotoView, replacesId: string | null) =>
      run(async () => {
        if (replacesId === null) return arrangePhotos(lotCode, [...photos, added]);
        const order = retaken(photos, added, replacesId);
        if (photos.some(({ id }) => id === replacesId)) await removePhoto(lotCode, replacesId);
        return arrangePhotos(lotCode, order);
      }),
  };
}
