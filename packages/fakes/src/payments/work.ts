import { newId } from './ids.ts';
import type { Kind, Kinds, TaskName } from './kinds.ts';
import { missing } from './errors.ts';
import type { Store } from './store.ts';

/** What the stand-in needs to know of its surroundings. */
export interface PaymentsSettings {
  /** Where a browser reaches the hosted pages, without a slash at the end. */
  publicUrl: string;
  /** Seconds until a card payment's funds turn from pending to available. */
  fundsDelayS: number;
  /** Seconds between funds becoming available on a connected account, its payout, and the payout's arrival. */
  payoutDelayS: number;
}

/** Everything one request or one task works with; `owner` is the connected account acted for, or null. */
export interface Work {
  store: Store;
  settings: PaymentsSettings;
  nowS: number;
  owner: string | null;
  request: { id: string | null; idempotency_key: string | null };
}

/** Seconds since the epoch by the stand-in's clock, which the control API can move ahead. */
export function clockS(store: Store): number {
  return Math.floor(Date.now() / 1000) + (store.find('clock', 'clock')?.aheadS ?? 0);
}

/** The object with this id in the account acted for; otherwise the processor's 404. */
export function mustFind<K extends Kind>(work: Work, kind: K, id: string, param?: string): Kinds[K] {
  const row = work.store.row(kind, id);
  if (!row || row.owner !== work.owner) throw missing(kind.replace('.', ' ').replace('_', ' '), id, param);
  return row.value;
}

/** Plans a task `inS` seconds from now. */
export function schedule(work: Work, name: TaskName, subject: string, inS: number): void {
  work.store.put('task', { id: newId('task'), name, subject, dueAtS: work.nowS + inS });
}
