import { mkdtempSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Stripe from 'stripe';
import { startPayments, type PaymentsOptions } from './server.ts';

/** The processor's official client, pointed at a started stand-in. */
export function clientFor(port: number, options: ConstructorParameters<typeof Stripe>[1] = {}): Stripe {
  return new Stripe('sk_test_local', {
    host: '127.0.0.1',
    port,
    protocol: 'http',
    telemetry: false,
    maxNetworkRetries: 0,
    ...options,
  });
}

/** A stand-in on a free port with a folder of its own, the official client, and the control API at hand. */
export async function startTestMarket(options: Partial<PaymentsOptions> = {}) {
  const dir = options.dir ?? mkdtempSync(join(tmpdir(), 'lydite-payments-'));
  const running = await startPayments({ port: 0, fundsDelayS: 172_800, payoutDelayS: 1, ...options, dir });
  const url = `http://127.0.0.1:${running.port}`;
  const control = async (path: string, body: object = {}) => {
    const headers = { 'Content-Type': 'application/json' };
    const answer = await fetch(`${url}/_control${path}`, { method: 'POST', headers, body: JSON.stringify(body) });
    if (!answer.ok) throw new Error(`${path}: ${answer.status} ${await answer.text()}`);
    return (await answer.json()) as Record<string, unknown>;
  };
  const stripe = clientFor(running.port);
  return {
    ...running,
    dir,
    url,
    stripe,
    control,
    /** A paid card payment of a deal; its charge comes along. */
    async payIn(amount: number, transfer_group: string, payment_method = 'pm_card_visa') {
      const intent = await stripe.paymentIntents.create({
        amount,
        currency: 'usd',
        transfer_group,
        payment_method,
        confirm: true,
        expand: ['latest_charge'],
      });
      return { intent, charge: intent.latest_charge as Stripe.Charge };
    },
    /** A seller's account that may be paid. */
    async onboarded(name = 'Thrennaby Loft Stock') {
      const account = await stripe.accounts.create({
        controller: { stripe_dashboard: { type: 'express' } },
        business_profile: { name },
        capabilities: { transfers: { requested: true } },
      });
      await control(`/accounts/${account.id}/complete`);
      return account.id;
    },
  };
}

export type TestMarket = Awaited<ReturnType<typeof startTestMarket>>;

export interface Received {
  body: Buffer;
  signature: string;
}

/** A webhook receiver that keeps what it gets and answers with the statuses given, then 200. */
export async function startReceiver(statuses: number[] = []) {
  const received: Received[] = [];
  const server = createServer((req, res) => {
    const chunks: Buffer[] = [];
    req.on('data', (chunk: Buffer) => chunks.push(chunk));
    req.on('end', () => {
      received.push({ body: Buffer.concat(chunks), signature: String(req.headers['stripe-signature']) });
      res.writeHead(statuses.shift() ?? 200).end();
    });
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}/hook`,
    received,
    types: () => received.map(({ body }) => (JSON.parse(body.toString()) as Stripe.Event).type),
    close: () => new Promise<void>((resolve) => server.close(() => resolve()).closeAllConnections()),
  };
}

/** Waits until a condition holds. @throws after five seconds */
export async function until(holds: () => boolean | Promise<boolean>): Promise<void> {
  const endMs = Date.now() + 5_000;
  while (!(await holds())) {
    if (Date.now() > endMs) throw new Error('Waited five seconds in vain.');
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

/** The error of a request that is expected to fail. */
export async function failure(promise: Promise<unknown>) {
  return promise.then(
    () => Promise.reject(new Error('The request succeeded.')),
    (error: Stripe.errors.StripeError & { payment_intent?: Stripe.PaymentIntent; charge?: string }) => error,
  );
}
