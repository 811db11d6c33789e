import type { DealView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import { inTransaction } from '../../platform/transaction.ts';
import { createWords } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { dueAfter, lockOwnDeal, moveDeal, type LockedDeal } from '../deals/deal-steps.commands.ts';
import { dealViewOf } from '../deals/deals.reads.ts';
import { lotHeadline, type LotHeadline } from '../lots/lots.reads.ts';
import { notify } from '../notices/notices.commands.ts';

interface OwnStep {
  dealCode: string;
  memberId: string;
}

function assertWay(lot: LotHeadline, way: LotHeadline['deliveryWay']): void {
  if (lot.deliveryWay !== way)
    throw new AppError(
      'deal.wrong_state',
      lot.deliveryWay === 'collection'
        ? 'This lot is collected: say when it is ready.'
        : 'This lot is sent: enter carrier and tracking code.',
    );
}

/** The seller gave the lot to a carrier; the buyer has 21 days to record the receipt. */
export const dispatchDeal = (
  { db }: Pick<World, 'db'>,
  { dealCode, memberId, carrier, trackingCode }: OwnStep & { carrier: string; trackingCode: string },
): Promise<DealView> =>
  inTransaction(db, async (tx) => {
    const { deal, now } = await lockOwnDeal(tx, { code: dealCode, side: 'seller', memberId });
    const lot = await lotHeadline(tx, deal.lotId);
    assertWay(lot, 'seller-sends');
    await moveDeal(tx, deal, {
      move: 'dispatch',
      actor: 'seller',
      actorId: memberId,
      now,
      due: await dueAfter(tx, deal, { kind: 'receipt', from: now }),
      detail: { carrier, trackingCode },
      patch: { carrier, trackingCode, dispatchedAt: now },
    });
    await tell(tx, deal, 'buyer', {
      fact: 'dispatched',
      subject: `${deal.code}: ${lot.code} is on its way`,
      text: `${carrier}, tracking code ${trackingCode}. Record the receipt when it arrives, then weigh in within 3 days.`,
    });
    return dealViewOf(tx, { code: dealCode, memberId });
  });

/** The seller has the lot ready for collection; the buyer has 10 days to collect it. */
export const markReady = ({ db }: Pick<World, 'db'>, { dealCode, memberId }: OwnStep): Promise<DealView> =>
  inTransaction(db, async (tx) => {
    const { deal, now } = await lockOwnDeal(tx, { code: dealCode, side: 'seller', memberId });
    const lot = await lotHeadline(tx, deal.lotId);
    assertWay(lot, 'collection');
    await moveDeal(tx, deal, {
      move: 'mark_ready',
      actor: 'seller',
      actorId: memberId,
      now,
      due: await dueAfter(tx, deal, { kind: 'collect', from: now }),
      patch: { dispatchedAt: now },
    });
    await tell(tx, deal, 'buyer', {
      fact: 'ready',
      subject: `${deal.code}: ${lot.code} is ready for collection`,
      text: `In ${lot.place}${lot.deliveryHours ? `, ${lot.deliveryHours}` : ''}. Record the receipt at the hand-over: the risk passes with it.`,
    });
    return dealViewOf(tx, { code: dealCode, memberId });
  });

/** The buyer has the lot; risk has passed, and 3 days run for the weigh-in. */
export const receiveDeal = ({ db }: Pick<World, 'db'>, { dealCode, memberId }: OwnStep): Promise<DealView> =>
  inTransaction(db, async (tx) => {
    const { deal, now } = await lockOwnDeal(tx, { code: dealCode, side: 'buyer', memberId });
    await moveDeal(tx, deal, {
      move: 'receive',
      actor: 'buyer',
      actorId: memberId,
      now,
      due: await dueAfter(tx, deal, { kind: 'weigh_in', from: now }),
      patch: { receivedAt: now },
    });
    const { moment } = createWords(await marketTerms(tx));
    await tell(tx, deal, 'seller', {
      fact: 'received',
      subject: `${deal.code} has arrived`,
      text: `The buyer weighs in by ${moment(deal.dueAt!)}; if not, the declared mass stands.`,
    });
    return dealViewOf(tx, { code: dealCode, memberId });
  });

const tell = (
  tx: EntityManager,
  deal: LockedDeal,
  side: 'seller' | 'buyer',
  { fact, subject, text }: { fact: string; subject: string; text: string },
): Promise<void> =>
  notify(tx, {
    memberId: side === 'seller' ? deal.sellerId : deal.buyerId,
    kind: fact,
    key: `${fact}:${deal.id}`,
    subject,
    text,
    link: side === 'seller' ? `/sell/deals/${deal.code}` : `/deals/${deal.code}`,
  });
