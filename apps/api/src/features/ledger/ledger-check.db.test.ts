import { afterAll, beforeAll, expect, test } from 'vitest';
import { addDeal } from '../../../test/deals.ts';
import { addMember } from '../../../test/factories.ts';
import { payOnPage } from '../../../test/payments.ts';
import { openMarketWithProcessor } from '../../../test/processor.ts';
import { createWords } from '../../platform/words.ts';
import { checkLedger } from './ledger-check.ts';
import { toReportText } from './ledger-report.presenter.ts';
import { postTransfer } from './ledger.commands.ts';
import { accountCode } from './ledger.reads.ts';

let stage: Awaited<ReturnType<typeof openMarketWithProcessor>>;
beforeAll(async () => {
  stage = await openMarketWithProcessor();
});
afterAll(() => stage.close());

const offChecks = async () =>
  (await checkLedger(stage.market.world)).checks.filter(({ ok }) => !ok).map(({ name }) => name);

test('an operator sees clean books with their accounts; nobody else may', async () => {
  const { market } = stage;
  await payOnPage(stage, await addDeal(market));
  const operator = await market.as(await addMember(market, { roles: ['operator'] }));
  const { body } = await operator.call('GET /desk/ledger');
  expect(body.checks.filter(({ ok }) => !ok)).toEqual([]);
  expect(body.balanced).toBe(true);
  // 936.00 less the processor's 2.9 % and 0.30.
  expect(body.accounts).toContainEqual({ code: 'asset.processor', side: 'debit', balanceMinor: 93_600 - 2744 });
  expect(body.processor).toEqual({ availableMinor: 0, pendingMinor: 93_600 - 2744 });
  const buyer = await market.as(await addMember(market));
  expect((await buyer.call('GET /desk/ledger')).status).toBe(403);
  const text = toReportText(body, createWords({ zone: 'Europe/Vienna', currency: 'USD' }));
  expect(text).toContain('ok   The processor holds what the books say');
  expect(text.endsWith('The ledger balances.')).toBe(true);
});

test('money that moved at the processor and is not posted is found, once it is too old to be on its way', async () => {
  const { market, processor } = stage;
  await processor.client.paymentIntents.create({
    amount: 5000,
    currency: 'usd',
    payment_method: 'pm_card_visa',
    confirm: true,
  });
  expect(await offChecks()).toEqual([]);
  const report = await checkLedger(market.world, { patienceMs: 0 });
  expect(report.balanced).toBe(false);
  expect(report.checks.filter(({ ok }) => !ok).map(({ name }) => name)).toEqual([
    'The processor holds what the books say',
    'Every movement at the processor is posted once',
  ]);
});

test('a posting that the processor does not know, and a hold without its deal, are found', async () => {
  await stage.market.db.transaction((tx) =>
    postTransfer(tx, {
      kind: 'test',
      dealId: null,
      key: 'txn:of-nobody',
      eventAt: new Date(),
      entries: [
        { account: accountCode.processor, amountMinor: 700 },
        { account: accountCode.hold('D-9'), amountMinor: -700 },
      ],
    }),
  );
  expect(await offChecks()).toEqual([
    'Every open hold has its deal, with what the buyer paid in',
    'The processor holds what the books say',
    'Every posting on the processor’s account is known there',
  ]);
});

test('without an answer of the processor the books are not proved', async () => {
  await stage.processor.fault({ kind: 'unavailable', times: 20 });
  const report = await checkLedger(stage.market.world);
  expect(report.processor).toBeNull();
  expect(report.checks.at(-1)).toEqual({
    name: 'The payment processor answers',
    ok: false,
    detail: 'It does not answer.',
  });
  await stage.processor.clearFaults();
});
