import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { createMarketService } from './market.service.ts';

export function marketRoutes(on: On, world: Pick<World, 'db' | 'settings'>): void {
  const market = createMarketService(world);
  on('GET /market', () => market.read());
}
