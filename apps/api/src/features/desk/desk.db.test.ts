import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { addDeal, bringToReceipt, must, weighIn } from '../../../test/deals.ts';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { addOpenLot } from '../../../test/open-lot.ts';

let market: Market;
let operator: Caller;
beforeAll(async () => {
  market = await openMarket();
  operator = await market.as(await addMember(market, { roles: ['operator'], name: 'Market desk' }));
});
afterAll(() => market.close());

test('members are found by name, address and place; papers seen raise the limit and are in the audit log', async () => {
  const memberId = await addMember(market, { name: 'Vennaby Salvage', place: 'Vennaby', verified: false });
  const found = (await operator.call('GET /desk/members', { query: { q: 'vennaby sal' } })).body;
  expect(found).toMatchObject({
    total: 1,
    rows: [{ id: memberId, verifiedAt: null, limitMinor: 200_000, payoutAccount: 'none' }],
  });
  const body = { limitMinor: 5_000_000, reason: 'Trade licence and passport' };
  const verified = await operator.call('POST /desk/members/:memberId/verify', { params: { memberId }, body });
  expect(verified.body).toMatchObject({ limitMinor: 5_000_000, verifiedAt: expect.any(String) });
  const log = await market.db.query(
    `select actor_id, reason from audit_log where action = 'member.verify' and object_id = $1`,
    [memberId],
  );
  expect(log).toEqual([{ actor_id: operator.memberId, reason: body.reason }]);
});

test('nobody sees to their own papers, and an old password entry is not enough', async () => {
  const body = { limitMinor: 5_000_000, reason: 'Trade licence' };
  const own = await operator.call('POST /desk/members/:memberId/verify', {
    params: { memberId: operator.memberId! },
    body,
  });
  expect(own.status).toBe(403);
  const nobody = await operator.call('POST /desk/members/:memberId/verify', {
    params: { memberId: randomUUID() },
    body,
  });
  expect(nobody.status).toBe(404);
  const stale = await market.as(await addMember(market, { roles: ['operator'] }));
  await market.db.query(`update sessions set fresh_until = market_now() where member_id = $1`, [stale.memberId]);
  const refused = await stale.call('POST /desk/members/:memberId/verify', { params: { memberId: randomUUID() }, body });
  expect(refused.problem.code).toBe('session.stale');
});

test('lots and deals are listed without reserves and ceilings; a search text is no pattern', async () => {
  const sellerId = await addMember(market, { roles: ['seller'], name: 'Dunnowick Dismantling' });
  const lot = await addOpenLot(market, { sellerId, askingMinor: 90_000 });
  const buyer = await market.as(await addMember(market));
  await buyer.call('POST /lots/:lotCode/take', {
    params: { lotCode: lot.code },
    body: { priceMinor: 90_000, attempt: randomUUID() },
  });
  const lots = await operator.call('GET /desk/lots', { query: { q: lot.code } });
  expect(lots.body.rows).toMatchObject([
    { code: lot.code, seller: 'Dunnowick Dismantling', state: 'awarded', dealCode: expect.stringMatching(/^D-/) },
  ]);
  expect(lots.bytes.toString()).not.toMatch(/reserve|ceiling/i);
  const deals = await operator.call('GET /desk/deals', { query: { q: 'dunnowick' } });
  expect(deals.body.rows).toMatchObject([
    {
      state: 'awaiting_payment',
      dueWhat: 'Payment into hold',
      heldMinor: 0,
      events: [{ title: 'Awarded', by: 'The market' }],
    },
  ]);
  await market.db.query(`update deals set due_kind = 'dispatch_late' where code = $1`, [deals.body.rows[0]!.code]);
  const late = await operator.call('GET /desk/deals', { query: { q: 'dunnowick' } });
  expect(late.body.rows[0]!.dueWhat).toBe('Dispatch, late');
  for (const q of ['%', '_', `' or 1=1--`])
    expect((await operator.call('GET /desk/deals', { query: { q } })).body.total).toBe(0);
});

test('a settlement above 20 000.00 waits for an operator who is no side of it, and settles when approved, with its claim', async () => {
  const deal = await addDeal(market, { priceMinor: 3_000_000 });
  const params = { dealCode: deal.code };
  const approve = (by: Caller) => by.call('POST /desk/deals/:dealCode/approve', { params });
  await bringToReceipt(market, deal);
  await must(weighIn(deal, 11_160));
  expect((await approve(operator)).problem.code).toBe('deal.wrong_state');
  await must((await deal.buyer()).call('POST /deals/:dealCode/claim', { params, body: { ground: 'mass' } }));
  const waiting = await must((await deal.seller()).call('POST /deals/:dealCode/accept-claim', { params }));
  expect(waiting.body.state).toBe('needs_approval');

  await market.db.query(`insert into member_roles (member_id, role) values ($1, 'operator')`, [deal.sellerId]);
  expect((await approve(await deal.seller())).problem.code).toBe('member.role_missing');
  await market.db.query('update deals set frozen_at = market_now() where id = $1', [deal.id]);
  expect((await approve(operator)).problem.code).toBe('deal.frozen');
  await market.db.query('update deals set frozen_at = null where id = $1', [deal.id]);

  const answers = await Promise.all([approve(operator), approve(operator)]);
  expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([204, 409]);
  const settled = await must((await deal.buyer()).call('GET /deals/:dealCode', { params }));
  expect(settled.body).toMatchObject({ state: 'settled', settlement: { valueMinor: 2_700_000, refundMinor: 306_000 } });
  expect(settled.body.events.slice(-3).map(({ title, by }) => [title, by])).toEqual([
    ['Awaits approval', 'The market'],
    ['Settlement approved', 'The market’s desk'],
    ['Settled', 'The market'],
  ]);
  const log = await market.db.query(`select actor_id from audit_log where action = 'deal.approve' and object_id = $1`, [
    deal.code,
  ]);
  expect(log).toEqual([{ actor_id: operator.memberId }]);
});

test('the outbox shows what is still to do; no queue is shown before a worker ran', async () => {
  const outbox = (await operator.call('GET /desk/outbox', { query: { q: 'notice.mail' } })).body;
  expect(outbox.rows.length).toBeGreaterThan(0);
  expect(outbox.rows[0]).toMatchObject({ kind: 'notice.mail', state: 'pending', attempts: 0 });
  expect((await operator.call('GET /desk/jobs')).body).toEqual([]);
});
