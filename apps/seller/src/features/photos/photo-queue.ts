import { isApiError } from '@lydite/client';
import type { PhotoSlot, PhotoView } from '@lydite/contracts';

const retryAfterMs = 10_000;

/** A photo chosen and not sent yet, as this device keeps it. */
export interface WaitingPhoto {
  id: string;
  slot: PhotoSlot;
  name: string;
  file: File;
  /** Milliseconds since 1970; photos go in this order. */
  chosenAtMs: number;
  /** The photo this one is taken instead of. */
  replacesId: string | null;
}

export interface QueuedPhoto extends WaitingPhoto {
  state: 'waiting' | 'sending' | 'refused';
  /** Share of the bytes sent, 0 … 1. */
  share: number;
  /** Why the market refused it, or why it waits. */
  message: string;
}

export interface QueueParts {
  send: (
    photo: WaitingPhoto,
    options: { onProgress: (share: number) => void; signal: AbortSignal },
  ) => Promise<PhotoView>;
  keep: (photo: WaitingPhoto) => Promise<unknown>;
  forget: (id: string) => Promise<unknown>;
}

/** Puts a photo that was sent where it belongs; its own failures are its own to tell. */
export type PhotoReceiver = (photo: PhotoView, replacesId: string | null) => Promise<unknown>;

export interface QueueSnapshot {
  photos: readonly QueuedPhoto[];
  isOffline: boolean;
}

export type PhotoQueue = ReturnType<typeof createPhotoQueue>;

/**
 * Sends photos one at a time, in the order they were chosen. A lost connection is waited out; a refused photo stays with its
 * reason until it is tried again or let go, and never holds up the others.
 */
export function createPhotoQueue({ send, keep, forget }: QueueParts) {
  let snapshot: QueueSnapshot = { photos: [], isOffline: false };
  const listeners = new Set<() => void>();
  let receive: PhotoReceiver | undefined;
  let running: { id: string; abort: AbortController } | null = null;
  let timer: ReturnType<typeof setTimeout> | undefined;

  const put = (change: Partial<QueueSnapshot>) => {
    snapshot = { ...snapshot, ...change };
    for (const listener of listeners) listener();
  };
  const change = (id: string, to: Partial<QueuedPhoto>) =>
    put({ photos: snapshot.photos.map((photo) => (photo.id === id ? { ...photo, ...to } : photo)) });
  const drop = (id: string) => {
    put({ photos: snapshot.photos.filter((photo) => photo.id !== id) });
    void forget(id);
  };

  const next = async (): Promise<void> => {
    const photo = snapshot.photos.find(({ state }) => state === 'waiting');
    if (running || !photo) return;
    clearTimeout(timer);
    const abort = new AbortController();
    running = { id: photo.id, abort };
    change(photo.id, { state: 'sending', share: 0, message: '' });
    try {
      const sent = await send(photo, { onProgress: (share) => change(photo.id, { share }), signal: abort.signal });
      put({ isOffline: false });
      await receive?.(sent, photo.replacesId);
      drop(photo.id);
    } catch (error) {
      if (!abort.signal.aborted) fail(photo.id, error);
    } finally {
      running = null;
    }
    if (!snapshot.isOffline) await next();
  };

  const fail = (id: string, error: unknown) => {
    const message = (error as Error).message;
    const isPassing = isApiError(error, 'network', 'request.too_many') || (isApiError(error) && error.status >= 500);
    if (!isPassing) return change(id, { state: 'refused', message });
    change(id, { state: 'waiting', share: 0, message });
    put({ isOffline: true });
    timer = setTimeout(resume, retryAfterMs);
  };
  const resume = () => {
    put({ isOffline: false });
    void next();
  };

  const enqueue = (photos: readonly WaitingPhoto[]) => {
    const fresh = photos.filter(({ id }) => !snapshot.photos.some((known) => known.id === id));
    put({
      photos: [
        ...snapshot.photos,
        ...fresh.map((photo) => ({ ...photo, state: 'waiting' as const, share: 0, message: '' })),
      ],
    });
    void next();
  };

  return {
    snapshot: () => snapshot,
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
    add: (photos: readonly WaitingPhoto[]) => {
      for (const photo of photos) void keep(photo);
      enqueue(photos);
    },
    /** Photos kept from an earlier visit; each is taken up once. */
    restore: enqueue,
    retry: (id: string) => {
      change(id, { state: 'waiting', message: '' });
      resume();
    },
    cancel: (id: string) => {
      if (running?.id === id) running.abort.abort();
      drop(id);
    },
    resume,
    /** Who is told of photos that were sent. */
    deliverTo: (receiver: PhotoReceiver) => {
      receive = receiver;
    },
    stop: () => clearTimeout(timer),
  };
}
