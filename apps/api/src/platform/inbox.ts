import type { DataSource, EntityManager } from 'typeorm';
import type { ProcessorEvent } from './payments.ts';

/** Keeps an event of the processor until its effect is done. The same event twice is once. */
export async function addToInbox(
  tx: EntityManager,
  { id, kind, accountId, objectId, at }: ProcessorEvent,
): Promise<void> {
  await tx.query(
    `insert into inbox (event_id, kind, account_id, object_id, payload) values ($1, $2, $3, $4, $5) on conflict (event_id) do nothing`,
    [id, kind, accountId, objectId, JSON.stringify({ at: at.toISOString() })],
  );
}

export interface ClaimedEvent {
  eventId: string;
  /** The processor's name of the event. */
  kind: string;
  accountId: string | null;
  objectId: string;
  attempts: number;
}

/** Re-reads the object an event is about and moves ours forward. Events come in any order, and more than once. */
export type EventHandler = (event: ClaimedEvent) => Promise<void>;

const leaseSeconds = 120;

/** 2 s, 4 s, 8 s … at most half an hour; an event is never given up: money hangs on it. */
const backoffSeconds = (attempts: number): number => Math.min(1800, 2 ** Math.min(attempts, 11));

/** Runs waiting events, claimed like the outbox's items, so that no lock is held while the processor is asked. */
export function createInboxRunner(
  db: DataSource,
  handle: EventHandler,
  onError: (error: unknown, event: ClaimedEvent) => void,
) {
  async function claim(): Promise<ClaimedEvent | undefined> {
    const [rows]: [ClaimedEvent[], number] = await db.query(
      `update inbox set attempts = attempts + 1, next_at = clock_timestamp() + make_interval(secs => $1)
        where event_id = (select event_id from inbox where processed_at is null and next_at <= clock_timestamp()
                           order by next_at, received_at limit 1 for update skip locked)
        returning event_id as "eventId", kind, account_id as "accountId", object_id as "objectId", attempts`,
      [leaseSeconds],
    );
    return rows[0];
  }

  return {
    /** Works off one due event; false when none is due. */
    async runOne(): Promise<boolean> {
      const event = await claim();
      if (!event) return false;
      try {
        await handle(event);
        await db.query('update inbox set processed_at = market_now(), last_error = null where event_id = $1', [
          event.eventId,
        ]);
      } catch (error) {
        onError(error, event);
        await db.query(
          'update inbox set last_error = $2, next_at = clock_timestamp() + make_interval(secs => $3) where event_id = $1',
          [
            event.eventId,
            String(error instanceof Error ? error.message : error).slice(0, 500),
            backoffSeconds(event.attempts),
          ],
        );
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
export type InboxRunner = ReturnType<typeof createInboxRunner>;
