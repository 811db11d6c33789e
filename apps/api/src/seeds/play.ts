import type { DateTime } from 'luxon';
import type { DataSource } from 'typeorm';
import type { JobHandlers, JobName } from '../platform/jobs.ts';
import type { Clock } from './time.ts';

/** Acts, then yields the moment at which it goes on. */
export type Story = AsyncGenerator<DateTime, void, void>;

interface Play {
  db: DataSource;
  clock: Clock;
  /** The present: no story reaches past it. */
  end: DateTime;
  handlers: JobHandlers;
  /** Carries out what the last step has ordered outside the database. */
  work: () => Promise<void>;
}

interface Running {
  story: Story;
  wakesAt: DateTime;
}

/** Plays all stories at once in the order of the market's time, and rings each alarm at its moment, as the worker would. */
export async function playStories(play: Play, stories: readonly Story[]): Promise<void> {
  const running: Running[] = [];
  for (const story of stories) await goOn(play, running, story);
  for (;;) {
    const next = running.toSorted((a, b) => a.wakesAt.toMillis() - b.wakesAt.toMillis())[0];
    const alarm = await nextAlarm(play.db);
    const until = next?.wakesAt ?? play.end;
    if (alarm && alarm.at.getTime() <= until.toMillis()) {
      await ring(play, alarm);
    } else {
      if (!next) return;
      running.splice(running.indexOf(next), 1);
      await play.clock.moveTo(next.wakesAt.toJSDate());
      await goOn(play, running, next.story);
    }
    await play.work();
  }
}

async function goOn({ end }: Play, running: Running[], story: Story): Promise<void> {
  const step = await story.next();
  if (step.done) return;
  if (step.value > end) throw new RangeError(`A story reaches past the present: ${step.value.toISO()}`);
  running.push({ story, wakesAt: step.value });
}

interface Alarm {
  id: string;
  job: JobName;
  objectId: string;
  at: Date;
}

/** The earliest alarm still in the outbox. Those of the future stay there for the worker. */
async function nextAlarm(db: DataSource): Promise<Alarm | undefined> {
  const rows: Alarm[] = await db.query(
    `select id, payload->>'job' as job, payload->>'objectId' as "objectId", (payload->>'at')::timestamptz as at
       from outbox where kind = 'alarm' and state = 'pending' order by (payload->>'at')::timestamptz, id limit 1`,
  );
  return rows[0];
}

async function ring({ db, clock, handlers }: Play, { id, job, objectId, at }: Alarm): Promise<void> {
  await clock.moveTo(at);
  await handlers[job](objectId);
  await db.query(`update outbox set state = 'done', done_at = market_now() where id = $1`, [id]);
}
