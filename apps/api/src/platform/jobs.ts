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
    await boss.work<{ objectId?: string }>(name, { pollingIntervalSeconds: 1 }, async (jobs) => {
      for (const job of jobs) await handlers[name](job.data?.objectId ?? '');
    });
    const cron = recurring[name];
    if (cron) await boss.schedule(name, cron);
  }

  const ring: OutboxHandler = async ({ payload }) => {
    const { job, objectId, at } = payload as { job: JobName; objectId: string; at: string };
    await boss.send(job, { objectId }, { startAfter: new Date(at), singletonKey: `${objectId}@${at}` });
  };
  return { ring, stop: () => boss.stop({ graceful: true, timeout: 5000 }) };
}
