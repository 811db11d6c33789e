import PgBoss from 'pg-boss';
import type { EntityManager } from 'typeorm';
import type { Log } from './log.ts';
import { addToOutbox, type OutboxHandler } from './outbox.ts';

/** Work that waits for a moment (`lot.close`, `deal.deadline`, …) or recurs (`sweep`, …). */
export const jobNames = [
  'lot.close',
  'under-offer.lapse',
  'deal.deadline',
  'sweep',
  'prices.take',
  'payments.poll',
  'ledger.check',
] as const;
export type JobName = (typeof jobNames)[number];

/** Jobs are alarm clocks only: a handler looks at the row and does what is due, so that a late or doubled alarm changes nothing. */
export type JobHandler = (objectId: string) => Promise<void>;
export type JobHandlers = Record<JobName, JobHandler>;

interface Alarm {
  job: JobName;
  objectId: string;
  at: Date;
}

/** Sets an alarm inside the caller's transaction; it rings only if that commits. */
export const setAlarm = (tx: EntityManager, { job, objectId, at }: Alarm): Promise<void> =>
  addToOutbox(tx, {
    kind: 'alarm',
    key: `alarm:${job}:${objectId}:${at.toISOString()}`,
    payload: { job, objectId, at: at.toISOString() },
  });

/** Recurring jobs, as cron lines in UTC. */
const recurring: Partial<Record<JobName, string>> = {
  sweep: '* * * * *',
  'prices.take': '*/10 * * * *',
  'payments.poll': '7 * * * *',
  'ledger.check': '12 3 * * *',
};

interface Batch {
  handler: JobHandler;
  objectIds: readonly string[];
  onError: (error: unknown, objectId: string) => void;
}

/**
 * Runs jobs one after the other; one that fails keeps no other from running.
 * @throws Error when any failed, so that the queue rings for all of them again
 */
export async function runBatch({ handler, objectIds, onError }: Batch): Promise<void> {
  let failed = 0;
  for (const objectId of objectIds)
    await handler(objectId).catch((error: unknown) => {
      failed += 1;
      onError(error, objectId);
    });
  if (failed > 0) throw new Error(`${failed} of ${objectIds.length} jobs failed`);
}

export async function startJobs({ url, log, handlers }: { url: string; log: Log; handlers: JobHandlers }) {
  const boss = new PgBoss({ connectionString: url, schema: 'pgboss', max: 4, application_name: 'lydite-jobs' });
  boss.on('error', (error) => log.error({ err: error }, 'job queue'));
  await boss.start();
  for (const name of jobNames) {
    // `short` keeps one waiting job per key; on a standard queue the same key would be taken twice.
    await boss.createQueue(name, {
      name,
      policy: 'short',
      retryLimit: 5,
      retryDelay: 5,
      retryBackoff: true,
      expireInSeconds: 300,
    });
    // The queue is asked once a second, and at 18:00 many deadlines end at once.
    await boss.work<{ objectId?: string }>(name, { pollingIntervalSeconds: 1, batchSize: 50 }, (jobs) =>
      runBatch({
        handler: handlers[name],
        objectIds: jobs.map((job) => job.data?.objectId ?? ''),
        onError: (error, objectId) => log.error({ err: error, job: name, objectId }, 'a job failed'),
      }),
    );
    const cron = recurring[name];
    if (cron) await boss.schedule(name, cron);
  }

  const ring: OutboxHandler = async ({ payload }) => {
    const { job, objectId, at } = payload as { job: JobName; objectId: string; at: string };
    await boss.send(job, { objectId }, { startAfter: new Date(at), singletonKey: `${objectId}@${at}` });
  };
  return { ring, stop: () => boss.stop({ graceful: true, timeout: 5000 }) };
}
