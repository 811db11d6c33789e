import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { readPhoto } from './photos.service.ts';

export function photoRoutes(on: On, world: Pick<World, 'db' | 'files'>): void {
  on('GET /photos/:photoId/:size', ({ params, actor }) => readPhoto(world, { ...params, actor }));
}
