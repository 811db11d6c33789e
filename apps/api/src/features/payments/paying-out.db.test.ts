import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, afterEach, beforeAll, expect, test } from 'vitest';
import { addDeal, type TestDeal } from '../../../test/deals.ts';
import { payOnPage, retryNow, settle, setUpPayouts } from '../../../test/payments.ts';
import { deliverAll, openMarketWithProcessor } from '../../../test/processor.ts';
import { lockDeal } from '../deals/deal-steps.commands.ts';
import { settleDeal } from '../settlements/settlements.commands.ts';
import { checkLedger } from '../ledger/ledger-check.ts';
import { accountCode, balanceOf } from '../ledger/ledger.reads.ts';
import { releaseWaitingTransfers, returnHold } from './payments.commands.ts';

let stage: Awaited<ReturnType<typeof openMarketWithProcessor>>;
beforeAll(async () => {
  stage = await openMarketWithProcessor();
});
afterEach(() => stage.processor.clearFaults());
afterAll(() => stage.close());

/** A deal that is paid, delivered and settled; its outside effects have not run yet. */
async function settledDeal({ ready = true } = {}): Promise<TestDeal> {
  const deal = await addDeal(stage.market);
  if (ready) await setUpPayouts(stage, deal);
  await payOnPage(stage, deal);
  await settle(deal);
  return deal;
}

const transferOf = async ({ id }: TestDeal) => {
  const rows: { state: string; reason: string; key: string }[] = await stage.market.db.query(
    'select state, reason, key from transfers where deal_id = $1',
    [id],
  );
  return rows[0]!;
};

/** The transfers of a deal as the processor knows them. */
const sentFor = async ({ id }: TestDeal) =>
  (await stage.processor.client.transfers.list({ transfer_group: id, limit: 100 })).data.map(({ amount }) => amount);

const owedTo = ({ sellerId }: TestDeal) => balanceOf(stage.market.db.manager, accountCode.payable(sellerId));

/** Everything heard, everything done, and the books proved against the processor. */
async function expectCleanBooks(): Promise<void> {
  await deliverAll(stage);
  const report = await checkLedger(stage.market.world, { patienceMs: 0 });
  expect(report.checks.filter(({ ok }) => !ok)).toEqual([]);
  expect(report.balanced).toBe(true);
}

// 900.00 + 18.00 freight − 4 % of 900.00.
const sellerGetsMinor = 88_200;

test('a settlement pays the seller out: transfer, payout to the bank, notice, and clean books', async () => {
  const deal = await settledDeal();
  await stage.market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'sent', reason: '' });
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  expect(await owedTo(deal)).toBe(0);
  await expectCleanBooks();

  const [account]: { id: string }[] = await stage.market.db.query(
    'select account_id as id from payout_accounts where member_id = $1',
    [deal.sellerId],
  );
  await stage.processor.advance(172_900);
  await stage.processor.advance(10);
  await deliverAll(stage, account!.id);
  await deliverAll(stage, account!.id);
  const own = await (await deal.seller()).call('GET /my/payout-account');
  expect(own.body).toMatchObject({ state: 'ready', requirements: [], verified: true, waitingMinor: 0 });
  expect(own.body.payouts).toMatchObject([{ amountMinor: sellerGetsMinor, state: 'paid' }]);
  const notices: { subject: string }[] = await stage.market.db.query(
    `select subject from notices where member_id = $1 and kind = 'payout'`,
    [deal.sellerId],
  );
  expect(notices).toHaveLength(1);
  expect(notices[0]!.subject).toContain('is paid out to your bank');
});

test('a transfer retried after a lost answer pays once', async () => {
  const deal = await settledDeal();
  await stage.processor.fault({ kind: 'lose_answer', method: 'POST', path: '/v1/transfers', times: 5 });
  await stage.market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'queued' });
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  await stage.processor.clearFaults();
  await retryNow(stage.market);
  await stage.market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'sent' });
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  await expectCleanBooks();
});

