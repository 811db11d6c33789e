import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { addDeal, bringToReceipt, must, payIn, weighIn, type TestDeal } from '../../../test/deals.ts';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Market } from '../../../test/market.ts';
import { recordHold } from './deals.commands.ts';

let market: Market;
beforeAll(async () => {
  market = await openMarket();
});
afterAll(() => market.close());

const view = async (deal: TestDeal, side: 'seller' | 'buyer') =>
  (await must((await deal[side]()).call('GET /deals/:dealCode', { params: { dealCode: deal.code } }))).body;
const balances = async (deal: TestDeal) => {
  const rows: { code: string; balance: number }[] = await market.db.query(
    'select code, balance::int from ledger_accounts where code = any($1)',
    [[`hold.deal:${deal.code}`, `payable.seller:${deal.sellerId}`, `clearing.refund:${deal.code}`]],
  );
  return Object.fromEntries(rows.map(({ code, balance }) => [code.split(':')[0]!, balance]));
};

describe('a deal from award to settlement', () => {
  test('price, freight and fee are held; names are shown once they are', async () => {
    const deal = await addDeal(market);
    const before = await view(deal, 'buyer');
    expect(before).toMatchObject({ state: 'awaiting_payment', holdMinor: 90_000 + 1_800 + 1_800, actions: ['pay'] });
    expect(before.counterparty).toBeNull();
    expect(before.due?.what).toBe('Pay into hold');
    expect((await view(deal, 'seller')).due?.what).toBe('The buyer pays into hold');

    await payIn(market, deal);
    expect(await market.db.transaction((tx) => recordHold(tx, { dealId: deal.id }))).toBe('known');
    const held = await view(deal, 'seller');
    expect(held).toMatchObject({ state: 'held', actions: ['dispatch'], side: 'seller' });
    expect(held.counterparty).toEqual({ name: 'Vennaby Recovery', place: 'Vennaby' });
    expect(held.chain.map(({ state }) => state)).toEqual(['done', 'done', 'now', 'todo', 'todo', 'todo', 'todo']);
  });

  test('accepted and countersigned it settles: the statement, the ledger and the orders agree', async () => {
    const deal = await addDeal(market);
    const params = { dealCode: deal.code };
    await bringToReceipt(market, deal);
    const weighed = await must(weighIn(deal, 12_380));
    expect(weighed.body.weighIn).toMatchObject({
      netG: 12_380,
      declaredG: 12_400,
      differenceG: -20,
      toleranceG: 62,
      claimableMinor: 0,
    });
    expect(weighed.body.weighIn?.photos).toHaveLength(1);
    expect(weighed.body.actions).toEqual(['accept']);

    const accepted = await must((await deal.buyer()).call('POST /deals/:dealCode/accept', { params }));
    expect(accepted.body).toMatchObject({ state: 'weighed_in', actions: [] });
    expect(accepted.body.due?.ifMissed).toContain('settled when the seller has countersigned, at the latest');
    const settled = await must((await deal.seller()).call('POST /deals/:dealCode/countersign', { params }));

    expect(settled.body).toMatchObject({ state: 'settled', due: null, actions: [] });
    expect(settled.body.settlement).toMatchObject({
      valueMinor: 90_000,
      sellerGetsMinor: 90_000 + 1_800 - 3_600,
      refundMinor: 0,
      refund: null,
    });
    expect(settled.body.settlement?.transfer?.state).toBe('waiting');
    expect(settled.body.settlement?.hash).toMatch(/^[0-9a-f]{64}$/);
    expect(await balances(deal)).toEqual({ 'hold.deal': 0, 'payable.seller': 88_200 });
    const { settlement } = settled.body;
    expect((await view(deal, 'buyer')).settlement).toEqual({
      ...settlement,
      transfer: { ...settlement!.transfer, reason: '' },
    });
    const steps = settled.body.settlement!.sellerSteps;
    expect(steps.map(({ label }) => label)).toEqual(['Value', 'Freight', 'Seller’s fee', 'To the seller']);
    expect(settled.body.events.map(({ title }) => title)).toEqual([
      'Awarded',
      'Paid into hold',
      'Dispatched',
      'Received',
      'Weighed in',
      'Delivery accepted',
      'Weigh-in countersigned',
      'Ready to settle',
      'Settled',
    ]);
    expect(settled.body.events.map(({ by }) => by).slice(2, 5)).toEqual([
      'You',
      'Vennaby Recovery',
      'Vennaby Recovery',
    ]);
  });

  test('what the bank says is for the buyer alone, what the transfer waits for for the seller alone', async () => {
    const deal = await addDeal(market);
    const declined = 'There is not enough money on the card or account. Use another one.';
    await market.db.query(
      `insert into payments (id, deal_id, attempt, amount_minor, state, message) values (gen_random_uuid(), $1, 7, 1, 'failed', $2)`,
      [deal.id, declined],
    );
    expect((await view(deal, 'buyer')).payment).toEqual({ state: 'failed', message: declined });
    expect((await view(deal, 'seller')).payment).toEqual({ state: 'failed', message: '' });

    await bringToReceipt(market, deal);
    await must(weighIn(deal, 12_400));
    const params = { dealCode: deal.code };
    await must((await deal.seller()).call('POST /deals/:dealCode/countersign', { params }));
    await must((await deal.buyer()).call('POST /deals/:dealCode/accept', { params }));
    const transfer = async (side: 'seller' | 'buyer') => (await view(deal, side)).settlement?.transfer;
    expect(await transfer('seller')).toMatchObject({ state: 'waiting', reason: 'Set up your payout account.' });
    expect(await transfer('buyer')).toMatchObject({ state: 'waiting', reason: '' });
  });

  test('two settling steps at once settle once', async () => {
    const deal = await addDeal(market);
    const params = { dealCode: deal.code };
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 12_400));
    const [buyer, seller] = [await deal.buyer(), await deal.seller()];
    const answers = await Promise.all([
      ...[1, 2, 3].map(() => buyer.call('POST /deals/:dealCode/accept', { params })),
      ...[1, 2, 3].map(() => seller.call('POST /deals/:dealCode/countersign', { params })),
    ]);
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 200, 409, 409, 409, 409]);
    expect(await balances(deal)).toEqual({ 'hold.deal': 0, 'payable.seller': 88_200 });
    const rows: unknown[] = await market.db.query('select 1 from transfers where deal_id = $1', [deal.id]);
    expect(rows).toHaveLength(1);
  });

  test('a value above 20 000.00 waits for approval', async () => {
    const deal = await addDeal(market, { priceMinor: 2_000_001 });
    const params = { dealCode: deal.code };
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 12_400));
    await must((await deal.buyer()).call('POST /deals/:dealCode/accept', { params }));
    const answer = await must((await deal.seller()).call('POST /deals/:dealCode/countersign', { params }));
    expect(answer.body).toMatchObject({ state: 'needs_approval', settlement: null });
    expect((await balances(deal))['hold.deal']).toBe(answer.body.holdMinor);
  });
});

