import { join } from 'node:path';
import cookieParser from 'cookie-parser';
import express, { type Express } from 'express';
import { bidRoutes } from './features/bids/bids.routes.ts';
import { createBidsService } from './features/bids/bids.service.ts';
import { deskRoutes } from './features/desk/desk.routes.ts';
import { createDeskService } from './features/desk/desk.service.ts';
import { memberRoutes } from './features/members/members.routes.ts';
import { createMembersService } from './features/members/members.service.ts';
import { noticeRoutes } from './features/notices/notices.routes.ts';
import { createNoticesService } from './features/notices/notices.service.ts';
import { catalogueRoutes } from './features/catalogue/catalogue.routes.ts';
import { dealRoutes } from './features/deals/deals.routes.ts';
import { createDealsService } from './features/deals/deals.service.ts';
import { deliveryRoutes } from './features/deliveries/deliveries.routes.ts';
import { createDeliveriesService } from './features/deliveries/deliveries.service.ts';
import { ledgerRoutes } from './features/ledger/ledger.routes.ts';
import { createLedgerService } from './features/ledger/ledger.service.ts';
import { lotRoutes } from './features/lots/lots.routes.ts';
import { paymentRoutes } from './features/payments/payments.routes.ts';
import { createPaymentsService } from './features/payments/payments.service.ts';
import { payoutRoutes } from './features/payouts/payouts.routes.ts';
import { createPayoutsService } from './features/payouts/payouts.service.ts';
import { photoRoutes } from './features/photos/photos.routes.ts';
import { marketRoutes } from './features/prices/prices.routes.ts';
import { settlementRoutes } from './features/settlements/settlements.routes.ts';
import { createSettlementsService } from './features/settlements/settlements.service.ts';
import { clientPages } from './platform/client-pages.ts';
import {
  brake,
  noStore,
  refuseCrossSite,
  refuseRepeatedQuery,
  refuseTrace,
  requestId,
  securityHeaders,
} from './platform/guards.ts';
import { healthRoutes } from './platform/health.ts';
import { notFound, sendError } from './platform/http-errors.ts';
import { openApiRoute } from './platform/openapi.ts';
import { createRoutes } from './platform/routes.ts';
import { createUpload } from './platform/upload.ts';
import type { World } from './platform/world.ts';

/** The only file that knows all features: builds their services, binds their routes, mounts the error handler. */
export function bindRoutes(world: World) {
  const { sessions, settings } = world;
  const routes = createRoutes({
    sessions,
    upload: createUpload(join(settings.FILES_DIR, 'quarantine')),
    guard: refuseCrossSite(settings.PUBLIC_URL),
  });
  const { on } = routes;
  deskRoutes(on, createDeskService(world));
  memberRoutes(on, createMembersService(world));
  noticeRoutes(on, createNoticesService(world));
  bidRoutes(on, createBidsService(world));
  catalogueRoutes(on, world);
  lotRoutes(on, world);
  marketRoutes(on, world);
  paymentRoutes(on, createPaymentsService(world));
  payoutRoutes(on, createPayoutsService(world));
  ledgerRoutes(on, createLedgerService(world));
  photoRoutes(on, world);
  dealRoutes(on, createDealsService(world));
  deliveryRoutes(on, createDeliveriesService(world));
  settlementRoutes(on, createSettlementsService(world));
  return routes;
}

export function createApp(world: World): Express {
  const { settings, log } = world;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', settings.TRUSTED_PROXIES);
  app.use(requestId, refuseTrace, securityHeaders, healthRoutes(world));
  app.use('/api', noStore, brake({ perMinute: 600, on: settings.LIMITS }), cookieParser(), refuseRepeatedQuery);
  app.use('/api', openApiRoute(settings.PUBLIC_URL), bindRoutes(world).router, notFound);
  if (settings.CLIENTS_DIR) app.use(clientPages(settings.CLIENTS_DIR));
  app.use(notFound, sendError(log));
  return app;
}