test('the event of a transfer whose answer was lost settles it too, and the retry then does nothing', async () => {
  const deal = await settledDeal();
  await stage.processor.fault({ kind: 'lose_answer', method: 'POST', path: '/v1/transfers', times: 5 });
  await stage.market.work();
  await stage.processor.clearFaults();
  await deliverAll(stage);
  expect(await transferOf(deal)).toMatchObject({ state: 'sent' });
  await retryNow(stage.market);
  await expectCleanBooks();
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
});

test('an effect carried out twice, after a crash between the call and its record, pays once', async () => {
  const deal = await settledDeal();
  await stage.market.work();
  await stage.market.db.query(`update transfers set state = 'queued', transfer_id = null where deal_id = $1`, [
    deal.id,
  ]);
  await stage.market.db.query(
    `update outbox set state = 'pending', next_at = clock_timestamp() where kind = 'transfer.create'`,
  );
  await stage.market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'sent' });
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  await expectCleanBooks();
});

test('four workers at once send one transfer', async () => {
  const deal = await settledDeal();
  await stage.market.db.query(
    `insert into outbox (kind, key, payload) select kind, key || ':again:' || n, payload from outbox, generate_series(1, 3) as n
      where kind = 'transfer.create' and state = 'pending'`,
  );
  await Promise.all([1, 2, 3, 4].map(() => stage.market.work()));
  await retryNow(stage.market);
  await expectCleanBooks();
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  expect(await transferOf(deal)).toMatchObject({ state: 'sent' });
});

test('the processor down: the transfer waits its turn, nothing is posted, and it goes out afterwards', async () => {
  const deal = await settledDeal();
  await stage.processor.fault({ kind: 'unavailable', path: '/v1/transfers', times: 50 });
  await stage.market.work();
  expect(await owedTo(deal)).toBe(sellerGetsMinor);
  expect(await sentFor({ ...deal }).catch(() => 'down')).toBe('down');
  await stage.processor.clearFaults();
  await retryNow(stage.market);
  await stage.market.work();
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  await expectCleanBooks();
});

test('a failure that the processor repeats for its key is got over with a new one', async () => {
  const deal = await settledDeal();
  await stage.processor.fault({ kind: 'fail_before_commit', method: 'POST', path: '/v1/transfers' });
  await stage.market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'queued', key: expect.stringMatching(/:create:2$/) });
  await retryNow(stage.market);
  await stage.market.work();
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  await expectCleanBooks();
});

test('the seller’s share waits for the account and for the papers, with the reason, and then goes out by itself', async () => {
  const { market } = stage;
  const deal = await settledDeal({ ready: false });
  await market.db.query('update members set verified_at = null where id = $1', [deal.sellerId]);
  await market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'waiting', reason: 'Set up your payout account.' });
  const before = await (await deal.seller()).call('GET /my/payout-account');
  expect(before.body).toMatchObject({ state: 'none', verified: false, waitingMinor: sellerGetsMinor, payouts: [] });
  const duty = async () => (await (await deal.seller()).call('GET /my/lots')).body[0]!.duty;
  expect(await duty()).toBe('Set up your payout account');

  await setUpPayouts(stage, deal);
  expect(await transferOf(deal)).toMatchObject({
    state: 'waiting',
    reason: 'The desk still has to see your identity and licence papers.',
  });
  expect(await duty()).toBe('');
  await market.db.query('update members set verified_at = market_now() where id = $1', [deal.sellerId]);
  await market.db.transaction((tx) => releaseWaitingTransfers(tx, deal.sellerId));
  await market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'sent', reason: '' });
  expect(await sentFor(deal)).toEqual([sellerGetsMinor]);
  await expectCleanBooks();
});

