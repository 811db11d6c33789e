import { createApp } from './app.ts';
import { openWorld } from './open-world.ts';
import { readSettings } from './settings.ts';

const settings = readSettings(process.env);
const world = await openWorld(settings);
const server = createApp(world).listen(settings.PORT, settings.HOST, (error) => {
  if (error) throw error;
  world.log.info({ port: settings.PORT }, 'the market is open');
});

/** Lets running answers finish, then closes the connections. */
async function stop(): Promise<void> {
  server.close();
  server.closeIdleConnections();
  await world.close();
  process.exit(0);
}
process.once('SIGTERM', () => void stop());
process.once('SIGINT', () => void stop());
