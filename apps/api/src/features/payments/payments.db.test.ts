import { afterAll, beforeAll, expect, test } from 'vitest';
import { addDeal, passDeadline } from '../../../test/deals.ts';
import { addMember } from '../../../test/factories.ts';
import { openPage, payOnPage } from '../../../test/payments.ts';
import { deliver, deliverAll, eventsOf, openMarketWithProcessor } from '../../../test/processor.ts';
import { accountCode, balanceOf } from '../ledger/ledger.reads.ts';
import { pollEvents } from './receive-event.ts';

let stage: Awaited<ReturnType<typeof openMarketWithProcessor>>;
beforeAll(async () => {
  stage = await openMarketWithProcessor();
});
afterAll(() => stage.close());

const held = (code: string) => balanceOf(stage.market.db.manager, accountCode.hold(code));
const attemptsOf = (dealId: string): Promise<{ attempt: number; state: string }[]> =>
  stage.market.db.query('select attempt, state from payments where deal_id = $1 order by attempt', [dealId]);
const stateOf = async (dealId: string): Promise<string> => {
  const rows: { state: string }[] = await stage.market.db.query('select state from deals where id = $1', [dealId]);
  return rows[0]!.state;
};
const postingsOf = (dealId: string): Promise<{ kind: string; n: number }[]> =>
  stage.market.db.query(
    'select kind, count(*)::int as n from ledger_transfers where deal_id = $1 group by kind order by kind',
    [dealId],
  );

test('the buyer pays on the processor’s page, and the event, not the way back, makes the deal held', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  const page = await openPage(deal);
  const paid = await processor.pay(page);
  expect(paid.headers.get('location')).toBe(`http://localhost:4400/deals/${deal.code}?paid=1`);
  expect(await stateOf(deal.id)).toBe('awaiting_payment');
  expect(await held(deal.code)).toBe(0);
  await deliverAll(stage);
  expect(await stateOf(deal.id)).toBe('held');
  expect(await held(deal.code)).toBe(93_600);
  const view = await (await deal.buyer()).call('GET /deals/:dealCode', { params: { dealCode: deal.code } });
  expect(view.body.payment).toEqual({ state: 'succeeded', message: '' });
});

test('every event twice and in the wrong order posts once', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await processor.pay(await openPage(deal), 'pm_card_chargeDeclined');
  await processor.pay(await openPage(deal));
  const events = await eventsOf(processor);
  for (const event of [...events.toReversed(), ...events]) expect(await deliver(market, event)).toBe(200);
  await market.work();
  for (const event of events) await deliver(market, event);
  await market.work();
  expect(await postingsOf(deal.id)).toEqual([{ kind: 'pay in', n: 1 }]);
  expect(await held(deal.code)).toBe(93_600);
  expect(await stateOf(deal.id)).toBe('held');
});

test('many workers at once on the same events post once', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await processor.pay(await openPage(deal));
  for (const event of await eventsOf(processor)) await deliver(market, event);
  await Promise.all([market.work(), market.work(), market.work(), market.work()]);
  expect(await postingsOf(deal.id)).toEqual([{ kind: 'pay in', n: 1 }]);
});

test('an event with a wrong or no signature is refused and nothing is kept', async () => {
  const { market, processor } = stage;
  const [event] = await eventsOf(processor);
  const forged = { ...event!, id: 'evt_forged' };
  expect(await deliver(market, forged, 'whsec_of_somebody_else')).toBe(400);
  const plain = await fetch(`${market.origin}/api/webhooks/payments`, { method: 'POST', body: JSON.stringify(forged) });
  expect(plain.status).toBe(400);
  const empty = await fetch(`${market.origin}/api/webhooks/payments`, { method: 'POST' });
  expect(empty.status).toBe(400);
  expect(await market.db.query(`select 1 from inbox where event_id = 'evt_forged'`)).toEqual([]);
});

