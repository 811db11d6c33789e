import type { LotView, PublicLine } from '@lydite/contracts';
import { findClass, type Catalogue } from '@lydite/valuation';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../../platform/actor.ts';
import { marketNow } from '../../platform/clock.ts';
import { createWords } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { leastNextMinor, publicBidsOf, roomForLot, standingOf } from '../bids/bids.reads.ts';
import { catalogueVersion } from '../catalogue/catalogue.reads.ts';
import { dealViewOf } from '../deals/deals.reads.ts';
import { estimateOf } from '../estimates/estimates.reads.ts';
import { photosOf } from '../photos/photos.reads.ts';
import { priceInForce, staleRuleOf, toReferencePrice } from '../prices/prices.reads.ts';
import { lotChain } from './lot-chain.presenter.ts';
import { findListedLot, ownDealCode, sellerRecord } from './lot-view.queries.ts';
import { LotLine, type Lot } from './lot.entity.ts';

/** A lot as anybody may see it, with the caller's own standing. Ceilings and the reserve's amount are not in it. */
export async function readLot(
  { db, settings }: Pick<World, 'db' | 'settings'>,
  { lotCode, actor }: { lotCode: string; actor: Actor | null },
): Promise<LotView> {
  const tx = db.manager;
  const lot = await findListedLot(tx, lotCode);
  const now = await marketNow(tx);
  const estimate = (await estimateOf(tx, lot.id))!.result;
  const catalogue = (await catalogueVersion(tx, estimate.catalogueVersion))!;
  const dealCode = actor && (await ownDealCode(tx, { lotId: lot.id, memberId: actor.id }));
  const words = createWords({ zone: settings.MARKET_ZONE, currency: settings.MARKET_CURRENCY });
  return {
    ...publicFields(lot),
    lines: await publicLines(tx, lot.id, catalogue),
    photos: await photosOf(tx, { lotId: lot.id }),
    estimate,
    price: toReferencePrice((await priceInForce(tx, staleRuleOf(settings)))!),
    leastNextMinor: takesBids(lot, now)
      ? leastNextMinor({ ...lot, startMinor: lot.startMinor! }, actor?.id ?? null)
      : null,
    bids: await publicBidsOf(tx, { lotId: lot.id, memberId: actor?.id ?? null }),
    sellerRecord: await sellerRecord(tx, lot.sellerId),
    chain: lotChain({ lot, now, words, dealSteps: actor && dealCode ? await stepsOf(tx, dealCode, actor.id) : null }),
    you: actor && { ...(await ownView(tx, lot, actor)), dealCode },
  };
}

const takesBids = (lot: Lot, now: Date): boolean =>
  lot.state === 'open' && lot.form === 'open-bids' && now < lot.closesAt!;

/** What the lot itself says, and how its reserve stands: as a word, never as an amount. */
const publicFields = (lot: Lot) => ({
  code: lot.code,
  state: lot.state as LotView['state'],
  title: lot.title!,
  description: lot.description!,
  form: lot.form!,
  basis: 'outright' as const,
  place: lot.place!,
  country: lot.country!,
  delivery: { way: lot.deliveryWay!, freightMinor: lot.freightMinor!, hours: lot.deliveryHours! },
  massG: lot.massG!,
  pieces: lot.pieces,
  listedAt: lot.listedAt!.toISOString(),
  closesAt: lot.closesAt!.toISOString(),
  latestClosesAt: lot.latestClosesAt!.toISOString(),
  priceMinor: lot.form === 'asking-price' ? lot.askingMinor : lot.priceMinor,
  startMinor: lot.startMinor,
  bidders: lot.bidders,
  reserve: reserveOf(lot),
});

function reserveOf({ reserveMinor, priceMinor }: Lot): LotView['reserve'] {
  if (reserveMinor === null) return 'none';
  return (priceMinor ?? 0) >= reserveMinor ? 'reached' : 'not-reached';
}

async function publicLines(tx: EntityManager, lotId: string, catalogue: Catalogue): Promise<PublicLine[]> {
  const lines = await tx.find(LotLine, { where: { lotId }, order: { position: 'ASC' } });
  return lines.map(({ input: { massText: _text, massUnit: _unit, ...line }, classCode }) => {
    const { name, hazards } = findClass(catalogue, classCode);
    return { ...line, className: name, hazards };
  });
}

/** The steps of the deal after the award, which the sale's own step already tells. */
async function stepsOf(tx: EntityManager, code: string, memberId: string): Promise<LotView['chain']> {
  const { chain } = await dealViewOf(tx, { code, memberId });
  return chain.filter(({ key }) => key !== 'award');
}

async function ownView(tx: EntityManager, lot: Lot, actor: Actor) {
  const isSeller = lot.sellerId === actor.id;
  const standing = (await standingOf(tx, { lotIds: [lot.id], memberId: actor.id })).get(lot.id);
  const mayBid = actor.roles.includes('buyer') && !isSeller;
  return {
    seller: isSeller,
    standing: standing?.standing ?? null,
    ceilingMinor: standing?.ceilingMinor ?? null,
    roomMinor: mayBid ? await roomForLot(tx, { memberId: actor.id, lotId: lot.id }) : null,
  };
}
