import { createBidsService } from '../features/bids/bids.service.ts';
import { createDealsService } from '../features/deals/deals.service.ts';
import { createDeliveriesService } from '../features/deliveries/deliveries.service.ts';
import { pollEvents } from '../features/payments/receive-event.ts';
import type { World } from '../platform/world.ts';
import { createInbox, createRunner } from '../work.ts';
import type { Album } from './album.ts';
import type { People } from './people.ts';
import type { Calendar } from './time.ts';

interface StageParts {
  world: World;
  calendar: Calendar;
  people: People;
  album: Album;
}

/** What the stories act on: the services that the routes call, and the worker's hands. */
export function createStage(parts: StageParts) {
  const { world } = parts;
  const runner = createRunner(world);
  const inbox = createInbox(world);
  return {
    ...parts,
    bids: createBidsService(world),
    deals: createDealsService(world),
    deliveries: createDeliveriesService(world),
    /** Carries out what was ordered outside, and takes in what came of it, until nothing is left. */
    work: async (): Promise<void> => {
      while ((await inbox.runAll()) + (await runner.runAll()) > 0);
    },
    /** Asks the processor what has happened there; nothing of the market listens for its webhooks yet. */
    hear: async (): Promise<void> => {
      await runner.runAll();
      await pollEvents(world);
      await inbox.runAll();
    },
  };
}
export type Stage = ReturnType<typeof createStage>;
