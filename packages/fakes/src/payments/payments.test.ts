import Stripe from 'stripe';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { failure, startTestMarket, type TestMarket } from './test-market.ts';

let market: TestMarket;
beforeAll(async () => void (market = await startTestMarket()));
afterAll(() => market.close());

describe('a card payment', () => {
  test('succeeds with a charge, a fee of 2.9 % and 30, and pending funds', async () => {
    const { intent, charge } = await market.payIn(90_500, 'deal_fee');
    expect(intent).toMatchObject({ object: 'payment_intent', status: 'succeeded', amount_received: 90_500 });
    expect(charge).toMatchObject({ object: 'charge', paid: true, captured: true, transfer_group: 'deal_fee' });
    const transaction = await market.stripe.balanceTransactions.retrieve(charge.balance_transaction as string);
    expect(transaction).toMatchObject({ amount: 90_500, fee: 2_655, net: 87_845, status: 'pending', type: 'charge' });
    expect(transaction.available_on - transaction.created).toBe(172_800);
  });

  test('with the bypass card is available at once', async () => {
    const before = await market.stripe.balance.retrieve();
    await market.payIn(10_000, 'deal_bypass', 'pm_card_bypassPending');
    const after = await market.stripe.balance.retrieve();
    expect(after.available[0]!.amount - before.available[0]!.amount).toBe(10_000 - 320);
    expect(after.pending).toEqual(before.pending);
  });

  test.each([
    ['pm_card_chargeDeclined', 'card_declined', 'generic_decline'],
    ['pm_card_visa_chargeDeclinedInsufficientFunds', 'card_declined', 'insufficient_funds'],
    ['pm_card_chargeDeclinedExpiredCard', 'expired_card', ''],
    ['pm_card_chargeDeclinedIncorrectCvc', 'incorrect_cvc', ''],
    ['pm_card_chargeDeclinedProcessingError', 'processing_error', ''],
    ['pm_card_chargeDeclinedLostCard', 'card_declined', 'lost_card'],
  ])('is declined with 402 by %s', async (payment_method, code, declineCode) => {
    const error = await failure(
      market.stripe.paymentIntents.create({ amount: 5_000, currency: 'usd', payment_method, confirm: true }),
    );
    expect(error).toBeInstanceOf(Stripe.errors.StripeCardError);
    expect(error).toMatchObject({ statusCode: 402, code, decline_code: declineCode });
    expect(error.payment_intent).toMatchObject({ object: 'payment_intent', status: 'requires_payment_method' });
    const kept = await market.stripe.paymentIntents.retrieve(error.payment_intent!.id);
    expect(kept).toMatchObject({ status: 'requires_payment_method', latest_charge: error.charge });
    expect(kept.last_payment_error).toMatchObject({ code });
    const charge = await market.stripe.charges.retrieve(error.charge!);
    expect(charge).toMatchObject({ status: 'failed', paid: false, failure_code: code, balance_transaction: null });
  });

  test('may be tried again on the same intent after a decline', async () => {
    const intent = await market.stripe.paymentIntents.create({ amount: 5_000, currency: 'usd' });
    await failure(market.stripe.paymentIntents.confirm(intent.id, { payment_method: 'pm_card_chargeDeclined' }));
    const paid = await market.stripe.paymentIntents.confirm(intent.id, { payment_method: 'pm_card_visa' });
    expect(paid.status).toBe('succeeded');
    const again = await failure(market.stripe.paymentIntents.confirm(intent.id, { payment_method: 'pm_card_visa' }));
    expect(again).toMatchObject({ statusCode: 400, code: 'payment_intent_unexpected_state' });
  });

  test('that the bank must approve waits with the address of the question', async () => {
    const intent = await market.stripe.paymentIntents.create({
      amount: 5_000,
      currency: 'usd',
      payment_method: 'pm_card_authenticationRequired',
      confirm: true,
      return_url: 'http://localhost:9/back',
    });
    expect(intent.status).toBe('requires_action');
    expect(intent.next_action?.redirect_to_url?.url).toContain(`/authenticate/${intent.id}`);
    const offSession = await failure(
      market.stripe.paymentIntents.confirm(intent.id, {
        payment_method: 'pm_card_authenticationRequired',
        off_session: true,
      }),
    );
    expect(offSession).toMatchObject({ statusCode: 402, code: 'authentication_required' });
  });

  test('can be authorised first and captured in part', async () => {
    const intent = await market.stripe.paymentIntents.create({
      amount: 5_000,
      currency: 'usd',
      payment_method: 'pm_card_visa',
      confirm: true,
      capture_method: 'manual',
    });
    expect(intent).toMatchObject({ status: 'requires_capture', amount_capturable: 5_000, amount_received: 0 });
    const captured = await market.stripe.paymentIntents.capture(intent.id, { amount_to_capture: 4_000 });
    expect(captured).toMatchObject({ status: 'succeeded', amount_received: 4_000, amount_capturable: 0 });
    const charge = await market.stripe.charges.retrieve(captured.latest_charge as string);
    expect(charge).toMatchObject({ amount: 5_000, amount_captured: 4_000, captured: true });
  });

  test('can be cancelled while nothing is paid, and then not confirmed', async () => {
    const intent = await market.stripe.paymentIntents.create({ amount: 5_000, currency: 'usd' });
    const canceled = await market.stripe.paymentIntents.cancel(intent.id, { cancellation_reason: 'abandoned' });
    expect(canceled).toMatchObject({ status: 'canceled', cancellation_reason: 'abandoned' });
    const error = await failure(market.stripe.paymentIntents.confirm(intent.id, { payment_method: 'pm_card_visa' }));
    expect(error.code).toBe('payment_intent_unexpected_state');
  });
});

