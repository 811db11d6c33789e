import type { On } from '../../platform/routes.ts';
import type { PayoutsService } from './payouts.service.ts';

export function payoutRoutes(on: On, payouts: PayoutsService): void {
  on('GET /my/payout-account', ({ actor }) => payouts.read(actor.id));
  on('POST /my/payout-account/link', ({ actor }) => payouts.openLink(actor.id));
}
