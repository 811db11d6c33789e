import type { MyLotRow } from '@lydite/contracts';
import { marketNow } from '../../platform/clock.ts';
import type { World } from '../../platform/world.ts';
import { myLotRows } from './my-lots.queries.ts';

export const myLots = async ({ db }: Pick<World, 'db'>, sellerId: string): Promise<MyLotRow[]> =>
  myLotRows(db.manager, { sellerId, now: await marketNow(db.manager) });