describe('a claim', () => {
  test('beyond the tolerance takes the whole shortage off the price, and settles when the seller accepts', async () => {
    const deal = await addDeal(market);
    const params = { dealCode: deal.code };
    await bringToReceipt(market, deal);
    const weighed = await must(weighIn(deal, 11_160));
    expect(weighed.body.actions).toEqual(['accept', 'claim_mass']);
    const claimed = await must(
      (await deal.buyer()).call('POST /deals/:dealCode/claim', { params, body: { ground: 'mass' } }),
    );
    expect(claimed.body).toMatchObject({ state: 'in_dispute', claim: { adjustmentMinor: 9_000 } });
    expect((await view(deal, 'seller')).actions).toEqual(['accept_claim']);
    const settled = await must((await deal.seller()).call('POST /deals/:dealCode/accept-claim', { params }));
    expect(settled.body.settlement).toMatchObject({
      valueMinor: 81_000,
      sellerGetsMinor: 81_000 + 1_800 - 3_240,
      refundMinor: 93_600 - 81_000 - 1_800 - 1_620,
      refund: { state: 'queued' },
    });
    expect(await balances(deal)).toEqual({ 'hold.deal': 0, 'payable.seller': 79_560, 'clearing.refund': 9_180 });
  });

  test('within the tolerance there is nothing to claim', async () => {
    const deal = await addDeal(market);
    const params = { dealCode: deal.code };
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 12_338));
    const refused = await (
      await deal.buyer()
    ).call('POST /deals/:dealCode/claim', { params, body: { ground: 'mass' } });
    expect(refused).toMatchObject({ status: 422, problem: { code: 'claim.none' } });
  });
});

