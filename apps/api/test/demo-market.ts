import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startPayments, startPrices } from '@lydite/fakes';
import { createOwnerSource } from '../src/data-source.ts';
import { createPriceSource } from '../src/platform/prices.ts';
import { createProcessorGateway } from '../src/platform/processor-gateway.ts';
import { seedMarket } from '../src/seeds/seed-market.ts';
import { openMarket } from './market.ts';

const photosFolder = join(import.meta.dirname, '..', 'src', 'seeds', 'photos');

/** An empty market with the stand-ins of payments and prices in this process; `seed` plays the demo into it. */
export async function openDemoMarket() {
  const dir = await mkdtemp(join(tmpdir(), 'lydite-seed-'));
  const payments = await startPayments({ port: 0, dir, fundsDelayS: 1, payoutDelayS: 1 });
  const prices = await startPrices({ port: 0 });
  const market = await openMarket({
    payments: createProcessorGateway,
    env: { PAYMENTS_API_URL: `http://127.0.0.1:${payments.port}`, LIMITS: 'on' },
  });
  const owner = await createOwnerSource(market.database.ownerUrl).initialize();
  const world = { ...market.world, prices: createPriceSource(`http://127.0.0.1:${prices.port}`) };
  return {
    market,
    world,
    seed: () => seedMarket({ world, owner, photosFolder }),
    async close(): Promise<void> {
      await owner.destroy();
      await market.close();
      await Promise.all([payments.close(), prices.close()]);
      await rm(dir, { recursive: true, force: true });
    },
  };
}
