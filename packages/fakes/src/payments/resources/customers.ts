import type { Stripe } from 'stripe';
import { emit } from '../events.ts';
import { idOf, newId } from '../ids.ts';
import { listPage } from '../listing.ts';
import { ignored, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { testMethod, toPaymentMethod } from '../test-methods.ts';
import { missing } from '../errors.ts';
import { mustFind } from '../work.ts';
import { mergeMetadata } from '../metadata.ts';
import { z } from 'zod';

const facts = {
  email: text().optional(),
  name: text().optional(),
  phone: text().optional(),
  description: text().optional(),
  metadata: metadata().optional(),
  ...ignored(
    'address',
    'shipping',
    'preferred_locales',
    'tax_exempt',
    'business_name',
    'individual_name',
    'invoice_settings',
  ),
};

const create = route('POST', '/customers', facts, (work, params) => {
  const customer: Stripe.Customer = {
    id: newId('cus', 14),
    object: 'customer',
    address: null,
    balance: 0,
    created: work.nowS,
    currency: null,
    default_source: null,
    delinquent: false,
    description: params.description ?? null,
    discount: null,
    email: params.email ?? null,
    invoice_prefix: newId('I', 7).slice(2).toUpperCase(),
    invoice_settings: { custom_fields: null, default_payment_method: null, footer: null, rendering_options: null },
    livemode: false,
    metadata: params.metadata ?? {},
    name: params.name ?? null,
    next_invoice_sequence: 1,
    phone: params.phone ?? null,
    preferred_locales: [],
    shipping: null,
    tax_exempt: 'none',
    test_clock: null,
  };
  work.store.put('customer', customer, { owner: work.owner });
  emit(work, 'customer.created', customer);
  return customer;
});

const update = route('POST', '/customers/:id', facts, (work, params, { id = '' }) => {
  const before = mustFind(work, 'customer', id);
  const customer: Stripe.Customer = {
    ...before,
    description: params.description ?? before.description,
    email: params.email ?? before.email,
    metadata: mergeMetadata(before.metadata, params.metadata),
    name: params.name ?? before.name ?? null,
    phone: params.phone ?? before.phone ?? null,
  };
  work.store.put('customer', customer);
  emit(work, 'customer.updated', customer);
  return customer;
});

const methodInput = {
  type: z.enum(['card', 'us_bank_account']),
  card: z.object({ number: text().optional(), token: text().optional() }).optional(),
  us_bank_account: z.object({ account_number: text(), routing_number: text() }).optional(),
  metadata: metadata().optional(),
  ...ignored('billing_details', 'allow_redisplay'),
};

const createMethod = route('POST', '/payment_methods', methodInput, (work, params) => {
  const reference =
    params.type === 'card' ? (params.card?.token ?? params.card?.number ?? '') : 'pm_usBankAccount_success';
  if (!testMethod(reference)) throw missing('token', reference, 'card');
  const { method } = toPaymentMethod(work, reference);
  return work.store.put('payment_method', { ...method, metadata: params.metadata ?? {} });
});

const attach = route('POST', '/payment_methods/:id/attach', { customer: text() }, (work, params, { id = '' }) => {
  mustFind(work, 'customer', params.customer, 'customer');
  const { method } = toPaymentMethod(work, id);
  const attached = work.store.put('payment_method', { ...method, customer: params.customer });
  emit(work, 'payment_method.attached', attached);
  return attached;
});

const detach = route('POST', '/payment_methods/:id/detach', {}, (work, _, { id = '' }) => {
  const detached = work.store.put('payment_method', { ...mustFind(work, 'payment_method', id), customer: null });
  emit(work, 'payment_method.detached', detached);
  return detached;
});

const methodsOf = { ...paging, type: text().optional() };

export const customerRoutes = [
  create,
  route('GET', '/customers', { ...paging, email: text().optional() }, (work, page) => {
    const keep = (customer: Stripe.Customer) => !page.email || customer.email === page.email;
    return listPage(work, 'customer', { url: '/v1/customers', page, keep });
  }),
  route('GET', '/customers/:id', {}, (work, _, { id = '' }) => mustFind(work, 'customer', id)),
  update,
  route('GET', '/customers/:id/payment_methods', methodsOf, (work, page, { id = '' }) => {
    mustFind(work, 'customer', id);
    const keep = (method: Stripe.PaymentMethod) =>
      idOf(method.customer) === id && (!page.type || method.type === page.type);
    return listPage(work, 'payment_method', { url: `/v1/customers/${id}/payment_methods`, page, keep });
  }),
  createMethod,
  route('GET', '/payment_methods/:id', {}, (work, _, { id = '' }) => mustFind(work, 'payment_method', id)),
  attach,
  detach,
];
