import type { Route } from '../route.ts';
import { accountRoutes } from './accounts.ts';
import { checkoutSessionRoutes } from './checkout-sessions.ts';
import { customerRoutes } from './customers.ts';
import { disputeRoutes } from './disputes.ts';
import { eventRoutes } from './event-routes.ts';
import { moneyReadRoutes } from './money-reads.ts';
import { paymentIntentRoutes } from './payment-intents.ts';
import { payoutRoutes } from './payouts.ts';
import { refundRoutes } from './refunds.ts';
import { reversalRoutes } from './reversals.ts';
import { transferRoutes } from './transfers.ts';

/** Every path under `/v1` that the stand-in answers. */
export const allRoutes: Route[] = [
  ...accountRoutes,
  ...customerRoutes,
  ...checkoutSessionRoutes,
  ...paymentIntentRoutes,
  ...moneyReadRoutes,
  ...transferRoutes,
  ...reversalRoutes,
  ...refundRoutes,
  ...payoutRoutes,
  ...disputeRoutes,
  ...eventRoutes,
];
