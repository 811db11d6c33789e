import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { readCatalogue } from './catalogue.service.ts';

export function catalogueRoutes(on: On, world: Pick<World, 'db'>): void {
  on('GET /catalogue', () => readCatalogue(world));
  on('GET /catalogue/:version', ({ params }) => readCatalogue(world, params.version));
}
