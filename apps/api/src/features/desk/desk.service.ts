import type { Actor } from '../../platform/actor.ts';
import type { World } from '../../platform/world.ts';
import { approveDeal } from './approve-deal.ts';
import { dealsPage } from './deals.queries.ts';
import { lotsPage } from './lots.queries.ts';
import { membersPage } from './members.queries.ts';
import type { DeskQuery } from './paging.ts';
import { verifyMember } from './verify-member.ts';
import { jobQueues, outboxPage } from './work.queries.ts';

export const createDeskService = (world: Pick<World, 'db'>) => {
  const { manager } = world.db;
  return {
    members: (query: DeskQuery) => membersPage(manager, query),
    verify: (actor: Actor, order: Parameters<typeof verifyMember>[2]) => verifyMember(world, actor, order),
    lots: (query: DeskQuery) => lotsPage(manager, query),
    deals: (query: DeskQuery) => dealsPage(manager, query),
    approve: (actor: Actor, dealCode: string) => approveDeal(world, actor, dealCode),
    outbox: (query: DeskQuery) => outboxPage(manager, query),
    jobs: () => jobQueues(manager),
  };
};
export type DeskService = ReturnType<typeof createDeskService>;