describe('a bank debit', () => {
  const debit = { amount: 20_000, currency: 'usd', payment_method: 'pm_usBankAccount_success', confirm: true };

  test('stays in processing, then settles', async () => {
    const intent = await market.stripe.paymentIntents.create(debit);
    expect(intent.status).toBe('processing');
    expect(await market.stripe.charges.retrieve(intent.latest_charge as string)).toMatchObject({ status: 'pending' });
    await market.control(`/payment_intents/${intent.id}/settle`);
    const settled = await market.stripe.paymentIntents.retrieve(intent.id, { expand: ['latest_charge'] });
    expect(settled).toMatchObject({ status: 'succeeded', amount_received: 20_000 });
    expect(settled.latest_charge).toMatchObject({ status: 'succeeded', amount_captured: 20_000 });
  });

  test('fails late and asks for another method', async () => {
    const intent = await market.stripe.paymentIntents.create(debit);
    await market.control(`/payment_intents/${intent.id}/fail`);
    const failed = await market.stripe.paymentIntents.retrieve(intent.id);
    expect(failed).toMatchObject({ status: 'requires_payment_method', amount_received: 0 });
    expect(await market.stripe.charges.retrieve(failed.latest_charge as string)).toMatchObject({
      status: 'failed',
      balance_transaction: null,
    });
  });
});

