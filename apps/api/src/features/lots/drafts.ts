import { randomUUID } from 'node:crypto';
import type { LotDraft, MyLotView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { copyPhotos, removeFiles, removePhotos } from '../photos/photos.commands.ts';
import { copiedDraft, emptyDraft } from './draft.rules.ts';
import { Lot } from './lot.entity.ts';
import { assertDraft, assertVersion, findOwnLot, toMyLotView, type OwnLot } from './own-lot.ts';

/** Begins an empty draft at the seller's place. */
export const beginDraft = ({ db }: Pick<World, 'db'>, sellerId: string): Promise<MyLotView> =>
  inTransaction(db, async (tx) => {
    const members: { place: string }[] = await tx.query('select place from members where id = $1', [sellerId]);
    return toMyLotView(tx, await insertDraft(tx, sellerId, emptyDraft(members[0]!.place)));
  });

export const readOwnLot = async ({ db }: Pick<World, 'db'>, own: OwnLot): Promise<MyLotView> =>
  toMyLotView(db.manager, await findOwnLot(db.manager, own));

/** Saves a draft over the version it was made from. @throws AppError lot.changed, lot.wrong_state */
export const saveDraft = (
  { db }: Pick<World, 'db'>,
  { version, draft, ...own }: OwnLot & { version: number; draft: LotDraft },
): Promise<MyLotView> =>
  inTransaction(db, async (tx) => {
    const lot = await findOwnLot(tx, own, { lock: true });
    assertDraft(lot);
    await assertVersion(tx, lot, version);
    await tx.update(Lot, { id: lot.id }, { draft, version: version + 1, savedAt: () => 'market_now()' });
    return toMyLotView(tx, await findOwnLot(tx, own));
  });

export async function deleteDraft({ db, files }: Pick<World, 'db' | 'files'>, own: OwnLot): Promise<void> {
  const photoIds = await inTransaction(db, async (tx) => {
    const lot = await findOwnLot(tx, own, { lock: true });
    assertDraft(lot);
    await tx.update(Lot, { id: lot.id }, { state: 'deleted' });
    return removePhotos(tx, { lotId: lot.id });
  });
  for (const photoId of photoIds) await removeFiles(files, photoId);
}

/** Begins a draft from an own lot in any state, with its lines, terms and photos. */
export const copyLot = ({ db, files }: Pick<World, 'db' | 'files'>, own: OwnLot): Promise<MyLotView> =>
  inTransaction(db, async (tx) => {
    const earlier = await findOwnLot(tx, own);
    const lot = await insertDraft(tx, own.sellerId, copiedDraft(earlier.draft, randomUUID));
    await copyPhotos(tx, files, { fromLotId: earlier.id, toLotId: lot.id });
    return toMyLotView(tx, lot);
  });

async function insertDraft(tx: EntityManager, sellerId: string, draft: LotDraft): Promise<Lot> {
  const id = randomUUID();
  await tx.insert(Lot, { id, sellerId, draft });
  return tx.findOneByOrFail(Lot, { id });
}
