import type { MyLotView } from '@lydite/contracts';
import { Not, type EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { catalogueInForce } from '../catalogue/catalogue.reads.ts';
import { photosOf } from '../photos/photos.reads.ts';
import { missingOf } from './draft.rules.ts';
import { Lot } from './lot.entity.ts';

export interface OwnLot {
  lotCode: string;
  sellerId: string;
}

/**
 * A lot by its code and its owner: somebody else's is not found, as if it did not exist.
 * @param options lock: until the end of the transaction, so that saving, listing and bidding come one after the other
 * @throws AppError lot.not_found
 */
export async function findOwnLot(
  tx: EntityManager,
  { lotCode, sellerId }: OwnLot,
  { lock = false } = {},
): Promise<Lot> {
  const lot = await tx.findOne(Lot, {
    where: { code: lotCode, sellerId, state: Not('deleted') },
    ...(lock ? { lock: { mode: 'pessimistic_write' } } : {}),
  });
  if (!lot) throw new AppError('lot.not_found', 'You have no such lot.');
  return lot;
}

/** @throws AppError lot.wrong_state once the lot is listed */
export function assertDraft(lot: Lot): void {
  if (lot.state !== 'draft')
    throw new AppError(
      'lot.wrong_state',
      'This lot is listed, and a listed lot does not change. Copy it to a new draft to change something.',
    );
}

/** @throws AppError lot.changed with the newest version when another tab or device saved first */
export async function assertVersion(tx: EntityManager, lot: Lot, version: number): Promise<void> {
  if (lot.version === version) return;
  throw new AppError('lot.changed', 'This draft was saved elsewhere meanwhile. Nothing was overwritten.', {
    context: { current: await toMyLotView(tx, lot) },
  });
}

/** An own lot with its photos and with what it still lacks; its reserve is shown to nobody else. */
export async function toMyLotView(tx: EntityManager, lot: Lot): Promise<MyLotView> {
  const photos = await photosOf(tx, { lotId: lot.id });
  const isDraft = lot.state === 'draft';
  return {
    code: lot.code,
    state: lot.state as MyLotView['state'],
    version: lot.version,
    savedAt: lot.savedAt.toISOString(),
    draft: lot.draft,
    photos,
    missing: isDraft ? missingOf({ draft: lot.draft, photoCount: photos.length, ...(await knownClasses(tx)) }) : [],
    listedAt: lot.listedAt?.toISOString() ?? null,
    closesAt: lot.closesAt?.toISOString() ?? null,
    priceMinor: lot.form === 'asking-price' ? lot.askingMinor : lot.priceMinor,
    bidders: lot.bidders,
    reserveReached: lot.reserveMinor === null ? null : (lot.priceMinor ?? 0) >= lot.reserveMinor,
    dealCode: await liveDealCode(tx, lot.id),
  };
}

async function knownClasses(tx: EntityManager): Promise<{ classCodes: ReadonlySet<string> }> {
  const catalogue = await catalogueInForce(tx);
  return { classCodes: new Set(catalogue.classes.map(({ code }) => code)) };
}

async function liveDealCode(tx: EntityManager, lotId: string): Promise<string | null> {
  const rows: { code: string }[] = await tx.query(`select code from deals where lot_id = $1 and state <> 'cancelled'`, [
    lotId,
  ]);
  return rows[0]?.code ?? null;
}
