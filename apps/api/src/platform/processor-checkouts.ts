import type { Stripe } from 'stripe';
import { ProcessorRefusal, type CheckoutOrder, type PaymentGateway, type ProcessorCheckout } from './payments.ts';
import { asked } from './processor-errors.ts';
import { idOf, toPayment } from './processor-views.ts';

type Checkouts = Pick<PaymentGateway, 'createCheckout' | 'retrieveCheckout' | 'expireCheckout' | 'retrievePayment'>;

/** Payment pages of the processor, and the payments behind them. */
export const checkouts = (stripe: Stripe): Checkouts => ({
  async createCheckout(order) {
    const session = await asked(stripe.checkout.sessions.create(checkoutParams(order), { idempotencyKey: order.key }));
    return { sessionId: session.id, url: session.url ?? '' };
  },
  async retrieveCheckout(sessionId) {
    const session = await asked(stripe.checkout.sessions.retrieve(sessionId));
    return { state: toCheckoutState(session.status), url: session.url, intentId: idOf(session.payment_intent) };
  },
  async expireCheckout(sessionId) {
    const options = { idempotencyKey: `checkout:${sessionId}:expire` };
    await asked(stripe.checkout.sessions.expire(sessionId, {}, options)).catch((error: unknown) => {
      if (!(error instanceof ProcessorRefusal)) throw error;
    });
  },
  retrievePayment: async (intentId) =>
    toPayment(await asked(stripe.paymentIntents.retrieve(intentId, { expand: ['latest_charge.balance_transaction'] }))),
});

function checkoutParams(order: CheckoutOrder): Stripe.Checkout.SessionCreateParams {
  const metadata = { deal_id: order.dealId, payment_id: order.paymentId };
  return {
    mode: 'payment',
    client_reference_id: order.dealCode,
    customer_email: order.buyerEmail,
    metadata,
    line_items: [
      {
        quantity: 1,
        price_data: {
          currency: order.currency.toLowerCase(),
          unit_amount: order.amountMinor,
          product_data: { name: order.description },
        },
      },
    ],
    // Captured at once, so that the fee is known when the payment is.
    payment_intent_data: {
      capture_method: 'automatic',
      description: order.description,
      transfer_group: order.dealId,
      metadata,
    },
    success_url: order.successUrl,
    cancel_url: order.cancelUrl,
  };
}

const toCheckoutState = (status: string | null): ProcessorCheckout['state'] =>
  status === 'open' || status === 'complete' ? status : 'expired';