test('papers seen while a settlement is being written do not leave its transfer waiting', async () => {
  const { market } = stage;
  const deal = await addDeal(market);
  await setUpPayouts(stage, deal);
  await payOnPage(stage, deal);
  await market.db.query('update members set verified_at = null where id = $1', [deal.sellerId]);
  await market.db.query(`update deals set state = 'settling' where id = $1`, [deal.id]);
  let seen: Promise<void> | undefined;
  await market.db.transaction(async (tx) => {
    const locked = await lockDeal(tx, { id: deal.id });
    await settleDeal(tx, locked.deal, { adjustmentMinor: 0, reason: '', now: locked.now });
    seen = market.db.transaction(async (other) => {
      await other.query('update members set verified_at = market_now() where id = $1', [deal.sellerId]);
      await releaseWaitingTransfers(other, deal.sellerId);
    });
    await sleep(300);
  });
  await seen;
  expect(await transferOf(deal)).toMatchObject({ state: 'queued', reason: '' });
  await market.work();
  expect(await transferOf(deal)).toMatchObject({ state: 'sent' });
  await expectCleanBooks();
});

test('what the processor refuses for good is set aside for the desk', async () => {
  const { market } = stage;
  const deal = await settledDeal();
  await market.db.query(`update payments set charge_id = 'ch_unknown' where deal_id = $1`, [deal.id]);
  await market.work();
  expect(await transferOf(deal)).toMatchObject({
    state: 'failed',
    reason: 'The payment processor refused the transfer. The desk looks into it.',
  });
  expect(await owedTo(deal)).toBe(sellerGetsMinor);
  expect(await sentFor(deal)).toEqual([]);
  await expectCleanBooks();
});

test('an account that is not ready says what is missing; each press gives a new link and never a second account', async () => {
  const deal = await addDeal(stage.market);
  const seller = await deal.seller();
  const first = await seller.call('POST /my/payout-account/link');
  const second = await seller.call('POST /my/payout-account/link');
  expect(first.body.url).not.toBe(second.body.url);
  const own = await seller.call('GET /my/payout-account');
  expect(own.body.state).toBe('requirements');
  expect(own.body.requirements).toContain('Bank account for payouts');
  const accounts = await stage.processor.client.accounts.list({ limit: 100 });
  expect(accounts.data.filter(({ metadata }) => metadata?.member_id === deal.sellerId)).toHaveLength(1);
});

test('a cancelled deal gives the whole hold back once, through a lost answer', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await payOnPage(stage, deal);
  await market.db.transaction(async (tx) => {
    await tx.query(`update deals set state = 'cancelled' where id = $1`, [deal.id]);
    await returnHold(tx, deal, 'dispatch was late');
    await returnHold(tx, deal, 'dispatch was late');
  });
  await processor.fault({ kind: 'lose_answer', method: 'POST', path: '/v1/refunds', times: 5 });
  await market.work();
  await processor.clearFaults();
  await retryNow(market);
  await market.work();
  const [payment]: { intent: string }[] = await market.db.query(
    'select intent_id as intent from payments where deal_id = $1',
    [deal.id],
  );
  const refunds = await processor.client.refunds.list({ payment_intent: payment!.intent });
  expect(refunds.data.map(({ amount }) => amount)).toEqual([93_600]);
  await expectCleanBooks();
});

test('a refund the bank sends back is owed again and left to the desk', async () => {
  const { market, processor } = stage;
  const deal = await addDeal(market);
  await payOnPage(stage, deal);
  await market.db.transaction(async (tx) => {
    await tx.query(`update deals set state = 'cancelled' where id = $1`, [deal.id]);
    await returnHold(tx, deal, 'dispatch was late');
  });
  await market.work();
  const [row]: { id: string }[] = await market.db.query('select refund_id as id from refunds where deal_id = $1', [
    deal.id,
  ]);
  await processor.control(`/refunds/${row!.id}/fail`);
  await deliverAll(stage);
  const [refund]: { state: string }[] = await market.db.query('select state from refunds where deal_id = $1', [
    deal.id,
  ]);
  expect(refund!.state).toBe('failed');
  expect(await balanceOf(market.db.manager, accountCode.refund(deal.code))).toBe(93_600);
  await expectCleanBooks();
});
