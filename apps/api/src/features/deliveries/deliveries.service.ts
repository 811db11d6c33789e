import type { World } from '../../platform/world.ts';
import { dispatchDeal, markReady, receiveDeal } from './hand-over.ts';
import { packingSlip } from './packing-slip.ts';
import { addWeighInPhoto, beforeWeighInPhoto, enterWeighIn } from './weigh-in.ts';

type Rest<F> = F extends (world: never, order: infer O) => Promise<unknown> ? O : never;

/** From the hold to the weigh-in: what each side does with the goods. */
export const createDeliveriesService = (world: Pick<World, 'db' | 'files' | 'settings'>) => ({
  dispatch: (order: Rest<typeof dispatchDeal>) => dispatchDeal(world, order),
  markReady: (order: Rest<typeof markReady>) => markReady(world, order),
  receive: (order: Rest<typeof receiveDeal>) => receiveDeal(world, order),
  weighIn: (order: Rest<typeof enterWeighIn>) => enterWeighIn(world, order),
  beforePhoto: (order: Rest<typeof beforeWeighInPhoto>) => beforeWeighInPhoto(world, order),
  addPhoto: (order: Rest<typeof addWeighInPhoto>) => addWeighInPhoto(world, order),
  packingSlip: (order: Rest<typeof packingSlip>) => packingSlip(world, order),
});
export type DeliveriesService = ReturnType<typeof createDeliveriesService>;
