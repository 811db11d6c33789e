import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { startTestMarket, type TestMarket } from '../test-market.ts';

let market: TestMarket;
beforeAll(async () => void (market = await startTestMarket()));
afterAll(() => market.close());

const successUrl = 'http://localhost:9/deals/d1?session={CHECKOUT_SESSION_ID}';
const cancelUrl = 'http://localhost:9/deals/d1';

function createSession(more: object = {}) {
  return market.stripe.checkout.sessions.create({
    mode: 'payment',
    line_items: [
      {
        quantity: 1,
        price_data: { currency: 'usd', unit_amount: 90_500, product_data: { name: 'Lot <b>L-2481</b>' } },
      },
    ],
    success_url: successUrl,
    cancel_url: cancelUrl,
    customer_email: 'buyer@vennaby.example',
    metadata: { deal: 'd1' },
    payment_intent_data: { transfer_group: 'deal_d1', metadata: { deal: 'd1' } },
    ...more,
  });
}

/** Opens or sends a page without following where it leads. */
async function visit(address: string, form?: Record<string, string>) {
  const answer = await fetch(address.replace('localhost', '127.0.0.1'), {
    redirect: 'manual',
    ...(form && { method: 'POST', body: new URLSearchParams(form) }),
  });
  return {
    status: answer.status,
    to: answer.headers.get('location'),
    policy: answer.headers.get('content-security-policy'),
    text: await answer.text(),
  };
}

const read = (id: string) => market.stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent', 'line_items'] });

describe('a checkout session', () => {
  test('starts open and unpaid, without an intent, and shows its page', async () => {
    const session = await createSession();
    expect(session).toMatchObject({
      object: 'checkout.session',
      status: 'open',
      payment_status: 'unpaid',
      payment_intent: null,
      amount_total: 90_500,
      metadata: { deal: 'd1' },
    });
    expect((await read(session.id)).line_items?.data[0]).toMatchObject({
      description: 'Lot <b>L-2481</b>',
      quantity: 1,
    });
    const page = await visit(session.url!);
    expect(page.status).toBe(200);
    expect(page.text).toContain('Pay $905.00');
    expect(page.text).toContain('Lot &lt;b&gt;L-2481&lt;/b&gt;');
    expect(page.text).toContain(`href="${cancelUrl}"`);
    expect(page.policy).toContain("default-src 'none'");
    const [, style = ''] = /<style>(.*)<\/style>/s.exec(page.text) ?? [];
    expect(page.policy).toContain(createHash('sha256').update(style).digest('base64'));
    expect(page.policy).toContain('form-action');
    expect(page.policy).toContain('http://localhost:9');
    expect(page.text.toLowerCase()).not.toContain('stripe');
  });

  test('is paid on its page and leads back with its id', async () => {
    const session = await createSession();
    const answer = await visit(session.url!, { method: 'pm_card_visa' });
    expect(answer).toMatchObject({ status: 303, to: `http://localhost:9/deals/d1?session=${session.id}` });
    const paid = await read(session.id);
    expect(paid).toMatchObject({ status: 'complete', payment_status: 'paid', url: null });
    expect(paid.payment_intent).toMatchObject({
      status: 'succeeded',
      amount: 90_500,
      transfer_group: 'deal_d1',
      metadata: { deal: 'd1' },
    });
    expect((await visit(session.url!)).text).toContain('This payment is done');
    expect((await visit(session.url!, { method: 'pm_card_visa' })).status).toBe(200);
    expect((await market.stripe.charges.list({ transfer_group: 'deal_d1' })).data).toHaveLength(1);
  });

  test('stays open after a decline, says why, and can then be paid', async () => {
    const session = await createSession({ payment_intent_data: { transfer_group: 'deal_again' } });
    const answer = await visit(session.url!, { method: 'pm_card_chargeDeclinedInsufficientFunds' });
    expect(answer.status).toBe(303);
    expect((await visit(session.url!)).text).toMatch(/role="alert".*insufficient funds/s);
    expect(await read(session.id)).toMatchObject({ status: 'open', payment_status: 'unpaid' });
    await visit(session.url!, { method: 'pm_card_visa' });
    expect(await read(session.id)).toMatchObject({ status: 'complete', payment_status: 'paid' });
    const charges = await market.stripe.charges.list({ transfer_group: 'deal_again' });
    expect(charges.data.map(({ status }) => status)).toEqual(['succeeded', 'failed']);
  });

  test('asks the bank, is refused, asks again, is approved', async () => {
    const session = await createSession();
    const asked = await visit(session.url!, { method: 'pm_card_authenticationRequired' });
    expect(asked.to).toContain('/authenticate/pi_');
    expect((await visit(asked.to!)).text).toContain('approve $905.00');
    const refused = await visit(asked.to!, { answer: 'refuse' });
    expect(refused.to).toContain(`/pay/${session.id}`);
    expect((await visit(session.url!)).text).toContain('failed authentication');
    const again = await visit(session.url!, { method: 'pm_card_authenticationRequired' });
    const approved = await visit(again.to!, { answer: 'approve' });
    expect(approved.to).toBe(successUrl.replace('{CHECKOUT_SESSION_ID}', session.id));
    expect(await read(session.id)).toMatchObject({ status: 'complete', payment_status: 'paid' });
  });

  test('with a bank debit is complete but unpaid until the debit settles', async () => {
    const session = await createSession();
    await visit(session.url!, { method: 'pm_usBankAccount_success' });
    const waiting = await read(session.id);
    expect(waiting).toMatchObject({ status: 'complete', payment_status: 'unpaid' });
    expect(waiting.payment_intent).toMatchObject({ status: 'processing' });
    await market.control(`/payment_intents/${(waiting.payment_intent as { id: string }).id}/settle`);
    expect(await read(session.id)).toMatchObject({ payment_status: 'paid' });
    const types = (await market.stripe.events.list({ limit: 100 })).data.map(({ type }) => type);
    expect(types).toContain('checkout.session.async_payment_succeeded');
  });

  test('expires on demand and by the clock, and takes no payment then', async () => {
    const [session, other] = [await createSession(), await createSession()];
    await visit(session.url!, { method: 'pm_card_chargeDeclined' });
    const expired = await market.stripe.checkout.sessions.expire(session.id);
    expect(expired).toMatchObject({ status: 'expired', url: null });
    expect((await read(session.id)).payment_intent).toMatchObject({ status: 'canceled' });
    expect((await visit(session.url!, { method: 'pm_card_visa' })).status).toBe(410);
    await expect(market.stripe.checkout.sessions.expire(session.id)).rejects.toMatchObject({ statusCode: 400 });
    await market.control('/clock', { advanceSeconds: 86_401 });
    expect(await read(other.id)).toMatchObject({ status: 'expired', payment_status: 'unpaid' });
    const open = await market.stripe.checkout.sessions.list({ status: 'open', limit: 100 });
    expect(open.data).toEqual([]);
  });
});

