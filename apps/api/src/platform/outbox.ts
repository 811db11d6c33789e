import type { DataSource, EntityManager } from 'typeorm';

export interface OutboxItem {
  /** Which handler carries it out. */
  kind: string;
  /** Decided before the effect and sent along with it: the same key never has two effects. */
  key: string;
  payload: Record<string, unknown>;
}

/** Orders an outside effect inside the caller's transaction: it happens if and only if that commits. Twice the same key is once. */
export async function addToOutbox(tx: EntityManager, { kind, key, payload }: OutboxItem): Promise<void> {
  await tx.query('insert into outbox (kind, key, payload) values ($1, $2, $3) on conflict (key) do nothing', [
    kind,
    key,
    JSON.stringify(payload),
  ]);
}

export interface ClaimedItem extends OutboxItem {
  id: string;
  attempts: number;
  /** When the first attempt began. After a day an idempotency key proves nothing: look the object up before making it again. */
  firstTriedAt: Date;
}

/** Carries out one kind of effect. Must bear being run twice with the same key. */
export type OutboxHandler = (item: ClaimedItem) => Promise<void>;

/** An effect that no retry can bring about; the item is set aside for the desk. */
export class HopelessEffect extends Error {}

const leaseSeconds = 120;
/** About a week: money that is owed outlasts a long weekend's outage. */
const mostAttempts = 350;

/** 2 s, 4 s, 8 s … at most half an hour. */
const backoffSeconds = (attempts: number): number => Math.min(1800, 2 ** Math.min(attempts, 11));

/**
 * Runs due effects. An item is claimed in a transaction of its own by moving its next attempt past the lease, so that a
 * worker that dies holds nothing up for longer than that, and no lock is held during the call.
 */
export function createOutboxRunner(
  db: DataSource,
  handlers: Record<string, OutboxHandler>,
  onError: (error: unknown, item: ClaimedItem) => void,
) {
  const kinds = Object.keys(handlers);

  async function claim(): Promise<ClaimedItem | undefined> {
    const [rows]: [Record<string, unknown>[], number] = await db.query(
      `update outbox set attempts = attempts + 1, first_tried_at = coalesce(first_tried_at, clock_timestamp()),
              next_at = clock_timestamp() + make_interval(secs => $2)
        where id = (select id from outbox where state = 'pending' and kind = any($1) and next_at <= clock_timestamp()
                     order by next_at, id limit 1 for update skip locked)
        returning id, kind, key, payload, attempts, first_tried_at as "firstTriedAt"`,
      [kinds, leaseSeconds],
    );
    return rows[0] as ClaimedItem | undefined;
  }

  async function fail(item: ClaimedItem, error: unknown): Promise<void> {
    const dead = error instanceof HopelessEffect || item.attempts >= mostAttempts;
    onError(error, item);
    await db.query(
      `update outbox set state = $2, last_error = $3, next_at = clock_timestamp() + make_interval(secs => $4) where id = $1 and state = 'pending'`,
      [
        item.id,
        dead ? 'dead' : 'pending',
        String(error instanceof Error ? error.message : error).slice(0, 500),
        backoffSeconds(item.attempts),
      ],
    );
  }

  return {
    /** Carries out one due item; false when none is due. */
    async runOne(): Promise<boolean> {
      const item = await claim();
      if (!item) return false;
      try {
        await handlers[item.kind]!(item);
        await db.query(`update outbox set state = 'done', done_at = market_now(), last_error = null where id = $1`, [
          item.id,
        ]);
      } catch (error) {
        await fail(item, error);
      }
      return true;
    },
    async runAll(): Promise<number> {
      let count = 0;
      while (await this.runOne()) count += 1;
      return count;
    },
  };
}
export type OutboxRunner = ReturnType<typeof createOutboxRunner>;
