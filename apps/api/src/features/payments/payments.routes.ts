import type { On } from '../../platform/routes.ts';
import type { PaymentsService } from './payments.service.ts';

export function paymentRoutes(on: On, payments: PaymentsService): void {
  on('POST /deals/:dealCode/payment', ({ params, actor }) => payments.open({ ...params, buyerId: actor.id }));
  on('POST /webhooks/payments', ({ raw, req }) =>
    payments.receive({ raw, signature: req.get('stripe-signature') ?? '' }),
  );
}