describe('requests the processor refuses', () => {
  const create = (params: object) => failure(market.stripe.paymentIntents.create(params as never));

  test.each([
    [{ currency: 'usd' }, 'parameter_missing', 'amount'],
    [{ amount: 12.5, currency: 'usd' }, 'parameter_invalid_integer', 'amount'],
    [{ amount: 49, currency: 'usd' }, 'amount_too_small', 'amount'],
    [{ amount: 5_000, currency: 'usd', colour: 'red' }, 'parameter_unknown', 'colour'],
    [{ amount: 5_000, currency: 'usd', customer: 'cus_nobody' }, 'resource_missing', 'customer'],
  ])('%o: %s', async (params, code, param) => {
    const error = await create(params);
    expect(error).toBeInstanceOf(Stripe.errors.StripeInvalidRequestError);
    expect(error).toMatchObject({ statusCode: 400, code, param });
    expect(error.requestId).toMatch(/^req_/);
  });

  test('an unknown object, path, account and key', async () => {
    expect(await failure(market.stripe.charges.retrieve('ch_nobody'))).toMatchObject({
      statusCode: 404,
      code: 'resource_missing',
    });
    expect(await failure(market.stripe.products.list())).toMatchObject({ statusCode: 404 });
    const foreign = await failure(market.stripe.balance.retrieve({}, { stripeAccount: 'acct_nobody' }));
    expect(foreign).toBeInstanceOf(Stripe.errors.StripePermissionError);
    const noKey = await fetch(`${market.url}/v1/balance`);
    expect(noKey.status).toBe(401);
  });
});

describe('customers and payment methods', () => {
  test('are kept, changed, attached and listed', async () => {
    const customer = await market.stripe.customers.create({
      email: 'yard@dunnowick.example',
      metadata: { a: '1', b: '2' },
    });
    const changed = await market.stripe.customers.update(customer.id, { name: 'Dunnowick Yard', metadata: { a: '' } });
    expect(changed).toMatchObject({ name: 'Dunnowick Yard', email: 'yard@dunnowick.example', metadata: { b: '2' } });
    const method = await market.stripe.paymentMethods.attach('pm_card_visa', { customer: customer.id });
    expect(method.card?.last4).toBe('4242');
    const methods = await market.stripe.customers.listPaymentMethods(customer.id, { type: 'card' });
    expect(methods.data.map(({ id }) => id)).toEqual([method.id]);
    await market.stripe.paymentMethods.detach(method.id);
    expect((await market.stripe.customers.listPaymentMethods(customer.id)).data).toEqual([]);
  });
});

describe('lists and expansion', () => {
  test('page from the newest to the oldest without gaps', async () => {
    const customer = await market.stripe.customers.create({});
    const made: string[] = [];
    for (let n = 0; n < 5; n += 1) {
      const input = { amount: 100 + n, currency: 'usd', customer: customer.id };
      made.unshift((await market.stripe.paymentIntents.create(input)).id);
    }
    const first = await market.stripe.paymentIntents.list({ customer: customer.id, limit: 2 });
    expect(first).toMatchObject({ object: 'list', has_more: true, url: '/v1/payment_intents' });
    const all = await market.stripe.paymentIntents
      .list({ customer: customer.id, limit: 2 })
      .autoPagingToArray({ limit: 100 });
    expect(all.map(({ id }) => id)).toEqual(made);
    const back = await market.stripe.paymentIntents.list({ customer: customer.id, ending_before: made[4]!, limit: 2 });
    expect(back.data.map(({ id }) => id)).toEqual([made[2], made[3]]);
  });

  test('expand nested objects, also inside lists, and refuse what is not there', async () => {
    const { intent } = await market.payIn(7_000, 'deal_expand');
    const whole = await market.stripe.paymentIntents.retrieve(intent.id, {
      expand: ['latest_charge.balance_transaction', 'payment_method', 'latest_charge.refunds'],
    });
    const charge = whole.latest_charge as Stripe.Charge;
    expect(charge.balance_transaction).toMatchObject({ object: 'balance_transaction', amount: 7_000 });
    expect(whole.payment_method).toMatchObject({ card: { last4: '4242' } });
    expect(charge.refunds).toMatchObject({ object: 'list', data: [] });
    const list = await market.stripe.charges.list({ payment_intent: intent.id, expand: ['data.payment_intent'] });
    expect(list.data[0]!.payment_intent).toMatchObject({ object: 'payment_intent', id: intent.id });
    const wrong = await failure(market.stripe.paymentIntents.retrieve(intent.id, { expand: ['colour'] }));
    expect(wrong.statusCode).toBe(400);
  });
});
