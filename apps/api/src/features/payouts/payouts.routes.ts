import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { openAccountLink, readPayoutAccount } from './payout-account.service.ts';

export function payoutRoutes(on: On, world: World): void {
  on('GET /my/payout-account', ({ actor }) => readPayoutAccount(world, actor.id));
  on('POST /my/payout-account/link', ({ actor }) => openAccountLink(world, actor.id));
}
