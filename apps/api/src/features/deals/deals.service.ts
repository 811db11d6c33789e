import type { World } from '../../platform/world.ts';
import { acceptClaim, acceptDelivery, cancelLate, claimMass, countersignWeighIn, type OwnStep } from './decide-deal.ts';
import { myDeals } from './deals.queries.ts';
import { dealViewOf } from './deals.reads.ts';
import type { Side } from './deals.rules.ts';

/** Reading deals, and the decisions of both sides that lead to their settlement. */
export const createDealsService = (world: Pick<World, 'db'>) => ({
  list: (own: { memberId: string; side: Side | undefined }) => myDeals(world.db.manager, own),
  view: ({ dealCode, memberId }: OwnStep) => dealViewOf(world.db.manager, { code: dealCode, memberId }),
  accept: (step: OwnStep) => acceptDelivery(world, step),
  countersign: (step: OwnStep) => countersignWeighIn(world, step),
  claim: (step: OwnStep) => claimMass(world, step),
  acceptClaim: (step: OwnStep) => acceptClaim(world, step),
  cancel: (step: OwnStep) => cancelLate(world, step),
});
export type DealsService = ReturnType<typeof createDealsService>;