test('during a rotation the older secret is still accepted', async () => {
  const { market, processor } = stage;
  const [event] = await eventsOf(processor);
  expect(
    await deliver(
      market,
      { ...event!, id: 'evt_rotated', type: 'payment_intent.succeeded' } as never,
      'whsec_an_older_one',
    ),
  ).toBe(200);
  expect(await market.db.query(`select 1 from inbox where event_id = 'evt_rotated'`)).toHaveLength(1);
  await market.db.query(`update inbox set processed_at = now() where event_id = 'evt_rotated'`);
});

test('pressing again gives the page that is open; a decline leaves it open and is told in neutral words', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  const page = await openPage(deal);
  expect(await openPage(deal)).toBe(page);
  await processor.pay(page, 'pm_card_visa_chargeDeclinedLostCard');
  await deliverAll(stage);
  const view = await (await deal.buyer()).call('GET /deals/:dealCode', { params: { dealCode: deal.code } });
  expect(view.body.payment).toEqual({
    state: 'failed',
    message: 'The bank declined the payment. Use another card, or ask your bank.',
  });
  expect(await openPage(deal)).toBe(page);
  expect(await attemptsOf(deal.id)).toEqual([{ attempt: 1, state: 'failed' }]);
});

test('two presses at once open one page', async () => {
  const deal = await addDeal(stage.market);
  const [one, other] = await Promise.all([openPage(deal), openPage(deal)]);
  expect(one).toBe(other);
});

test('a page that ran out gives way to a new one', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  const page = await openPage(deal);
  const [row]: { id: string }[] = await market.db.query('select session_id as id from payments where deal_id = $1', [
    deal.id,
  ]);
  await processor.client.checkout.sessions.expire(row!.id);
  expect(await openPage(deal)).not.toBe(page);
  expect(await attemptsOf(deal.id)).toEqual([
    { attempt: 1, state: 'expired' },
    { attempt: 2, state: 'open' },
  ]);
});

test('a bank debit pauses the pay-by time; a new press is refused until the bank has spoken', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await payOnPage(stage, deal, 'pm_usBankAccount_success');
  const [paused]: { at: Date | null }[] = await market.db.query('select due_paused_at as at from deals where id = $1', [
    deal.id,
  ]);
  expect(paused!.at).not.toBeNull();
  const again = await (await deal.buyer()).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } });
  expect(again.problem).toMatchObject({ status: 409, code: 'deal.wrong_state' });
  const [row]: { id: string }[] = await market.db.query('select intent_id as id from payments where deal_id = $1', [
    deal.id,
  ]);
  await processor.control(`/payment_intents/${row!.id}/fail`);
  await deliverAll(stage);
  const [running]: { at: Date | null }[] = await market.db.query(
    'select due_paused_at as at from deals where id = $1',
    [deal.id],
  );
  expect(running!.at).toBeNull();
  await payOnPage(stage, deal);
  expect(await attemptsOf(deal.id)).toEqual([
    { attempt: 1, state: 'expired' },
    { attempt: 2, state: 'succeeded' },
  ]);
  expect(await stateOf(deal.id)).toBe('held');
});

test('the processor down: 503, nothing posted, and the next press works', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await processor.fault({ kind: 'unavailable', path: '/v1/checkout', times: 2 });
  const press = async () =>
    (await deal.buyer()).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } });
  const down = await press();
  expect(down.problem).toMatchObject({ status: 503, code: 'processor.unavailable' });
  expect(await postingsOf(deal.id)).toEqual([]);
  expect((await press()).status).toBe(200);
});

test('a lost answer does not leave two pages', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await processor.fault({ kind: 'lose_answer', method: 'POST', path: '/v1/checkout', times: 2 });
  const press = async () =>
    (await deal.buyer()).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } });
  expect((await press()).status).toBe(503);
  expect((await press()).status).toBe(200);
  const sessions = await processor.client.checkout.sessions.list({ limit: 100 });
  expect(sessions.data.filter((one) => one.client_reference_id === deal.code)).toHaveLength(1);
});