describe('a seller’s set-up', () => {
  const createLink = (account: string) =>
    market.stripe.accountLinks.create({
      account,
      type: 'account_onboarding',
      return_url: 'http://localhost:9/payouts',
      refresh_url: 'http://localhost:9/payouts/again',
    });

  test('opens once, takes a name and a bank, and leads back', async () => {
    const account = await market.stripe.accounts.create({ capabilities: { transfers: { requested: true } } });
    const link = await createLink(account.id);
    const opened = await visit(link.url);
    expect(opened.to).toContain('/setup/visit_');
    expect((await visit(link.url)).to).toBe('http://localhost:9/payouts/again');
    expect((await visit(opened.to!)).text).toContain('Finish');
    expect((await visit(opened.to!, { name: ' ', bank: '000123456789' })).status).toBe(422);
    const done = await visit(opened.to!, { name: 'Ossenmere Bench', bank: '000123456789' });
    expect(done).toMatchObject({ status: 303, to: 'http://localhost:9/payouts' });
    expect(await market.stripe.accounts.retrieve(account.id)).toMatchObject({
      details_submitted: true,
      payouts_enabled: true,
      capabilities: { transfers: 'active' },
      business_profile: { name: 'Ossenmere Bench' },
    });
  });

  test('ends with its link after five minutes', async () => {
    const account = await market.stripe.accounts.create({});
    const link = await createLink(account.id);
    await market.control('/clock', { advanceSeconds: 301 });
    expect((await visit(link.url)).to).toBe('http://localhost:9/payouts/again');
  });

  test('with the closed bank account has its payouts sent back', async () => {
    const account = await market.stripe.accounts.create({ capabilities: { transfers: { requested: true } } });
    const opened = await visit((await createLink(account.id)).url);
    await visit(opened.to!, { name: 'Pellandsea Store', bank: '000111111116' });
    const { charge } = await market.payIn(5_000, 'deal_closed', 'pm_card_bypassPending');
    const order = { amount: 4_000, currency: 'usd', destination: account.id, source_transaction: charge.id };
    await market.stripe.transfers.create(order);
    for (let step = 0; step < 3; step += 1) await market.control('/clock', { advanceSeconds: 2 });
    const [payout] = (await market.stripe.payouts.list({}, { stripeAccount: account.id })).data;
    expect(payout?.status).toBe('failed');
  });
});

test('the overview shows who holds what and that a seller was paid', async () => {
  const seller = await market.onboarded('Harrowmere <Sorting>');
  const { charge } = await market.payIn(50_000, 'deal_seen', 'pm_card_bypassPending');
  const order = { amount: 43_210, currency: 'usd', destination: seller, source_transaction: charge.id };
  await market.stripe.transfers.create(order);
  for (let step = 0; step < 3; step += 1) await market.control('/clock', { advanceSeconds: 2 });
  const { text } = await visit(`${market.url}/`);
  expect(text).toContain('Harrowmere &lt;Sorting&gt;');
  expect(text).toMatch(/Payouts to banks.*\$432\.10.*paid/s);
  expect(text).not.toContain('<Sorting>');
});
