import { randomBytes } from 'node:crypto';
import type { Stripe } from 'stripe';
import { z } from 'zod';
import { newId } from '../ids.ts';
import { listPage } from '../listing.ts';
import { flag, listOf, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { mustFind, type Work } from '../work.ts';

const EVENT_LIFE_S = 30 * 86_400;

const eventFilter = {
  ...paging,
  type: text().optional(),
  types: listOf(text()).optional(),
  delivery_success: flag().optional(),
};

const waitingFor = (work: Work, event: string) =>
  work.store.all('delivery').filter(({ value }) => value.event === event && value.state !== 'delivered').length;

/** An event with the number of endpoints that have not taken it yet. */
function eventNow(work: Work, event: Stripe.Event): Stripe.Event {
  return { ...event, pending_webhooks: waitingFor(work, event.id) };
}

const listEvents = route('GET', '/events', eventFilter, (work, page) => {
  const fits = (type: string) => {
    const wanted = page.types ?? (page.type ? [page.type] : []);
    return (
      wanted.length === 0 ||
      wanted.some((name) => (name.endsWith('.*') ? type.startsWith(name.slice(0, -1)) : name === type))
    );
  };
  const keep = (event: Stripe.Event) =>
    event.created > work.nowS - EVENT_LIFE_S &&
    fits(event.type) &&
    (page.delivery_success === undefined || page.delivery_success === (waitingFor(work, event.id) === 0));
  const found = listPage(work, 'event', { url: '/v1/events', page, keep });
  return { ...found, data: found.data.map((event) => eventNow(work, event)) };
});

const endpointFacts = { description: text().optional(), metadata: metadata().optional() };

const createEndpoint = route(
  'POST',
  '/webhook_endpoints',
  {
    url: z.url(),
    enabled_events: listOf(text()),
    connect: flag().optional(),
    api_version: text().optional(),
    ...endpointFacts,
  },
  (work, params) => {
    const secret = `whsec_${randomBytes(24).toString('base64url')}`;
    const endpoint: Stripe.WebhookEndpoint = {
      id: newId('we'),
      object: 'webhook_endpoint',
      api_version: params.api_version ?? null,
      application: null,
      created: work.nowS,
      description: params.description ?? null,
      enabled_events: params.enabled_events,
      livemode: false,
      metadata: params.metadata ?? {},
      status: 'enabled',
      url: params.url,
    };
    work.store.put('webhook_endpoint', endpoint, { hidden: { secret, connect: params.connect ?? false } });
    return { ...endpoint, secret };
  },
);

const updateEndpoint = route(
  'POST',
  '/webhook_endpoints/:id',
  { url: z.url().optional(), enabled_events: listOf(text()).optional(), disabled: flag().optional(), ...endpointFacts },
  (work, params, { id = '' }) => {
    const before = mustFind(work, 'webhook_endpoint', id);
    const status = params.disabled === undefined ? before.status : params.disabled ? 'disabled' : 'enabled';
    const { url = before.url, enabled_events = before.enabled_events } = params;
    return work.store.put('webhook_endpoint', { ...before, url, enabled_events, status });
  },
);

export const eventRoutes = [
  listEvents,
  route('GET', '/events/:id', {}, (work, _, { id = '' }) => eventNow(work, mustFind(work, 'event', id))),
  createEndpoint,
  updateEndpoint,
  route('GET', '/webhook_endpoints', paging, (work, page) =>
    listPage(work, 'webhook_endpoint', { url: '/v1/webhook_endpoints', page }),
  ),
  route('GET', '/webhook_endpoints/:id', {}, (work, _, { id = '' }) => mustFind(work, 'webhook_endpoint', id)),
  route('DELETE', '/webhook_endpoints/:id', {}, (work, _, { id = '' }) => {
    mustFind(work, 'webhook_endpoint', id);
    work.store.remove('webhook_endpoint', id);
    return { id, object: 'webhook_endpoint', deleted: true };
  }),
];
