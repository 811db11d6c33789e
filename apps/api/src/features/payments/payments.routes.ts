import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { openPayment } from './open-payment.ts';
import { receiveEvent } from './receive-event.ts';

export function paymentRoutes(on: On, world: World): void {
  on('POST /deals/:dealCode/payment', ({ params, actor }) => openPayment(world, { ...params, buyerId: actor.id }));
  on('POST /webhooks/payments', ({ raw, req }) =>
    receiveEvent(world, { raw, signature: req.get('stripe-signature') ?? '' }),
  );
}
