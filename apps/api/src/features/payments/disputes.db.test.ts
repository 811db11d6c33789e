import { afterAll, beforeAll, expect, test } from 'vitest';
import { addDeal, type TestDeal } from '../../../test/deals.ts';
import { payOnPage, settle, setUpPayouts } from '../../../test/payments.ts';
import { deliver, deliverAll, eventsOf, openMarketWithProcessor } from '../../../test/processor.ts';
import { checkLedger } from '../ledger/ledger-check.ts';
import { accountCode, balanceOf } from '../ledger/ledger.reads.ts';

let stage: Awaited<ReturnType<typeof openMarketWithProcessor>>;
beforeAll(async () => {
  stage = await openMarketWithProcessor();
});
afterAll(() => stage.close());

const balance = (code: string) => balanceOf(stage.market.db.manager, code);
const isFrozen = async ({ id }: TestDeal): Promise<boolean> => {
  const rows: { frozen: boolean }[] = await stage.market.db.query(
    'select frozen_at is not null as frozen from deals where id = $1',
    [id],
  );
  return rows[0]!.frozen;
};

/** The buyer's bank opens a dispute on a paid deal; its id. */
async function dispute(deal: TestDeal): Promise<string> {
  const [row]: { id: string }[] = await stage.market.db.query(
    'select charge_id as id from payments where deal_id = $1',
    [deal.id],
  );
  await stage.processor.control(`/charges/${row!.id}/dispute`);
  const { data } = await stage.processor.client.disputes.list({ charge: row!.id });
  return data[0]!.id;
}

async function paidDeal(): Promise<TestDeal> {
  const deal = await addDeal(stage.market);
  await payOnPage(stage, deal);
  return deal;
}

async function expectCleanBooks(): Promise<void> {
  const report = await checkLedger(stage.market.world, { patienceMs: 0 });
  expect(report.checks.filter(({ ok }) => !ok)).toEqual([]);
}

test('a dispute freezes the deal and puts the money in suspense; won, all goes on, with the deadline moved', async () => {
  const deal = await paidDeal();
  const before: { at: Date }[] = await stage.market.db.query('select due_at as at from deals where id = $1', [deal.id]);
  const id = await dispute(deal);
  await deliverAll(stage);
  expect(await isFrozen(deal)).toBe(true);
  expect(await balance(accountCode.disputed(id))).toBe(93_600);
  await expectCleanBooks();
  const dispatch = await (
    await deal.seller()
  ).call('POST /deals/:dealCode/dispatch', {
    params: { dealCode: deal.code },
    body: { carrier: 'Dunnowick Carriers', trackingCode: 'DC 1' },
  });
  expect(dispatch.problem.code).toBe('deal.frozen');

  await stage.market.advance('2 hours');
  await stage.processor.control(`/disputes/${id}/close`, { result: 'won' });
  await deliverAll(stage);
  expect(await isFrozen(deal)).toBe(false);
  expect(await balance(accountCode.disputed(id))).toBe(0);
  expect(await balance(accountCode.hold(deal.code))).toBe(93_600);
  const after: { at: Date }[] = await stage.market.db.query('select due_at as at from deals where id = $1', [deal.id]);
  expect(after[0]!.at.getTime() - before[0]!.at.getTime()).toBeGreaterThanOrEqual(2 * 3_600_000);
  // The bank's news of one decision comes in several events: the timeline tells it once.
  const told: { kind: string }[] = await stage.market.db.query(
    `select kind from deal_events where deal_id = $1 and kind in ('freeze', 'release') order by id`,
    [deal.id],
  );
  expect(told.map(({ kind }) => kind)).toEqual(['freeze', 'release']);
  await expectCleanBooks();
});

test('lost before the settlement it comes out of the hold, and the deal stays frozen for the desk', async () => {
  const deal = await paidDeal();
  const id = await dispute(deal);
  await stage.processor.control(`/disputes/${id}/close`, { result: 'lost' });
  for (const event of (await eventsOf(stage.processor)).toReversed()) await deliver(stage.market, event);
  await stage.market.work();
  expect(await isFrozen(deal)).toBe(true);
  expect(await balance(accountCode.hold(deal.code))).toBe(0);
  expect(await balance(accountCode.disputed(id))).toBe(0);
  await expectCleanBooks();
});

test('what is on its way to the seller stops while the deal is frozen, and goes out when the dispute is won', async () => {
  const deal = await addDeal(stage.market);
  await setUpPayouts(stage, deal);
  await payOnPage(stage, deal);
  await settle(deal);
  const id = await dispute(deal);
  const transfer = async () => {
    const rows: { state: string; reason: string }[] = await stage.market.db.query(
      'select state, reason from transfers where deal_id = $1',
      [deal.id],
    );
    return rows[0];
  };
  await deliverAll(stage);
  expect(await transfer()).toEqual({ state: 'waiting', reason: 'The deal is frozen.' });
  await stage.processor.control(`/disputes/${id}/close`, { result: 'won' });
  await deliverAll(stage);
  expect(await transfer()).toEqual({ state: 'sent', reason: '' });
  await deliverAll(stage);
  await expectCleanBooks();
});

test('lost after the settlement it is the market’s expense', async () => {
  const deal = await addDeal(stage.market);
  await setUpPayouts(stage, deal);
  await payOnPage(stage, deal);
  await settle(deal);
  await stage.market.work();
  const costsMinor = await balance(accountCode.disputeCosts);
  const id = await dispute(deal);
  await stage.processor.control(`/disputes/${id}/close`, { result: 'lost' });
  await deliverAll(stage);
  // The amount, and the fee of 15.00.
  expect((await balance(accountCode.disputeCosts)) - costsMinor).toBe(93_600 + 1500);
  await expectCleanBooks();
});

test('a dispute heard of before its payment waits for it', async () => {
  const deal = await addDeal(stage.market);
  const { body } = await (
    await deal.buyer()
  ).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } });
  await stage.processor.pay(body.url, 'pm_card_createDispute');
  const events = await eventsOf(stage.processor);
  for (const event of events.filter(({ type }) => type.startsWith('charge.dispute')))
    await deliver(stage.market, event);
  await stage.market.work();
  expect(await isFrozen(deal)).toBe(false);
  await deliverAll(stage);
  await stage.market.db.query('update inbox set next_at = clock_timestamp() where processed_at is null');
  await stage.market.work();
  expect(await isFrozen(deal)).toBe(true);
  await expectCleanBooks();
});

test('an inquiry of the bank moves no money and freezes nothing', async () => {
  const deal = await addDeal(stage.market);
  await payOnPage(stage, deal, 'pm_card_createDisputeInquiry');
  await deliverAll(stage);
  expect(await isFrozen(deal)).toBe(false);
  expect(await balance(accountCode.hold(deal.code))).toBe(93_600);
  await expectCleanBooks();
});
