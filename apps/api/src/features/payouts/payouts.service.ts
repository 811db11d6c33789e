import type { World } from '../../platform/world.ts';
import { openAccountLink, readPayoutAccount } from './payout-account.ts';

/** The seller's own account at the processor. */
export const createPayoutsService = (world: Pick<World, 'db' | 'payments' | 'settings'>) => ({
  read: (memberId: string) => readPayoutAccount(world, memberId),
  openLink: (memberId: string) => openAccountLink(world, memberId),
});
export type PayoutsService = ReturnType<typeof createPayoutsService>;
