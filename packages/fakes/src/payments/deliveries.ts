import { createHmac } from 'node:crypto';
import type { Stripe } from 'stripe';
import { takeWebhookFault } from './faults.ts';
import type { Delivery } from './kinds.ts';
import type { Store } from './store.ts';
import { clockS } from './work.ts';

const BACKOFF_S = [1, 2, 5, 15, 30, 60, 120, 300, 600, 1_800, 3_600];
const ANSWER_WITHIN_MS = 10_000;
const REORDER_BY_S = 2;

/** The `Stripe-Signature` header of a body, signed now by the wall clock: receivers check its age against theirs. */
export function signatureOf(body: string, secret: string, atS = Math.floor(Date.now() / 1000)): string {
  return `t=${atS},v1=${createHmac('sha256', secret).update(`${atS}.${body}`).digest('hex')}`;
}

/**
 * Sends queued events to their endpoints, one after the other per endpoint, and again with growing pauses until a
 * 2xx answer comes. What was waiting when the process ended is sent after the next start.
 */
export function createDeliveries(store: Store) {
  const underWay = new Map<string, Promise<void>>();
  const queues = new Map<string, Promise<void>>();
  const stopping = new AbortController();

  async function deliver(id: string): Promise<void> {
    const delivery = store.find('delivery', id);
    const endpoint = store.row('webhook_endpoint', delivery?.endpoint ?? '');
    const event = store.find('event', delivery?.event ?? '');
    if (stopping.signal.aborted || !delivery) return;
    if (!endpoint || !event) return void store.put('delivery', { ...delivery, state: 'given-up' });
    const copies = delivery.attempts === 0 ? applyFault(store, delivery, event.type) : 1;
    for (let copy = 0; copy < copies; copy += 1) {
      const body = JSON.stringify(event, null, 2);
      const answer = await send(endpoint.value.url, body, {
        secret: endpoint.hidden.secret ?? '',
        stop: stopping.signal,
      });
      if (stopping.signal.aborted) return;
      record(store, id, answer);
    }
  }

  function enqueue(delivery: Delivery): void {
    const before = queues.get(delivery.endpoint) ?? Promise.resolve();
    const sending = before.then(() => deliver(delivery.id)).finally(() => underWay.delete(delivery.id));
    queues.set(delivery.endpoint, sending);
    underWay.set(delivery.id, sending);
  }

  return {
    /** Starts every delivery that is due and not under way. */
    sendDue(): void {
      const nowS = clockS(store);
      for (const { value } of store.all('delivery')) {
        if (value.state === 'waiting' && value.dueAtS <= nowS && !underWay.has(value.id)) enqueue(value);
      }
    },
    /** Starts nothing more and breaks off what is under way; it is sent again after the next start. */
    async stop(): Promise<void> {
      stopping.abort();
      await Promise.allSettled(underWay.values());
    },
  };
}

/** How many copies to send now: 0 when a planned fault drops or postpones the event, 2 when it doubles it. */
function applyFault(store: Store, delivery: Delivery, type: Stripe.Event['type']): number {
  const fault = takeWebhookFault(store, type);
  if (fault?.kind === 'webhook_duplicate') return 2;
  if (fault?.kind === 'webhook_drop') {
    store.put('delivery', { ...delivery, state: 'dropped' });
    return 0;
  }
  if (fault) {
    const laterS = fault.kind === 'webhook_reorder' ? REORDER_BY_S : Math.ceil(fault.delayMs / 1000);
    store.put('delivery', { ...delivery, dueAtS: clockS(store) + laterS });
    return 0;
  }
  return 1;
}

async function send(url: string, body: string, { secret, stop }: { secret: string; stop: AbortSignal }) {
  const headers = { 'Content-Type': 'application/json; charset=utf-8', 'Stripe-Signature': signatureOf(body, secret) };
  try {
    const signal = AbortSignal.any([stop, AbortSignal.timeout(ANSWER_WITHIN_MS)]);
    const answer = await fetch(url, { method: 'POST', body, headers, redirect: 'manual', signal });
    await answer.arrayBuffer();
    return { ok: answer.ok, text: `HTTP ${answer.status}` };
  } catch (error) {
    return { ok: false, text: error instanceof Error ? error.message : String(error) };
  }
}

function record(store: Store, id: string, answer: { ok: boolean; text: string }): void {
  const delivery = store.find('delivery', id);
  if (!delivery) return;
  const pauseS = BACKOFF_S[delivery.attempts];
  store.put('delivery', {
    ...delivery,
    attempts: delivery.attempts + 1,
    dueAtS: clockS(store) + (pauseS ?? 0),
    lastAnswer: answer.text,
    state: answer.ok ? 'delivered' : pauseS === undefined ? 'given-up' : 'waiting',
  });
}
