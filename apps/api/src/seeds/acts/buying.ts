import { randomUUID } from 'node:crypto';
import type { DateTime } from 'luxon';
import { openPayment } from '../../features/payments/open-payment.ts';
import type { FirmKey } from '../people.ts';
import type { LotPlan } from '../lot-plan.ts';
import type { Stage } from '../stage.ts';
import { payOnPage } from './at-the-processor.ts';
import { list, listingTime } from './selling.ts';

/** Who bids, and up to how many dollars. */
export type BidPlan = readonly [buyer: FirmKey, ceiling: number];

export const bid = ({ bids, people }: Stage, lotCode: string, [buyer, ceiling]: BidPlan) =>
  bids.place({ lotCode, bidderId: people[buyer].id, ceilingMinor: Math.round(ceiling * 100), attempt: randomUUID() });

/** Moments for so many bids between two times: more of them towards the end. */
export function bidTimes(from: DateTime, to: DateTime, count: number): DateTime[] {
  const spanMs = to.toMillis() - from.toMillis();
  return Array.from({ length: count }, (_, index) =>
    from.plus({ milliseconds: spanMs * Math.sqrt((index + 0.6) / (count + 0.2)) }),
  );
}

export interface Deal {
  id: string;
  code: string;
  lotCode: string;
  dueAt: Date;
}

/** The deal of a lot as it stands now. */
export async function dealOf({ world }: Stage, lotCode: string): Promise<Deal> {
  const rows: Deal[] = await world.db.query(
    `select d.id, d.code, l.code as "lotCode", d.due_at as "dueAt" from deals d join lots l on l.id = d.lot_id where l.code = $1`,
    [lotCode],
  );
  if (!rows[0]) throw new Error(`Nobody has bought ${lotCode}`);
  return rows[0];
}

export interface SalePlan {
  seller: FirmKey;
  plan: LotPlan;
  closes: DateTime;
  bids: readonly BidPlan[];
}

/** From the listing to the award at the close, by open bids. */
export async function* sell(
  stage: Stage,
  { seller, plan, closes, bids }: SalePlan,
): AsyncGenerator<DateTime, Deal, void> {
  const listed = listingTime(closes, plan);
  yield listed;
  const lotCode = await list(stage, seller, plan);
  const moments = bidTimes(listed, closes.minus({ hours: 1 }), bids.length);
  for (const [index, one] of bids.entries()) {
    yield moments[index]!;
    await bid(stage, lotCode, one);
  }
  // The alarm of the close has rung by then.
  yield closes.plus({ minutes: 1 });
  return dealOf(stage, lotCode);
}

/** Pays a deal into hold on the processor's page, and hears of it. */
export async function pay(
  stage: Stage,
  { buyer, deal, method = 'pm_card_visa' }: { buyer: FirmKey; deal: Deal; method?: string },
): Promise<void> {
  const { world, people, hear } = stage;
  const { url } = await openPayment(world, { dealCode: deal.code, buyerId: people[buyer].id });
  await payOnPage(world.settings, url, method);
  await hear();
}
