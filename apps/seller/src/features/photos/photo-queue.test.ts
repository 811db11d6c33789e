import { ApiError } from '@lydite/client';
import type { PhotoView } from '@lydite/contracts';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { createPhotoQueue, type WaitingPhoto } from './photo-queue.ts';

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

const waiting = (id: string): WaitingPhoto => ({
  id,
  slot: 'whole',
  name: `${id}.jpg`,
  file: new File(['x'], `${id}.jpg`, { type: 'image/jpeg' }),
  chosenAtMs: 1,
  replacesId: null,
});
const sent = (id: string): PhotoView => ({ id, slot: 'whole', description: '', width: 4, height: 3, colour: '#333' });
const refusal = (code: 'network' | 'photo.unreadable', detail: string) =>
  new ApiError({ code, status: code === 'network' ? 0 : 422, detail, fields: [], requestId: 'r' });

function setUp() {
  const answers = new Map<string, { resolve: () => void; reject: (error: unknown) => void; signal: AbortSignal }>();
  const kept = new Set<string>();
  const received: string[] = [];
  const queue = createPhotoQueue({
    send: ({ id }, { signal }) =>
      new Promise((resolve, reject) => {
        answers.set(id, { resolve: () => resolve(sent(id)), reject, signal });
        signal.addEventListener('abort', () => reject(new DOMException('gone', 'AbortError')));
      }),
    keep: ({ id }) => Promise.resolve(kept.add(id)),
    forget: (id) => Promise.resolve(kept.delete(id)),
  });
  queue.deliverTo(({ id }) => Promise.resolve(received.push(id)));
  const states = () => queue.snapshot().photos.map(({ id, state }) => `${id} ${state}`);
  const settle = () => vi.advanceTimersByTimeAsync(0);
  return { queue, answers, kept, received, states, settle };
}

it('sends one at a time, in the order chosen, and forgets what was sent', async () => {
  const { queue, answers, kept, received, states, settle } = setUp();
  queue.add([waiting('a'), waiting('b')]);
  expect(states()).toEqual(['a sending', 'b waiting']);
  expect(answers.has('b')).toBe(false);
  answers.get('a')!.resolve();
  await settle();
  expect(states()).toEqual(['b sending']);
  answers.get('b')!.resolve();
  await settle();
  expect(received).toEqual(['a', 'b']);
  expect(kept.size).toBe(0);
});

it('keeps a refused photo with its reason, goes on with the next, and tries again when told', async () => {
  const { queue, answers, kept, states, settle } = setUp();
  queue.add([waiting('a'), waiting('b')]);
  answers.get('a')!.reject(refusal('photo.unreadable', 'This is no picture.'));
  await settle();
  expect(states()).toEqual(['a refused', 'b sending']);
  expect(queue.snapshot().photos[0]!.message).toBe('This is no picture.');
  expect(kept.has('a')).toBe(true);
  answers.get('b')!.resolve();
  await settle();
  queue.retry('a');
  await settle();
  expect(states()).toEqual(['a sending']);
});

it('waits out a lost connection and sends the same photo then', async () => {
  const { queue, answers, received, states, settle } = setUp();
  queue.add([waiting('a')]);
  answers.get('a')!.reject(refusal('network', 'No connection.'));
  await settle();
  expect(queue.snapshot().isOffline).toBe(true);
  expect(states()).toEqual(['a waiting']);
  await vi.advanceTimersByTimeAsync(10_000);
  answers.get('a')!.resolve();
  await settle();
  expect(received).toEqual(['a']);
  expect(queue.snapshot().isOffline).toBe(false);
});

it('stops a photo on its way when it is cancelled, and goes on', async () => {
  const { queue, answers, kept, states, settle } = setUp();
  queue.add([waiting('a'), waiting('b')]);
  queue.cancel('a');
  await settle();
  expect(answers.get('a')!.signal.aborted).toBe(true);
  expect(states()).toEqual(['b sending']);
  expect(kept.has('a')).toBe(false);
});

it('takes photos kept from an earlier visit up once', () => {
  const { queue, states } = setUp();
  queue.restore([waiting('a')]);
  queue.restore([waiting('a')]);
  expect(states()).toEqual(['a sending']);
});
