import { openWorld } from './open-world.ts';
import { startJobs } from './platform/jobs.ts';
import { readSettings } from './settings.ts';
import { createInbox, createRunner, jobHandlers, loop } from './work.ts';

const settings = readSettings(process.env);
const world = await openWorld(settings);
const handlers = jobHandlers(world);
const jobs = await startJobs({ url: settings.JOBS_DATABASE_URL, log: world.log, handlers });
const runner = createRunner(world, { alarm: jobs.ring });
const onError = (error: unknown): void => world.log.error({ err: error }, 'worker');
const inbox = createInbox(world);
const loops = [runner, inbox].map((one) => loop(() => one.runOne(), { idleMs: 250, onError }));
// A new market must not wait for the next ten minutes to have a price: listing needs one.
handlers['prices.take']('').catch(onError);
world.log.info('the worker runs');

async function stop(): Promise<void> {
  await Promise.all(loops.map((one) => one.stop()));
  await jobs.stop();
  await world.close();
  process.exit(0);
}
process.once('SIGTERM', () => void stop());
process.once('SIGINT', () => void stop());
