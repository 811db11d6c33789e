import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startPayments } from '@lydite/fakes';
import Stripe from 'stripe';
import { createProcessorGateway } from '../src/platform/processor-gateway.ts';
import { openMarket, type Market } from './market.ts';

const webhookSecret = 'whsec_of_the_tests';

interface FaultOrder {
  kind: string;
  method?: string;
  path?: string;
  event?: string;
  times?: number;
}

/** The processor's stand-in in this process, as a test steers it. */
export async function startProcessor() {
  const dir = await mkdtemp(join(tmpdir(), 'lydite-processor-'));
  const running = await startPayments({ port: 0, dir, fundsDelayS: 172_800, payoutDelayS: 1 });
  const url = `http://127.0.0.1:${running.port}`;
  const client = new Stripe('sk_test_of_the_tests', {
    host: '127.0.0.1',
    port: running.port,
    protocol: 'http',
    telemetry: false,
  });
  const control = async (path: string, body: object = {}): Promise<unknown> => {
    const headers = { 'content-type': 'application/json' };
    const answer = await fetch(`${url}/_control${path}`, { method: 'POST', headers, body: JSON.stringify(body) });
    if (!answer.ok) throw new Error(`${path}: ${answer.status} ${await answer.text()}`);
    return answer.json();
  };

  return {
    url,
    client,
    control,
    fault: (order: FaultOrder) => control('/faults', order),
    clearFaults: () => fetch(`${url}/_control/faults`, { method: 'DELETE' }),
    /** Lets the processor's time pass: payouts land, funds turn available. */
    advance: (advanceSeconds: number) => control('/clock', { advanceSeconds }),
    /** What a buyer does on the payment page: chooses a test card and presses Pay. */
    pay: (page: string, method = 'pm_card_visa') =>
      fetch(page.replace(/^http:\/\/[^/]+/, url), {
        method: 'POST',
        body: new URLSearchParams({ method }),
        redirect: 'manual',
      }),
    /** A seller finishes the processor's set-up. */
    completeAccount: (accountId: string) => control(`/accounts/${accountId}/complete`),
    close: async (): Promise<void> => {
      await running.close();
      await rm(dir, { recursive: true, force: true });
    },
  };
}
export type Processor = Awaited<ReturnType<typeof startProcessor>>;

/** The market with the processor's stand-in behind the gateway it has in production. Events come when a test delivers them. */
export async function openMarketWithProcessor() {
  const processor = await startProcessor();
  const market = await openMarket({
    payments: createProcessorGateway,
    env: { PAYMENTS_API_URL: processor.url, PAYMENTS_WEBHOOK_SECRETS: `whsec_an_older_one,${webhookSecret}` },
  });
  return {
    market,
    processor,
    close: async (): Promise<void> => {
      await market.close();
      await processor.close();
    },
  };
}

/** The processor's events so far, oldest first: its own, and those of a seller's account where one is named. */
export async function eventsOf({ client }: Processor, accountId?: string): Promise<Stripe.Event[]> {
  const all: Stripe.Event[] = [];
  for await (const event of client.events.list({ limit: 100 }, accountId ? { stripeAccount: accountId } : {}))
    all.push(event);
  return all.toReversed();
}

/** Posts an event to the market as the processor does, signed unless told otherwise; its HTTP status. */
export async function deliver({ origin }: Market, event: Stripe.Event, secret = webhookSecret): Promise<number> {
  const payload = JSON.stringify(event);
  const signature = Stripe.webhooks.generateTestHeaderString({ payload, secret });
  const answer = await fetch(`${origin}/api/webhooks/payments`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', 'stripe-signature': signature },
    body: payload,
  });
  return answer.status;
}

/** Delivers everything that has happened, in order, and lets the worker work. */
export async function deliverAll(
  { market, processor }: { market: Market; processor: Processor },
  accountId?: string,
): Promise<void> {
  for (const event of await eventsOf(processor)) await deliver(market, event);
  if (accountId) for (const event of await eventsOf(processor, accountId)) await deliver(market, event);
  await market.work();
}
