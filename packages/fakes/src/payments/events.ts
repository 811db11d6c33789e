import type { Stripe } from 'stripe';
import { newId } from './ids.ts';
import type { Work } from './work.ts';

/** The API version whose shapes the stand-in speaks: that of the pinned client. */
export const API_VERSION = '2026-10-28.endive';

/**
 * Records an event with a snapshot of the object and queues it for every endpoint that asked for it.
 * Events of a connected account carry `account` and go to Connect endpoints only.
 */
export function emit(work: Work, type: Stripe.Event['type'], object: object, previous?: object): void {
  const event = {
    id: newId('evt'),
    object: 'event',
    ...(work.owner && { account: work.owner }),
    api_version: API_VERSION,
    created: work.nowS,
    data: { object: structuredClone(object), ...(previous && { previous_attributes: previous }) },
    livemode: false,
    pending_webhooks: 0,
    request: { ...work.request },
    type,
  } as unknown as Stripe.Event;
  const endpoints = work.store.all('webhook_endpoint').filter(({ value, hidden }) => {
    const wanted = value.enabled_events.includes('*') || value.enabled_events.includes(type);
    return value.status === 'enabled' && wanted && Boolean(hidden.connect) === Boolean(work.owner);
  });
  event.pending_webhooks = endpoints.length;
  work.store.put('event', event, { owner: work.owner });
  for (const { id } of endpoints) queueDelivery(work, event.id, id);
}

/** Puts one event on its way to one endpoint. */
export function queueDelivery(work: Work, event: string, endpoint: string): void {
  const delivery = { id: newId('dlv'), event, endpoint, attempts: 0, dueAtS: work.nowS };
  work.store.put('delivery', { ...delivery, state: 'waiting', lastAnswer: null });
}
