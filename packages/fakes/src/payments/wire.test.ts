import { appendFileSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Stripe from 'stripe';
import { afterEach, describe, expect, test } from 'vitest';
import { clientFor, failure, startReceiver, startTestMarket, until, type TestMarket } from './test-market.ts';

let market: TestMarket;
afterEach(() => market.close());

const intent = { amount: 5_000, currency: 'usd', payment_method: 'pm_card_visa', confirm: true } as const;
const key = (idempotencyKey: string) => ({ idempotencyKey });
const countOf = async () => (await market.stripe.paymentIntents.list({ limit: 100 })).data.length;

describe('an idempotency key', () => {
  test('gives the first answer again, with the header that says so', async () => {
    market = await startTestMarket();
    const first = await market.stripe.paymentIntents.create(intent, key('deal:1:pay:1'));
    const second = await market.stripe.paymentIntents.create(intent, key('deal:1:pay:1'));
    expect(second.id).toBe(first.id);
    const headers = (answer: Stripe.Response<unknown>) => answer.lastResponse.headers;
    expect(headers(first)['idempotent-replayed']).toBeUndefined();
    expect(headers(second)['idempotent-replayed']).toBe('true');
    expect(first.lastResponse.idempotencyKey).toBe('deal:1:pay:1');
    expect(await countOf()).toBe(1);
  });

  test('refuses other parameters, and counts order as no difference', async () => {
    market = await startTestMarket();
    await market.stripe.paymentIntents.create(intent, key('k'));
    const other = await failure(market.stripe.paymentIntents.create({ ...intent, amount: 5_001 }, key('k')));
    expect(other).toBeInstanceOf(Stripe.errors.StripeIdempotencyError);
    const turned = Object.fromEntries(Object.entries(intent).toReversed()) as typeof intent;
    await market.stripe.paymentIntents.create(turned, key('k'));
    expect(await countOf()).toBe(1);
  });

  test('repeats a decline and a 500, but stays free after a bad parameter', async () => {
    market = await startTestMarket();
    const declined = { ...intent, payment_method: 'pm_card_chargeDeclined' };
    const first = await failure(market.stripe.paymentIntents.create(declined, key('decline')));
    const second = await failure(market.stripe.paymentIntents.create(declined, key('decline')));
    expect(second.charge).toBe(first.charge);
    expect((await market.stripe.charges.list()).data).toHaveLength(1);

    await market.control('/faults', { kind: 'fail_before_commit', path: '/v1/payment_intents' });
    expect((await failure(market.stripe.paymentIntents.create(intent, key('broken')))).statusCode).toBe(500);
    expect((await failure(market.stripe.paymentIntents.create(intent, key('broken')))).statusCode).toBe(500);
    expect(await countOf()).toBe(1);

    await failure(market.stripe.paymentIntents.create({ ...intent, amount: 1 }, key('free')));
    expect((await market.stripe.paymentIntents.create(intent, key('free'))).status).toBe('succeeded');
  });

  test('lets one of many at once through', async () => {
    market = await startTestMarket();
    await market.control('/faults', { kind: 'slow', delayMs: 150 });
    const tries = Array.from({ length: 8 }, () => market.stripe.paymentIntents.create(intent, key('race')));
    const results = await Promise.allSettled(tries);
    expect(results.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    const refusals = results.flatMap((result) =>
      result.status === 'rejected' ? [result.reason as Stripe.errors.StripeError] : [],
    );
    expect(new Set(refusals.map(({ code, statusCode }) => `${statusCode} ${code}`))).toEqual(
      new Set(['409 idempotency_key_in_use']),
    );
    expect(await countOf()).toBe(1);
  });

  test('pays once when the answer is lost and the client asks again by itself', async () => {
    market = await startTestMarket();
    await market.control('/faults', { kind: 'lose_answer', path: '/v1/payment_intents', method: 'POST' });
    const client = clientFor(market.port, { maxNetworkRetries: 2 });
    const paid = await client.paymentIntents.create(intent, key('lost'));
    expect(paid.lastResponse.headers['idempotent-replayed']).toBe('true');
    expect(await countOf()).toBe(1);
  });

  test('is free for a second try after 503 and 429', async () => {
    market = await startTestMarket();
    await market.control('/faults', { kind: 'unavailable' });
    expect((await failure(market.stripe.paymentIntents.create(intent, key('again')))).statusCode).toBe(503);
    await market.control('/faults', { kind: 'rate_limit' });
    const limited = await failure(market.stripe.paymentIntents.create(intent, key('again')));
    expect(limited).toBeInstanceOf(Stripe.errors.StripeRateLimitError);
    expect((await market.stripe.paymentIntents.create(intent, key('again'))).status).toBe('succeeded');
  });
});

describe('a restart', () => {
  test('keeps every object and key, and cuts off a half-written last line', async () => {
    const dir = mkdtempSync(join(tmpdir(), 'lydite-payments-'));
    market = await startTestMarket({ dir });
    const paid = await market.stripe.paymentIntents.create(intent, key('kept'));
    const balance = await market.stripe.balance.retrieve();
    await market.close();
    appendFileSync(join(dir, 'payments.journal.jsonl'), '[{"put":{"kind":"charge","id":"ch_half');

    market = await startTestMarket({ dir });
    const replayed = await market.stripe.paymentIntents.create(intent, key('kept'));
    expect(replayed.id).toBe(paid.id);
    expect(await market.stripe.balance.retrieve()).toMatchObject({ pending: balance.pending });
    await market.stripe.paymentIntents.create(intent);
    await market.close();

    market = await startTestMarket({ dir });
    expect(await countOf()).toBe(2);
  });
});

describe('webhooks', () => {
  const receivers: Awaited<ReturnType<typeof startReceiver>>[] = [];
  afterEach(async () => void (await Promise.all(receivers.splice(0).map((receiver) => receiver.close()))));

  async function listen(options: { connect?: boolean; events?: string[]; statuses?: number[] } = {}) {
    const receiver = await startReceiver(options.statuses);
    receivers.push(receiver);
    const endpoint = await market.stripe.webhookEndpoints.create({
      url: receiver.url,
      enabled_events: (options.events ?? ['*']) as Stripe.WebhookEndpointCreateParams.EnabledEvent[],
      connect: options.connect ?? false,
    });
    return { ...receiver, secret: endpoint.secret!, endpoint };
  }

  test('are signed so that the client accepts them, and only unchanged', async () => {
    market = await startTestMarket();
    const receiver = await listen({ events: ['payment_intent.succeeded'] });
    const paid = await market.stripe.paymentIntents.create(intent);
    await until(() => receiver.received.length === 1);
    const { body, signature } = receiver.received[0]!;
    const event = market.stripe.webhooks.constructEvent(body, signature, receiver.secret);
    expect(event).toMatchObject({ object: 'event', type: 'payment_intent.succeeded', livemode: false });
    expect(event.account).toBeUndefined();
    expect((event.data.object as Stripe.PaymentIntent).id).toBe(paid.id);
    expect(event.request?.id).toMatch(/^req_/);
    const changed = Buffer.from(body.toString().replace('5000', '9000'));
    expect(() => market.stripe.webhooks.constructEvent(changed, signature, receiver.secret)).toThrow(/signature/i);
  });

  test('of connected accounts go to Connect endpoints with the account, of the market to the others', async () => {
    market = await startTestMarket();
    const [own, connect] = [await listen(), await listen({ connect: true })];
    const seller = await market.onboarded();
    const { charge } = await market.payIn(5_000, 'deal', 'pm_card_bypassPending');
    await market.stripe.transfers.create({
      amount: 4_000,
      currency: 'usd',
      destination: seller,
      source_transaction: charge.id,
    });
    await market.control('/clock', { advanceSeconds: 2 });
    await market.control('/clock', { advanceSeconds: 2 });
    await until(() => connect.types().includes('payout.paid'));
    const events = connect.received.map(({ body }) => JSON.parse(body.toString()) as Stripe.Event);
    expect(new Set(events.map(({ account }) => account))).toEqual(new Set([seller]));
    expect(connect.types()).toEqual(expect.arrayContaining(['account.updated', 'payout.created', 'payout.paid']));
    await until(() => own.types().includes('transfer.created'));
    expect(own.types().filter((type) => type.startsWith('payout') || type.startsWith('account'))).toEqual([]);
    const listed = await market.stripe.events.list({ type: 'payout.paid' }, { stripeAccount: seller });
    expect(listed.data).toHaveLength(1);
    expect((await market.stripe.events.list({ types: ['payout.paid'] })).data).toEqual([]);
  });

  test('come again until they are taken', async () => {
    market = await startTestMarket();
    const receiver = await listen({ events: ['payment_intent.succeeded'], statuses: [500, 302] });
    await market.stripe.paymentIntents.create(intent);
    await until(() => receiver.received.length === 1);
    const [event] = (await market.stripe.events.list({ type: 'payment_intent.succeeded' })).data;
    expect(event?.pending_webhooks).toBe(1);
    await market.control('/clock', { advanceSeconds: 2 });
    await until(() => receiver.received.length === 2);
    await market.control('/clock', { advanceSeconds: 3 });
    await until(() => receiver.received.length === 3);
    await until(async () => (await market.stripe.events.retrieve(event!.id)).pending_webhooks === 0);
    expect(new Set(receiver.received.map(({ body }) => body.toString())).size).toBe(1);
  });

  test('can be doubled, dropped, turned around and sent again', async () => {
    market = await startTestMarket();
    const receiver = await listen({ events: ['payment_intent.created', 'payment_intent.succeeded'] });
    await market.control('/faults', { kind: 'webhook_duplicate', event: 'payment_intent.succeeded' });
    await market.stripe.paymentIntents.create(intent);
    await until(() => receiver.received.length === 3);
    expect(receiver.types().filter((type) => type === 'payment_intent.succeeded')).toHaveLength(2);

    receiver.received.length = 0;
    await market.control('/faults', { kind: 'webhook_drop', event: 'payment_intent.created' });
    await market.stripe.paymentIntents.create(intent);
    await until(() => receiver.received.length === 1);
    expect(receiver.types()).toEqual(['payment_intent.succeeded']);

    receiver.received.length = 0;
    await market.control('/faults', { kind: 'webhook_reorder', event: 'payment_intent.created' });
    await market.stripe.paymentIntents.create(intent);
    await until(() => receiver.received.length === 1);
    await market.control('/clock', { advanceSeconds: 3 });
    await until(() => receiver.received.length === 2);
    expect(receiver.types()).toEqual(['payment_intent.succeeded', 'payment_intent.created']);

    const [event] = (await market.stripe.events.list({ type: 'payment_intent.succeeded' })).data;
    await market.control(`/events/${event!.id}/redeliver`);
    await until(() => receiver.received.length === 3);
  });

  test('stop when the endpoint is deleted', async () => {
    market = await startTestMarket();
    const receiver = await listen();
    expect((await market.stripe.webhookEndpoints.list()).data[0]).not.toHaveProperty('secret');
    await market.stripe.webhookEndpoints.del(receiver.endpoint.id);
    const kept = await listen();
    await market.stripe.paymentIntents.create(intent);
    await until(() => kept.types().includes('payment_intent.succeeded'));
    expect(receiver.received).toEqual([]);
  });
});
