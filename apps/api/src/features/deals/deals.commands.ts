import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { marketNow } from '../../platform/clock.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import { createWords } from '../../platform/words.ts';
import { lotHeadline } from '../lots/lots.reads.ts';
import { notify } from '../notices/notices.commands.ts';
import { returnHold } from '../payments/payments.commands.ts';
import { holdOf } from '../settlements/settlements.reads.ts';
import { ratesFor, type Award } from './award-rates.ts';
import { addEvent, dueAfter, lockDeal, moveDeal, setAlarms, type LockedDeal } from './deal-steps.commands.ts';
import { Deal } from './deal.entity.ts';

/**
 * Opens the deal of an award inside the transaction that makes it: rates and hold are frozen, the pay-by time runs, both
 * sides are told. The lot must be locked by the caller.
 */
export async function openDeal(
  tx: EntityManager,
  award: Award & { lotId: string },
): Promise<{ id: string; code: string }> {
  const now = await marketNow(tx);
  const rates = await ratesFor(tx, award);
  const due = await dueAfter(tx, { paidAt: null }, { kind: 'pay', from: now });
  const terms = { ...award, ...rates };
  const id = randomUUID();
  await tx.insert(Deal, {
    id,
    ...terms,
    holdMinor: holdOf(terms),
    dueKind: due.kind,
    dueFrom: due.from,
    dueAt: due.at,
    awardedAt: now,
    updatedAt: now,
  });
  const deal = await tx.findOneByOrFail(Deal, { id });
  await addEvent(tx, {
    dealId: id,
    at: now,
    actor: 'market',
    actorId: null,
    kind: 'award',
    detail: { priceMinor: award.priceMinor },
  });
  await setAlarms(tx, id, due, now);
  await tellAwarded(tx, deal);
  return { id, code: deal.code };
}

async function tellAwarded(tx: EntityManager, deal: LockedDeal): Promise<void> {
  const { money, moment } = createWords(await marketTerms(tx));
  const lot = await lotHeadline(tx, deal.lotId);
  await notify(tx, {
    memberId: deal.buyerId,
    kind: 'awarded',
    key: `awarded:${deal.id}:buyer`,
    subject: `${lot.code}, ${lot.title}, is yours: pay ${money(deal.holdMinor)} into hold`,
    text: `You won at ${money(deal.priceMinor)}. With freight and fee ${money(deal.holdMinor)} is due into hold by ${moment(deal.dueAt!)}. If it is not paid by then, the award lapses.`,
    link: `/deals/${deal.code}`,
  });
  await notify(tx, {
    memberId: deal.sellerId,
    kind: 'awarded',
    key: `awarded:${deal.id}:seller`,
    subject: `${lot.code}, ${lot.title}, is awarded at ${money(deal.priceMinor)}`,
    text: `The buyer has until ${moment(deal.dueAt!)} to pay into hold. Keep the lot as it is; we write when the money is held.`,
    link: `/sell/deals/${deal.code}`,
  });
}

/**
 * The payment of a deal succeeded and is posted to the deal's hold account: the deal is held. On a deal that has ended meanwhile
 * all of it goes back at once. The same payment told twice changes nothing.
 */
export async function recordHold(
  tx: EntityManager,
  { dealId }: { dealId: string },
): Promise<'held' | 'refunded' | 'known'> {
  const { deal, now } = await lockDeal(tx, { id: dealId });
  if (deal.paidAt) return 'known';
  if (deal.state === 'cancelled') {
    await tx.update(Deal, { id: dealId }, { paidAt: now, updatedAt: now });
    await returnHold(tx, deal, 'paid after the deal had ended');
    await addEvent(tx, { dealId, at: now, actor: 'market', actorId: null, kind: 'paid_too_late', detail: {} });
    return 'refunded';
  }
  const due = await dueAfter(tx, { paidAt: now }, { kind: 'dispatch', from: now });
  await moveDeal(tx, deal, {
    move: 'hold',
    actor: 'market',
    now,
    due,
    detail: { holdMinor: deal.holdMinor },
    patch: { paidAt: now },
  });
  await tellHeld(tx, deal);
  return 'held';
}

async function tellHeld(tx: EntityManager, deal: LockedDeal): Promise<void> {
  const { money, moment } = createWords(await marketTerms(tx));
  const lot = await lotHeadline(tx, deal.lotId);
  const by = moment(deal.dueAt!);
  await notify(tx, {
    memberId: deal.sellerId,
    kind: 'paid',
    key: `paid:${deal.id}:seller`,
    subject: `${deal.code} is paid into hold: hand ${lot.code} over`,
    text:
      lot.deliveryWay === 'collection'
        ? `${money(deal.holdMinor)} is held. Have the lot ready for collection by ${by} and say so on the deal’s page.`
        : `${money(deal.holdMinor)} is held. Send the lot by ${by}, with the packing slip, and enter carrier and tracking code.`,
    link: `/sell/deals/${deal.code}`,
  });
  await notify(tx, {
    memberId: deal.buyerId,
    kind: 'paid',
    key: `paid:${deal.id}:buyer`,
    subject: `${deal.code}: your ${money(deal.holdMinor)} is held`,
    text: `The seller has until ${by} to hand the lot over. If that passes you may cancel and have everything back.`,
    link: `/deals/${deal.code}`,
  });
}

/**
 * A bank debit is on its way (`processing`: the pay-by time stands still) or has failed (the clock goes on with what was
 * left). A declined card never stops the clock and needs no call.
 */
export async function recordPaymentState(
  tx: EntityManager,
  { dealId, state }: { dealId: string; state: 'processing' | 'failed' },
): Promise<void> {
  const { deal, now } = await lockDeal(tx, { id: dealId });
  if (deal.state !== 'awaiting_payment' || !deal.dueAt) return;
  if (state === 'processing') {
    if (!deal.duePausedAt) await tx.update(Deal, { id: dealId }, { duePausedAt: now, updatedAt: now });
    return;
  }
  if (!deal.duePausedAt) return;
  const dueAt = new Date(deal.dueAt.getTime() + (now.getTime() - deal.duePausedAt.getTime()));
  await tx.update(Deal, { id: dealId }, { dueAt, duePausedAt: null, updatedAt: now });
  await setAlarms(tx, dealId, { kind: 'pay', from: deal.dueFrom!, at: dueAt }, now);
}
