import { randomUUID } from 'node:crypto';
import { openDeal, recordHold } from '../src/features/deals/deals.commands.ts';
import { postTransfer } from '../src/features/ledger/ledger.commands.ts';
import { accountCode } from '../src/features/ledger/ledger.reads.ts';
import { addMember } from './factories.ts';
import type { Caller, Market } from './market.ts';
import { addOpenLot } from './open-lot.ts';
import { photoForm, plainPhoto } from './photo-files.ts';

export interface TestDeal {
  id: string;
  code: string;
  lotId: string;
  sellerId: string;
  buyerId: string;
  /** Signed in anew at each call: sessions end while tests move the clock by days. */
  seller(): Promise<Caller>;
  buyer(): Promise<Caller>;
}

interface DealOptions {
  priceMinor?: number;
  freightMinor?: number;
  /** A lot that is listed already; a plain one of 12.4 kg, sent by the seller, unless given. */
  lot?: { id: string; sellerId: string };
}

/** An award as the close of a lot leaves it: 900.00 and 18.00 freight, unless told otherwise. */
export async function addDeal(market: Market, options: DealOptions = {}): Promise<TestDeal> {
  const { priceMinor = 90_000, freightMinor = 1800 } = options;
  const sellerId =
    options.lot?.sellerId ??
    (await addMember(market, { roles: ['seller'], name: 'Sallowby Repairs', place: 'Sallowby' }));
  const buyerId = await addMember(market, { name: 'Vennaby Recovery', place: 'Vennaby' });
  const lotId = options.lot?.id ?? (await addOpenLot(market, { sellerId })).id;
  await market.db.query(`update lots set state = 'awarded' where id = $1`, [lotId]);
  const { id, code } = await market.db.transaction((tx) =>
    openDeal(tx, { lotId, sellerId, buyerId, priceMinor, freightMinor }),
  );
  return { id, code, lotId, sellerId, buyerId, seller: () => market.as(sellerId), buyer: () => market.as(buyerId) };
}

/** Posts the buyer's payment as the processor's event does, and tells the deal. */
export const payIn = (market: Market, { id, code }: Pick<TestDeal, 'id' | 'code'>) =>
  market.db.transaction(async (tx) => {
    const rows: { minor: number }[] = await tx.query('select hold_minor::int as minor from deals where id = $1', [id]);
    const amountMinor = rows[0]!.minor;
    await tx.query(
      `insert into payments (id, deal_id, attempt, amount_minor, state, session_id, intent_id, charge_id, succeeded_at)
       values ($1, $2, 1, $3, 'succeeded', $4, $4, $4, market_now())`,
      [randomUUID(), id, amountMinor, `test-${code}`],
    );
    await postTransfer(tx, {
      kind: 'pay in',
      dealId: id,
      key: `txn:test:${id}`,
      eventAt: new Date(),
      entries: [
        { account: accountCode.hold(code), amountMinor: -amountMinor },
        { account: accountCode.processor, amountMinor },
      ],
    });
    return recordHold(tx, { dealId: id });
  });

/** From the award to the receipt. */
export async function bringToReceipt(market: Market, deal: TestDeal): Promise<void> {
  await payIn(market, deal);
  const params = { dealCode: deal.code };
  const body = { carrier: 'Dunnowick Carriers', trackingCode: 'DC 4471' };
  await must((await deal.seller()).call('POST /deals/:dealCode/dispatch', { params, body }));
  await must((await deal.buyer()).call('POST /deals/:dealCode/receive', { params }));
}

/** Weighs the lot in at this net mass, with a photo, on a scale of 10 g. */
export async function weighIn(deal: TestDeal, netG: number) {
  const buyer = await deal.buyer();
  const params = { dealCode: deal.code };
  const photo = await must(
    buyer.call('POST /deals/:dealCode/photos', { params, form: photoForm(await plainPhoto()) }),
    201,
  );
  return buyer.call('POST /deals/:dealCode/weigh-in', {
    params,
    body: {
      grossG: netG + 400,
      tareG: 400,
      scaleResolutionG: 10,
      scaleSerial: 'B-204',
      note: '',
      photoIds: [photo.body.id],
    },
  });
}

/** Moves the market's clock to eleven seconds past the end of the deal's running deadline. */
export async function passDeadline(market: Market, { id }: Pick<TestDeal, 'id'>): Promise<void> {
  await market.owner.query(
    `update market_clock set shift = shift + (select due_at from deals where id = $1) - market_now() + interval '11 seconds'`,
    [id],
  );
}

/** The answer of a call that the test takes for granted. */
export async function must<T extends { status: number; problem: unknown }>(
  answering: Promise<T>,
  status = 200,
): Promise<T> {
  const answer = await answering;
  if (answer.status !== status) throw new Error(`${answer.status}: ${JSON.stringify(answer.problem)}`);
  return answer;
}
