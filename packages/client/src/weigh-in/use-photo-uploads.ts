import type { PhotoView } from '@lydite/contracts';
import { useRef, useState } from 'react';
import { isApiError } from '../call/api-error.ts';
import { upload } from '../call/upload.ts';
import { shrinkPhoto } from '../photos/shrink-photo.ts';

export interface PendingPhoto {
  id: string;
  file: File;
  /** Share of the bytes sent, 0 … 1. */
  share: number;
  /** Why it was refused or did not get through; it can be sent again. */
  error: string | null;
}

/** Sends photos of a weigh-in one after the other, which suits a slow link best. `onSent` gets each as the server keeps it. */
export function usePhotoUploads(dealCode: string, onSent: (photo: PhotoView) => void) {
  const [pending, setPending] = useState<PendingPhoto[]>([]);
  const line = useRef(Promise.resolve());
  const change = (id: string, part: Partial<PendingPhoto>) =>
    setPending((photos) => photos.map((photo) => (photo.id === id ? { ...photo, ...part } : photo)));
  const drop = (id: string) => setPending((photos) => photos.filter((photo) => photo.id !== id));

  const send = async ({ id, file }: PendingPhoto) => {
    try {
      const photo = await upload('POST /deals/:dealCode/photos', { dealCode }, await shrinkPhoto(file), {
        onProgress: (share) => change(id, { share }),
      });
      onSent(photo);
      drop(id);
    } catch (error) {
      change(id, { error: isApiError(error) ? error.message : 'The photo could not be sent.', share: 0 });
    }
  };
  const queue = (photo: PendingPhoto) => {
    line.current = line.current.then(() => send(photo));
  };

  return {
    pending,
    add: (files: Iterable<File>) => {
      const added = Array.from(files, (file) => ({ id: crypto.randomUUID(), file, share: 0, error: null }));
      setPending((photos) => [...photos, ...added]);
      added.forEach(queue);
    },
    retry: (photo: PendingPhoto) => {
      change(photo.id, { error: null });
      queue(photo);
    },
    drop,
  };
}
