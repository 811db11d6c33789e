import { createHash } from 'node:crypto';
import type { Request } from 'express';
import { ProcessorError } from './errors.ts';
import type { Store } from './store.ts';
import type { Work } from './work.ts';

interface Attempt {
  key: string;
  fingerprint: string;
  work: Work;
  /** How long the request is held in flight before it runs: a planned fault. */
  delayMs: number;
  run: () => { status: number; body: string; notExecuted: boolean };
}

const DAY_S = 86_400;

/** What must be the same when a key is used again: method, path and parameters, in any order. */
export function fingerprintOf(req: Request, input: unknown): string {
  const text = `${req.method} ${req.originalUrl.split('?')[0]} ${JSON.stringify(sorted(input))}`;
  return createHash('sha256').update(text).digest('hex');
}

function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (!value || typeof value !== 'object') return value;
  const entries = Object.entries(value).toSorted(([a], [b]) => (a < b ? -1 : 1));
  return Object.fromEntries(entries.map(([key, inner]) => [key, sorted(inner)]));
}

export type KeyedAnswers = ReturnType<typeof createKeyedAnswers>;

/**
 * Remembers the first status and body of each idempotency key, errors and 500s included, in the same commit
 * as the objects. A request that failed validation, or met another in flight, leaves its key free.
 */
export function createKeyedAnswers(store: Store) {
  const inFlight = new Set<string>();
  return {
    /** Runs the request once per key and account; a repeat gets the first answer. Throws 400 and 409. */
    async answerOnce({ key, fingerprint, work, delayMs, run }: Attempt) {
      if (key.length > 255) throw refusedKey(400, 'idempotency_error', 'Idempotency keys are at most 255 characters.');
      const id = `${work.owner ?? 'market'}:${key}`;
      if (inFlight.has(id)) {
        const message = `There is currently another in-progress request using this key: ${key}.`;
        throw refusedKey(409, 'invalid_request_error', message, 'idempotency_key_in_use');
      }
      const stored = store.find('answer', id);
      if (stored && stored.createdAtS > work.nowS - DAY_S) return replay(stored, fingerprint, key);
      inFlight.add(id);
      try {
        if (delayMs > 0) await new Promise((resolve) => setTimeout(resolve, delayMs));
        const answer = store.atomically(() => {
          const first = run();
          const { status, body } = first;
          const requestId = work.request.id ?? '';
          if (!first.notExecuted) {
            store.put('answer', { id, fingerprint, status, body, requestId, createdAtS: work.nowS });
          }
          return first;
        });
        return { ...answer, replayed: false };
      } finally {
        inFlight.delete(id);
      }
    },
  };
}

function replay(stored: { fingerprint: string; status: number; body: string }, fingerprint: string, key: string) {
  if (stored.fingerprint !== fingerprint) {
    const message = `Keys for idempotent requests can only be used with the same parameters they were first used with: ${key}.`;
    throw refusedKey(400, 'idempotency_error', message);
  }
  return { status: stored.status, body: stored.body, notExecuted: false, replayed: true };
}

function refusedKey(
  status: number,
  type: 'idempotency_error' | 'invalid_request_error',
  message: string,
  code?: string,
) {
  return new ProcessorError(status, { type, message, ...(code && { code }) }, { notExecuted: true });
}
