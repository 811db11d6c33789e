import { marketNow } from '../platform/clock.ts';
import type { World } from '../platform/world.ts';
import type { Clock } from './time.ts';

/**
 * The world while the market's clock is behind it. The price service and the processor's payouts run on real time, which nobody
 * can move: what lies in the market's future is kept from it until its clock has caught up.
 */
export const paceWorld = (world: World, clock: Clock): World => ({
  ...world,
  prices: {
    async since(from) {
      const now = await marketNow(world.db.manager);
      return (await world.prices.since(from)).filter(({ at }) => at <= now);
    },
  },
  payments: {
    ...world.payments,
    async *events(of) {
      for await (const event of world.payments.events(of))
        if (clock.isReleased() || !event.kind.startsWith('payout.')) yield event;
    },
  },
});
