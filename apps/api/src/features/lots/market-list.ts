import type { LotList, LotQuery } from '@lydite/contracts';
import type { Actor } from '../../platform/actor.ts';
import type { World } from '../../platform/world.ts';
import { marketList } from './market-list.queries.ts';

/** The list of open lots; today ends at midnight of the market's zone. */
export async function listMarket(
  { db, settings }: Pick<World, 'db' | 'settings'>,
  { query, actor }: { query: LotQuery; actor: Actor | null },
): Promise<LotList> {
  const clock: { now: Date; endOfToday: Date }[] = await db.query(
    `select now, (date_trunc('day', now at time zone $1) + interval '1 day') at time zone $1 as "endOfToday" from (select market_now() as now) clock`,
    [settings.MARKET_ZONE],
  );
  return marketList(db.manager, query, { ...clock[0]!, memberId: actor?.id ?? null });
}
