import type { On } from '../../platform/routes.ts';
import type { DeliveriesService } from './deliveries.service.ts';

export function deliveryRoutes(on: On, deliveries: DeliveriesService): void {
  on('POST /deals/:dealCode/dispatch', ({ params, body, actor }) =>
    deliveries.dispatch({ ...params, ...body, memberId: actor.id }),
  );
  on('POST /deals/:dealCode/ready', ({ params, actor }) => deliveries.markReady({ ...params, memberId: actor.id }));
  on('POST /deals/:dealCode/receive', ({ params, actor }) => deliveries.receive({ ...params, memberId: actor.id }));
  on('POST /deals/:dealCode/weigh-in', ({ params, body, actor }) =>
    deliveries.weighIn({ ...params, ...body, memberId: actor.id }),
  );
  on(
    'POST /deals/:dealCode/photos',
    ({ params, actor, upload }) => deliveries.addPhoto({ ...params, memberId: actor.id, upload }),
    { before: ({ params, actor }) => deliveries.beforePhoto({ ...params, memberId: actor.id }) },
  );
  on('GET /deals/:dealCode/packing-slip.pdf', ({ params, actor }) =>
    deliveries.packingSlip({ ...params, memberId: actor.id }),
  );
}
