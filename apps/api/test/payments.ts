import type { TestDeal } from './deals.ts';
import { must, weighIn } from './deals.ts';
import type { Market } from './market.ts';
import { deliverAll, type Processor } from './processor.ts';

interface Stage {
  market: Market;
  processor: Processor;
}

/** The buyer opens the payment page; its address. */
export async function openPage(deal: TestDeal): Promise<string> {
  const { body } = await must(
    (await deal.buyer()).call('POST /deals/:dealCode/payment', { params: { dealCode: deal.code } }),
  );
  return body.url;
}

/** The buyer pays on the page, and the market hears of it. */
export async function payOnPage(stage: Stage, deal: TestDeal, method?: string): Promise<void> {
  await stage.processor.pay(await openPage(deal), method);
  await deliverAll(stage);
}

/** From the hold to the settlement; the lot weighs what was declared. Outside effects wait for `market.work()`. */
export async function settle(deal: TestDeal): Promise<void> {
  const params = { dealCode: deal.code };
  const body = { carrier: 'Dunnowick Carriers', trackingCode: 'DC 4471' };
  await must((await deal.seller()).call('POST /deals/:dealCode/dispatch', { params, body }));
  await must((await deal.buyer()).call('POST /deals/:dealCode/receive', { params }));
  await must(weighIn(deal, 12_400));
  await must((await deal.seller()).call('POST /deals/:dealCode/countersign', { params }));
  await must((await deal.buyer()).call('POST /deals/:dealCode/accept', { params }));
}

/** The seller sets the payout account up at the processor, and the market hears of it. */
export async function setUpPayouts(stage: Stage, deal: TestDeal): Promise<string> {
  await must((await deal.seller()).call('POST /my/payout-account/link'));
  const rows: { id: string }[] = await stage.market.db.query(
    'select account_id as id from payout_accounts where member_id = $1',
    [deal.sellerId],
  );
  const accountId = rows[0]!.id;
  await stage.processor.completeAccount(accountId);
  await deliverAll(stage, accountId);
  return accountId;
}

/** What failed is due again at once. */
export const retryNow = ({ db }: Market): Promise<unknown> =>
  db.query(
    `with o as (update outbox set next_at = clock_timestamp() where state = 'pending') update inbox set next_at = clock_timestamp() where processed_at is null`,
  );
