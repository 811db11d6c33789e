import { createDataSource } from './data-source.ts';
import { createFolderStore } from './platform/files.ts';
import { createLog } from './platform/log.ts';
import { createMailer } from './platform/mail.ts';
import { createPriceSource } from './platform/prices.ts';
import { createProcessorGateway } from './platform/processor-gateway.ts';
import { createSessions } from './platform/session.ts';
import type { World } from './platform/world.ts';
import type { Settings } from './settings.ts';

/** Connects to everything outside the process, for the API, the worker and the commands alike. */
export async function openWorld(settings: Settings): Promise<World & { close(): Promise<void> }> {
  const log = createLog(settings);
  const db = await createDataSource(settings.DATABASE_URL, {
    zone: settings.MARKET_ZONE,
    currency: settings.MARKET_CURRENCY,
    poolSize: settings.DATABASE_POOL,
  }).initialize();
  const mail = createMailer(settings);
  return {
    settings,
    db,
    log,
    sessions: createSessions({ db, settings }),
    mail,
    prices: createPriceSource(settings.PRICES_URL),
    files: createFolderStore(settings.FILES_DIR),
    payments: createProcessorGateway(settings),
    async close() {
      mail.close();
      await db.destroy();
    },
  };
}
