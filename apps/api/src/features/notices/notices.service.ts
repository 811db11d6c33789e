import type { Actor } from '../../platform/actor.ts';
import type { World } from '../../platform/world.ts';
import { markRead, noticesOf } from './notices.queries.ts';

export const createNoticesService = ({ db }: Pick<World, 'db'>) => ({
  list: (actor: Actor) => noticesOf(db.manager, actor.id),
  markRead: (actor: Actor) => markRead(db.manager, actor.id),
});
export type NoticesService = ReturnType<typeof createNoticesService>;
