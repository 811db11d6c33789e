import type { DealState, DealView } from '@lydite/contracts';
import { In, type EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { marketNow } from '../../platform/clock.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import { createWords } from '../../platform/words.ts';
import { weighInOf } from '../deliveries/deliveries.reads.ts';
import { lotHeadline } from '../lots/lots.reads.ts';
import { paymentStanding } from '../payments/payments.reads.ts';
import { photosOf } from '../photos/photos.reads.ts';
import { holdOf, settlementOf } from '../settlements/settlements.reads.ts';
import { ratesFor, type Award } from './award-rates.ts';
import { toDeskEvent } from './deal-events.presenter.ts';
import { toDealView } from './deal-view.presenter.ts';
import { Claim, Deal, DealEvent } from './deal.entity.ts';
import type { Side } from './deals.rules.ts';

/** What a buyer would pay into the hold if the lot were awarded to them now, at the rates in force. */
export const awardedHold = async (tx: EntityManager, award: Award): Promise<number> =>
  holdOf({ ...award, ...(await ratesFor(tx, award)) });

export interface DealParties {
  id: string;
  code: string;
  state: DealState;
  lotId: string;
  sellerId: string;
  buyerId: string;
  holdMinor: number;
  frozen: boolean;
}

/** Who deals with whom, and where the deal stands; null for no deal. */
export async function dealParties(
  tx: EntityManager,
  by: { id: string } | { code: string },
): Promise<DealParties | null> {
  const deal = await tx.findOneBy(Deal, by);
  if (!deal) return null;
  const { id, code, state, lotId, sellerId, buyerId, holdMinor } = deal;
  return { id, code, state, lotId, sellerId, buyerId, holdMinor, frozen: deal.frozenAt !== null };
}

/** The member's side of a deal. @throws AppError deal.not_found for no deal, or somebody else's */
export async function ownDeal(
  tx: EntityManager,
  { code, memberId }: { code: string; memberId: string },
): Promise<{ deal: Deal; side: Side }> {
  const deal = await tx.findOneBy(Deal, [
    { code, sellerId: memberId },
    { code, buyerId: memberId },
  ]);
  if (!deal) throw new AppError('deal.not_found', 'There is no such deal of yours.');
  return { deal, side: deal.sellerId === memberId ? 'seller' : 'buyer' };
}

/** A deal as one of its sides sees it. @throws AppError deal.not_found */
export async function dealViewOf(
  tx: EntityManager,
  { code, memberId }: { code: string; memberId: string },
): Promise<DealView> {
  const { deal, side } = await ownDeal(tx, { code, memberId });
  const lot = await lotHeadline(tx, deal.lotId);
  const weighIn = await weighInOf(tx, { dealId: deal.id, declaredG: lot.massG, priceMinor: deal.priceMinor });
  return toDealView({
    deal,
    side,
    lot,
    weighIn,
    weighInPhotos: weighIn ? await photosOf(tx, { ids: weighIn.photoIds }) : [],
    claim: await tx.findOneBy(Claim, { dealId: deal.id }),
    settlement: await settlementOf(tx, deal.id),
    payment: await paymentStanding(tx, deal.id),
    counterparty: wasHeld(deal) ? await nameOf(tx, side === 'seller' ? deal.buyerId : deal.sellerId) : null,
    events: await tx.find(DealEvent, { where: { dealId: deal.id }, order: { id: 'ASC' } }),
    now: await marketNow(tx),
    words: createWords(await marketTerms(tx)),
  });
}

/** The deal took the payment: one that came after its end introduces nobody. */
const wasHeld = ({ paidAt, endedAt }: Pick<Deal, 'paidAt' | 'endedAt'>): boolean =>
  paidAt !== null && (endedAt === null || paidAt < endedAt);

/** Name and place of a member, for the other side of a deal that is held. */
export async function nameOf(tx: EntityManager, memberId: string): Promise<{ name: string; place: string }> {
  const rows: { name: string; place: string }[] = await tx.query('select name, place from members where id = $1', [
    memberId,
  ]);
  return rows[0]!;
}

/** What happened in these deals, oldest first, as the desk reads it. */
export async function timelinesOf(
  tx: EntityManager,
  dealIds: readonly string[],
): Promise<Map<string, { at: string; by: string; title: string }[]>> {
  const events = await tx.find(DealEvent, { where: { dealId: In([...dealIds]) }, order: { id: 'ASC' } });
  return new Map(dealIds.map((id) => [id, events.filter((event) => event.dealId === id).map(toDeskEvent)]));
}
