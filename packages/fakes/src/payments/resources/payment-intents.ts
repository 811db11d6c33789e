import type { Stripe } from 'stripe';
import { refused } from '../errors.ts';
import { idOf } from '../ids.ts';
import { attempt, declined, succeed } from '../attempts.ts';
import { assertStatus, cancelIntent, createIntent, saveIntent } from '../intents.ts';
import { listPage } from '../listing.ts';
import { mergeMetadata } from '../metadata.ts';
import { amount, currency, flag, ignored, listOf, metadata, paging, payableAmount, text } from '../parameters.ts';
import { route } from '../route.ts';
import { testMethod } from '../test-methods.ts';
import { mustFind, type Work } from '../work.ts';
import { z } from 'zod';

const payer = {
  payment_method: text().optional(),
  off_session: flag().optional(),
  return_url: text().optional(),
  receipt_email: text().optional(),
  ...ignored(
    'allowed_payment_method_types',
    'mandate_data',
    'payment_method_options',
    'setup_future_usage',
    'use_stripe_sdk',
  ),
};

const facts = {
  customer: text().optional(),
  description: text().optional(),
  metadata: metadata().optional(),
  transfer_group: text().optional(),
  ...ignored('statement_descriptor', 'statement_descriptor_suffix', 'shipping', 'payment_details', 'amount_details'),
};

interface Payer {
  payment_method?: string | undefined;
  off_session?: boolean | undefined;
  return_url?: string | undefined;
}

function confirm(work: Work, intent: Stripe.PaymentIntent, how: Payer): Stripe.PaymentIntent {
  const method = how.payment_method ?? idOf(intent.payment_method);
  if (!method) {
    const message = 'You cannot confirm this PaymentIntent because it is missing a payment method.';
    throw refused('payment_intent_unexpected_state', message, { payment_intent: intent });
  }
  const result = attempt(work, intent, {
    method,
    offSession: how.off_session ?? false,
    returnUrl: how.return_url ?? null,
  });
  if (result.decline) throw declined(result.decline);
  return result.intent;
}

const create = route(
  'POST',
  '/payment_intents',
  {
    amount: payableAmount(),
    currency: currency(),
    confirm: flag().optional(),
    capture_method: z.enum(['automatic', 'automatic_async', 'manual']).optional(),
    payment_method_types: listOf(text()).optional(),
    automatic_payment_methods: z.object({ enabled: flag(), allow_redirects: text().optional() }).optional(),
    ...payer,
    ...facts,
    ...ignored('confirmation_method', 'excluded_payment_method_types'),
  },
  (work, params) => {
    if (params.customer) mustFind(work, 'customer', params.customer, 'customer');
    const automatic = params.automatic_payment_methods;
    const intent = createIntent(work, {
      amount: params.amount,
      currency: params.currency,
      capture_method: params.capture_method ?? 'automatic_async',
      customer: params.customer ?? null,
      description: params.description ?? null,
      metadata: params.metadata ?? {},
      transfer_group: params.transfer_group ?? null,
      receipt_email: params.receipt_email ?? null,
      ...(automatic && {
        automatic_payment_methods: { enabled: automatic.enabled, allow_redirects: 'always' as const },
      }),
      ...(params.payment_method_types && { payment_method_types: params.payment_method_types }),
    });
    if (params.confirm) return confirm(work, intent, params);
    if (!params.payment_method) return intent;
    return saveIntent(work, { ...intent, payment_method: params.payment_method, status: 'requires_confirmation' });
  },
);

const update = route(
  'POST',
  '/payment_intents/:id',
  { amount: payableAmount().optional(), ...payer, ...facts },
  (work, params, { id = '' }) => {
    const intent = mustFind(work, 'payment_intent', id);
    const changesMoney = params.amount !== undefined || params.payment_method !== undefined;
    if (changesMoney)
      assertStatus(intent, 'update', ['requires_payment_method', 'requires_confirmation', 'requires_action']);
    return saveIntent(work, {
      ...intent,
      amount: params.amount ?? intent.amount,
      description: params.description ?? intent.description,
      metadata: mergeMetadata(intent.metadata, params.metadata),
      transfer_group: params.transfer_group ?? intent.transfer_group,
      ...(params.payment_method && { payment_method: params.payment_method, status: 'requires_confirmation' as const }),
    });
  },
);

const capture = route(
  'POST',
  '/payment_intents/:id/capture',
  { amount_to_capture: amount().optional(), metadata: metadata().optional() },
  (work, params, { id = '' }) => {
    const intent = mustFind(work, 'payment_intent', id);
    assertStatus(intent, 'capture', ['requires_capture']);
    const amountMinor = params.amount_to_capture ?? intent.amount;
    if (amountMinor > intent.amount) {
      throw refused('amount_too_large', 'The amount to capture is greater than the amount authorised.', {
        param: 'amount_to_capture',
      });
    }
    const row = work.store.row('charge', idOf(intent.latest_charge) ?? '')!;
    return succeed(work, intent, row.value, { test: testMethod(row.hidden.test ?? '')!, amountMinor });
  },
);

const cancellable = ['requires_payment_method', 'requires_confirmation', 'requires_action', 'requires_capture'];

const cancel = route(
  'POST',
  '/payment_intents/:id/cancel',
  { cancellation_reason: z.enum(['abandoned', 'duplicate', 'fraudulent', 'requested_by_customer']).optional() },
  (work, params, { id = '' }) => {
    const intent = mustFind(work, 'payment_intent', id);
    assertStatus(intent, 'cancel', cancellable);
    return cancelIntent(work, intent, params.cancellation_reason ?? null);
  },
);

export const paymentIntentRoutes = [
  create,
  route('GET', '/payment_intents', { ...paging, customer: text().optional() }, (work, page) => {
    const keep = (intent: Stripe.PaymentIntent) => !page.customer || idOf(intent.customer) === page.customer;
    return listPage(work, 'payment_intent', { url: '/v1/payment_intents', page, keep });
  }),
  route('GET', '/payment_intents/:id', ignored('client_secret'), (work, _, { id = '' }) =>
    mustFind(work, 'payment_intent', id),
  ),
  update,
  route('POST', '/payment_intents/:id/confirm', payer, (work, params, { id = '' }) =>
    confirm(work, mustFind(work, 'payment_intent', id), params),
  ),
  capture,
  cancel,
];