describe('who may do what, and when', () => {
  test('a step before its time, or taken twice, is refused and changes nothing', async () => {
    const deal = await addDeal(market);
    const params = { dealCode: deal.code };
    const dispatch = { params, body: { carrier: 'Dunnowick Carriers', trackingCode: '1234' } };
    const [seller, buyer] = [await deal.seller(), await deal.buyer()];
    const early = [
      await seller.call('POST /deals/:dealCode/dispatch', dispatch),
      await buyer.call('POST /deals/:dealCode/receive', { params }),
      await buyer.call('POST /deals/:dealCode/accept', { params }),
      await buyer.call('POST /deals/:dealCode/cancel', { params }),
      await seller.call('POST /deals/:dealCode/countersign', { params }),
      await seller.call('POST /deals/:dealCode/accept-claim', { params }),
      await seller.call('GET /deals/:dealCode/packing-slip.pdf', { params }),
      await buyer.call('GET /deals/:dealCode/statement.pdf', { params }),
    ];
    expect(early.map(({ status, problem }) => [status, problem.code])).toEqual(
      early.map(() => [409, 'deal.wrong_state']),
    );
    expect((await view(deal, 'buyer')).events).toHaveLength(1);

    await payIn(market, deal);
    expect((await buyer.call('POST /deals/:dealCode/cancel', { params })).problem.code).toBe('deal.wrong_state');
    expect((await seller.call('POST /deals/:dealCode/ready', { params })).problem.detail).toContain('is sent');
    expect((await seller.call('POST /deals/:dealCode/dispatch', dispatch)).status).toBe(200);
    expect((await seller.call('POST /deals/:dealCode/dispatch', dispatch)).status).toBe(409);
  });

  test('a stranger finds no such deal, nor does a side with the other’s step', async () => {
    const deal = await addDeal(market);
    await payIn(market, deal);
    const params = { dealCode: deal.code };
    const stranger = await market.as(await addMember(market, { roles: ['seller', 'buyer'] }));
    const both = await addDeal(market);
    await market.db.query(`insert into member_roles (member_id, role) values ($1, 'buyer')`, [both.sellerId]);
    const answers = [
      await stranger.call('GET /deals/:dealCode', { params }),
      await stranger.call('POST /deals/:dealCode/receive', { params }),
      await stranger.call('POST /deals/:dealCode/accept', { params }),
      await stranger.call('POST /deals/:dealCode/photos', { params, form: new FormData() }),
      await stranger.call('GET /deals/:dealCode/statement.pdf', { params }),
      await stranger.call('GET /deals/:dealCode/packing-slip.pdf', { params }),
      await (await both.seller()).call('POST /deals/:dealCode/accept', { params: { dealCode: both.code } }),
    ];
    expect(answers.map(({ status, problem }) => [status, problem.code])).toEqual(
      answers.map(() => [404, 'deal.not_found']),
    );
    expect((await (await deal.buyer()).call('POST /deals/:dealCode/countersign', { params })).status).toBe(403);
  });

  test('a frozen deal takes no step', async () => {
    const deal = await addDeal(market);
    await payIn(market, deal);
    await market.db.query('update deals set frozen_at = market_now() where id = $1', [deal.id]);
    const params = { dealCode: deal.code };
    const body = { carrier: 'Dunnowick Carriers', trackingCode: '1234' };
    const refused = await (await deal.seller()).call('POST /deals/:dealCode/dispatch', { params, body });
    expect(refused).toMatchObject({ status: 409, problem: { code: 'deal.frozen' } });
    expect(await view(deal, 'seller')).toMatchObject({ frozen: true, due: null, actions: [] });
  });

  test('own deals come with the own duty first', async () => {
    const deal = await addDeal(market);
    const second = await addDeal(market);
    await payIn(market, deal);
    const mine = (await must((await deal.seller()).call('GET /my/deals'))).body;
    expect(mine).toMatchObject([{ code: deal.code, side: 'seller', duty: 'Hand the lot over for delivery' }]);
    const theirs = (await must((await second.buyer()).call('GET /my/deals', { query: { side: 'buyer' } }))).body;
    expect(theirs).toMatchObject([{ code: second.code, duty: 'Pay into hold', payoutState: null }]);
    expect((await must((await second.buyer()).call('GET /my/deals', { query: { side: 'seller' } }))).body).toEqual([]);
  });
});
