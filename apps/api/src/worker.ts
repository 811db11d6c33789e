import { openWorld } from './open-world.ts';
import { startJobs } from './platform/jobs.ts';
import { readSettings } from './settings.ts';
import { createInbox, createRunner, jobHandlers, loop } from './work.ts';

const settings = readSettings(process.env);
const world = await openWorld(settings);
const jobs = await startJobs({ url: settings.JOBS_DATABASE_URL, log: world.log, handlers: jobHandlers(world) });
const runner = createRunner(world, { alarm: jobs.ring });
const onError = (error: unknown): void => world.log.error({ err: error }, 'worker');
const inbox = createInbox(world);
const loops = [runner, inbox].map((one) => loop(() => one.runOne(), { idleMs: 250, onError }));
world.log.info('the worker runs');

async function stop(): Promise<void> {
  await Promise.all(loops.map((one) => one.stop()));
  await jobs.stop();
  await world.close();
  process.exit(0);
}
process.once('SIGTERM', () => void stop());
process.once('SIGINT', () => void stop());
