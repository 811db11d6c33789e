import type { PhotoSlot } from '@lydite/contracts';
import { createContext, useContext, useEffect, useState, useSyncExternalStore, type ReactNode } from 'react';
import { createPhotoQueue, type PhotoQueue, type PhotoReceiver, type QueueSnapshot } from './photo-queue.ts';
import { keptPhotos, queueCalls } from './photos.queries.ts';

const Context = createContext<PhotoQueue | null>(null);

interface PhotoQueueProviderProps {
  memberId: string;
  lotCode: string;
  /** Puts a photo that was sent into its place. */
  onSent: PhotoReceiver;
  children: ReactNode;
}

/** Sends photos while the seller goes on with other pages, and takes up those left from an earlier visit. */
export function PhotoQueueProvider({ memberId, lotCode, onSent, children }: PhotoQueueProviderProps) {
  const [queue] = useState(() => createPhotoQueue(queueCalls(memberId, lotCode)));
  useEffect(() => queue.deliverTo(onSent), [queue, onSent]);
  useEffect(() => {
    void keptPhotos(memberId, lotCode).then(queue.restore);
    addEventListener('online', queue.resume);
    return () => {
      removeEventListener('online', queue.resume);
      queue.stop();
    };
  }, [queue, memberId, lotCode]);
  return <Context value={queue}>{children}</Context>;
}

export interface PhotoSending extends QueueSnapshot {
  choose: (files: Iterable<File>, slot: PhotoSlot, replacesId?: string | null) => void;
  retry: (id: string) => void;
  cancel: (id: string) => void;
}

/** The photos on their way and how to add to them. Only below a `PhotoQueueProvider`. */
export function usePhotoSending(): PhotoSending {
  const queue = useContext(Context);
  if (!queue) throw new Error('usePhotoSending stands outside a PhotoQueueProvider');
  const snapshot = useSyncExternalStore(queue.subscribe, queue.snapshot);
  return {
    ...snapshot,
    choose: (files, slot, replacesId = null) =>
      queue.add(
        [...files].map((file, i) => ({
          id: crypto.randomUUID(),
          slot,
          name: file.name,
          file,
          chosenAtMs: Date.now() + i,
          replacesId,
        })),
      ),
    retry: queue.retry,
    cancel: queue.cancel,
  };
}