test('a payment that the processor failed by itself gets a new key at the next press', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await processor.fault({ kind: 'fail_before_commit', method: 'POST', path: '/v1/checkout' });
  const press = async () =>
    (await deal.buyer()).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } });
  expect((await press()).status).toBe(503);
  expect((await press()).status).toBe(200);
  expect(await attemptsOf(deal.id)).toEqual([
    { attempt: 1, state: 'expired' },
    { attempt: 2, state: 'open' },
  ]);
});

test('only the buyer of a deal opens its page, and only while it awaits payment', async () => {
  const { market } = stage;
  const deal = await addDeal(market);
  const params = { dealCode: deal.code };
  const stranger = await market.as(await addMember(market));
  expect((await stranger.call('POST /deals/:dealCode/payment', { params })).status).toBe(404);
  expect((await (await deal.seller()).call('POST /deals/:dealCode/payment', { params })).status).toBe(403);
  await market.db.query('update deals set frozen_at = market_now() where id = $1', [deal.id]);
  const frozen = await (await deal.buyer()).call('POST /deals/:dealCode/payment', { params });
  expect(frozen.problem.code).toBe('deal.frozen');
  await market.db.query('update deals set frozen_at = null where id = $1', [deal.id]);
  await payOnPage(stage, deal);
  const late = await (await deal.buyer()).call('POST /deals/:dealCode/payment', { params });
  expect(late.problem).toMatchObject({ status: 409, code: 'deal.wrong_state' });
});

test('a payment that comes after the deal has ended goes back whole', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await processor.pay(await openPage(deal));
  await market.db.query(`update deals set state = 'cancelled', ended_at = market_now(), due_at = null where id = $1`, [
    deal.id,
  ]);
  await deliverAll(stage);
  expect(await stateOf(deal.id)).toBe('cancelled');
  expect(await held(deal.code)).toBe(0);
  expect(await balanceOf(market.db.manager, accountCode.refund(deal.code))).toBe(0);
  const refunds = await processor.client.refunds.list({ limit: 1 });
  expect(refunds.data[0]!.amount).toBe(93_600);
  await deliverAll(stage);
  expect(await postingsOf(deal.id)).toEqual([
    { kind: 'hold returned', n: 1 },
    { kind: 'pay in', n: 1 },
    { kind: 'refund', n: 1 },
  ]);
});

test('a deal paid twice keeps one payment and gives the other back whole', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  const first = await openPage(deal);
  // As if the first page had been thought lost: both stay open.
  await market.db.query(`update payments set state = 'expired' where deal_id = $1`, [deal.id]);
  await processor.pay(await openPage(deal));
  await processor.pay(first);
  await deliverAll(stage);
  await deliverAll(stage);
  expect(await held(deal.code)).toBe(93_600);
  const states = (await attemptsOf(deal.id)).map(({ state }) => state).toSorted();
  expect(states).toEqual(['refunded', 'succeeded']);
  expect(await postingsOf(deal.id)).toEqual([
    { kind: 'pay in', n: 2 },
    { kind: 'payment returned', n: 1 },
    { kind: 'refund', n: 1 },
  ]);
});

test('what no webhook brought, the hourly look brings', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await processor.pay(await openPage(deal));
  await pollEvents(market.world);
  await market.work();
  expect(await stateOf(deal.id)).toBe('held');
});

test('past the pay-by time no page opens', async () => {
  const { market } = stage;
  const deal = await addDeal(market);
  await passDeadline(market, deal);
  const late = await (await deal.buyer()).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } });
  expect(late.problem).toMatchObject({ status: 409, detail: 'The time to pay is over.' });
});

test('a payment that the processor refuses is said in words, and charges nothing', async () => {
  const deal = await addDeal(stage.market, { priceMinor: 10, freightMinor: 0 });
  const refused = await (await deal.buyer()).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } });
  expect(refused.problem).toMatchObject({ code: 'processor.unavailable', status: 503 });
  expect(refused.problem.detail).toContain('does not take this payment');
});
