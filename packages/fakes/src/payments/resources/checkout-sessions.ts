import type { Stripe } from 'stripe';
import { z } from 'zod';
import { badParameter, refused } from '../errors.ts';
import { idOf, newId } from '../ids.ts';
import { listPage, pageOf } from '../listing.ts';
import { amount, currency, ignored, integer, listOf, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { expireSession } from '../sessions.ts';
import { mustFind, schedule, type Work } from '../work.ts';

const DAY_S = 86_400;

const lineItem = z.object({
  quantity: integer().optional(),
  price_data: z.object({
    currency: currency(),
    unit_amount: amount(),
    product_data: z.object({ name: text(), description: text().optional() }).loose(),
    tax_behavior: text().optional(),
  }),
});

const createInput = {
  mode: z.literal('payment'),
  line_items: listOf(lineItem),
  success_url: z.url(),
  cancel_url: z.url().optional(),
  client_reference_id: text().optional(),
  customer: text().optional(),
  customer_email: text().optional(),
  expires_at: integer().optional(),
  metadata: metadata().optional(),
  payment_method_types: listOf(z.enum(['card', 'us_bank_account'])).optional(),
  payment_intent_data: z
    .strictObject({
      capture_method: z.enum(['automatic', 'automatic_async', 'manual']).optional(),
      description: text().optional(),
      metadata: metadata().optional(),
      receipt_email: text().optional(),
      transfer_group: text().optional(),
      ...ignored('statement_descriptor', 'statement_descriptor_suffix', 'setup_future_usage'),
    })
    .optional(),
  ...ignored('ui_mode', 'submit_type', 'locale', 'currency', 'custom_text', 'customer_creation', 'customer_update'),
  ...ignored(
    'billing_address_collection',
    'payment_method_options',
    'allow_promotion_codes',
    'automatic_tax',
    'branding_settings',
  ),
  ...ignored('adaptive_pricing', 'excluded_payment_method_types', 'saved_payment_method_options', 'wallet_options'),
};

const create = route('POST', '/checkout/sessions', createInput, (work, params) => {
  if (params.customer) mustFind(work, 'customer', params.customer, 'customer');
  const id = newId('cs_test', 58);
  const items = params.line_items.map((item) => toLineItem(item));
  if (items.length === 0) throw badParameter('parameter_missing', 'Missing required param: line_items.', 'line_items');
  const totalMinor = items.reduce((sum, item) => sum + item.amount_total, 0);
  if (totalMinor < 50)
    throw refused('amount_too_small', 'The total amount due must add up to at least 50 minor units.');
  const expiresAtS = params.expires_at ?? work.nowS + DAY_S;
  if (expiresAtS < work.nowS + 1_800 - 60 || expiresAtS > work.nowS + DAY_S + 60) {
    const message =
      'The `expires_at` timestamp must be between 30 minutes and 24 hours from Checkout Session creation.';
    throw badParameter('parameter_invalid', message, 'expires_at');
  }
  const session: Stripe.Checkout.Session = {
    id,
    ...blankSession(work),
    amount_subtotal: totalMinor,
    amount_total: totalMinor,
    cancel_url: params.cancel_url ?? null,
    client_reference_id: params.client_reference_id ?? null,
    currency: items[0]!.currency,
    customer: params.customer ?? null,
    customer_email: params.customer_email ?? null,
    expires_at: expiresAtS,
    metadata: params.metadata ?? {},
    payment_method_types: params.payment_method_types ?? ['card', 'us_bank_account'],
    success_url: params.success_url,
    url: `${work.settings.publicUrl}/pay/${id}`,
  };
  const hidden = { lineItems: items, intentData: params.payment_intent_data ?? {} };
  schedule(work, 'expire-session', id, expiresAtS - work.nowS);
  return work.store.put('checkout.session', session, { owner: work.owner, hidden });
});

function toLineItem(item: z.output<typeof lineItem>): Stripe.LineItem {
  const { price_data: price, quantity = 1 } = item;
  const totalMinor = price.unit_amount * quantity;
  return {
    id: newId('li'),
    object: 'item',
    amount_discount: 0,
    amount_subtotal: totalMinor,
    amount_tax: 0,
    amount_total: totalMinor,
    currency: price.currency,
    description: price.product_data.name,
    metadata: {},
    price: null,
    quantity,
  } as unknown as Stripe.LineItem;
}

function blankSession(
  work: Work,
): Omit<
  Stripe.Checkout.Session,
  'id' | 'amount_subtotal' | 'amount_total' | 'expires_at' | 'currency' | 'payment_method_types' | 'success_url' | 'url'
> {
  return {
    object: 'checkout.session',
    adaptive_pricing: { enabled: false },
    after_expiration: null,
    allow_promotion_codes: null,
    allowed_payment_method_types: null,
    automatic_tax: { enabled: false, liability: null, provider: null, status: null },
    billing_address_collection: null,
    cancel_url: null,
    client_reference_id: null,
    client_secret: null,
    collected_information: null,
    consent: null,
    consent_collection: null,
    created: work.nowS,
    currency_conversion: null,
    custom_fields: [],
    custom_text: { after_submit: null, shipping_address: null, submit: null, terms_of_service_acceptance: null },
    customer: null,
    customer_account: null,
    customer_creation: 'if_required',
    customer_details: null,
    customer_email: null,
    discounts: [],
    integration_identifier: null,
    invoice: null,
    invoice_creation: null,
    livemode: false,
    locale: null,
    managed_payments: null,
    metadata: {},
    mode: 'payment',
    origin_context: null,
    payment_intent: null,
    payment_link: null,
    payment_method_collection: 'if_required',
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_status: 'unpaid',
    permissions: null,
    recovered_from: null,
    saved_payment_method_options: null,
    setup_intent: null,
    shipping_address_collection: null,
    shipping_cost: null,
    shipping_options: [],
    status: 'open',
    submit_type: null,
    subscription: null,
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    ui_mode: 'hosted_page',
    wallet_options: null,
  };
}

const filter = {
  ...paging,
  customer: text().optional(),
  payment_intent: text().optional(),
  status: z.enum(['open', 'complete', 'expired']).optional(),
};

export const checkoutSessionRoutes = [
  create,
  route('GET', '/checkout/sessions', filter, (work, page) => {
    const keep = (session: Stripe.Checkout.Session) =>
      (!page.customer || idOf(session.customer) === page.customer) &&
      (!page.payment_intent || idOf(session.payment_intent) === page.payment_intent) &&
      (!page.status || session.status === page.status);
    return listPage(work, 'checkout.session', { url: '/v1/checkout/sessions', page, keep });
  }),
  route('GET', '/checkout/sessions/:id', {}, (work, _, { id = '' }) => mustFind(work, 'checkout.session', id)),
  route('GET', '/checkout/sessions/:id/line_items', paging, (work, page, { id = '' }) => {
    mustFind(work, 'checkout.session', id);
    const items = work.store.row('checkout.session', id)?.hidden.lineItems ?? [];
    return pageOf(items, { url: `/v1/checkout/sessions/${id}/line_items`, page });
  }),
  route('POST', '/checkout/sessions/:id/expire', {}, (work, _, { id = '' }) => {
    const session = mustFind(work, 'checkout.session', id);
    if (session.status !== 'open') {
      const message = `Only Checkout Sessions with a status in ["open"] can be expired. This one has a status of "${session.status}".`;
      throw refused('parameter_invalid', message);
    }
    return expireSession(work, session);
  }),
];
