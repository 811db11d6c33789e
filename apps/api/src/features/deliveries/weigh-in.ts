import type { DealView, PhotoView, WeighInRequest } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import type { Upload } from '../../platform/routes.ts';
import { inTransaction } from '../../platform/transaction.ts';
import { createWords, massWords } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { dueAfter, lockOwnDeal, moveDeal, type LockedDeal } from '../deals/deal-steps.commands.ts';
import { dealViewOf, ownDeal } from '../deals/deals.reads.ts';
import { lotHeadline } from '../lots/lots.reads.ts';
import { notify } from '../notices/notices.commands.ts';
import { storePhoto } from '../photos/photos.commands.ts';
import { photosOf } from '../photos/photos.reads.ts';
import { WeighIn } from './weigh-in.entity.ts';
import { assertPlausible, netOf } from './weigh-in.rules.ts';

interface OwnStep {
  dealCode: string;
  memberId: string;
}

/**
 * The buyer enters what the scale said. From it the seller has 2 days to countersign and the buyer 5 days to claim.
 * @throws AppError weigh_in.implausible by field, photo.not_found for a photo that is not this deal's
 */
export const enterWeighIn = (
  { db }: Pick<World, 'db'>,
  { dealCode, memberId, ...entry }: OwnStep & WeighInRequest,
): Promise<DealView> =>
  inTransaction(db, async (tx) => {
    const { deal, now } = await lockOwnDeal(tx, { code: dealCode, side: 'buyer', memberId });
    assertInTime(deal, now);
    const lot = await lotHeadline(tx, deal.lotId);
    const countersign = await dueAfter(tx, deal, { kind: 'countersign', from: now });
    const claim = await dueAfter(tx, deal, { kind: 'claim', from: now });
    const netG = netOf(entry);
    await moveDeal(tx, deal, {
      move: 'weigh_in',
      actor: 'buyer',
      actorId: memberId,
      now,
      due: countersign,
      detail: { netG, declaredG: lot.massG },
      patch: { weighedInAt: now },
    });
    assertPlausible(entry, lot.massG);
    await assertPhotosOfDeal(tx, deal.id, entry.photoIds);
    await tx.insert(WeighIn, {
      ...entry,
      dealId: deal.id,
      netG,
      enteredBy: memberId,
      at: now,
      claimEndsAt: claim.at,
      countersignEndsAt: countersign.at,
    });
    await tellWeighedIn(tx, deal, { netG, declaredG: lot.massG, countersignBy: countersign.at });
    return dealViewOf(tx, { code: dealCode, memberId });
  });

/** Late from the moment the time is over, whether or not the clock's own step has run yet. */
function assertInTime({ dueKind, dueAt }: Pick<LockedDeal, 'dueKind' | 'dueAt'>, now: Date): void {
  if (dueKind === 'weigh_in' && dueAt && now >= dueAt)
    throw new AppError('deal.wrong_state', 'The time to weigh in is over: the declared mass stands.');
}

async function assertPhotosOfDeal(tx: EntityManager, dealId: string, photoIds: readonly string[]): Promise<void> {
  const known = new Set((await photosOf(tx, { dealId })).map(({ id }) => id));
  if (!photoIds.every((id) => known.has(id)))
    throw new AppError('photo.not_found', 'One of the photos is not there any more. Add it again.', {
      fields: [{ path: 'photoIds', message: 'Add the photo again.' }],
    });
}

async function tellWeighedIn(
  tx: EntityManager,
  deal: LockedDeal,
  { netG, declaredG, countersignBy }: { netG: number; declaredG: number; countersignBy: Date },
): Promise<void> {
  const { moment } = createWords(await marketTerms(tx));
  await notify(tx, {
    memberId: deal.sellerId,
    kind: 'weighed_in',
    key: `weighed_in:${deal.id}`,
    subject: `${deal.code} is weighed in: ${massWords(netG)} net`,
    text: `You declared ${massWords(declaredG)}. Countersign by ${moment(countersignBy)}; after that the weigh-in stands.`,
    link: `/sell/deals/${deal.code}`,
  });
}

/** Photos for the weigh-in are the buyer's, from the receipt to the weigh-in. */
async function assertMayAddPhoto(tx: EntityManager, { dealCode, memberId }: OwnStep): Promise<{ dealId: string }> {
  const { deal, side } = await ownDeal(tx, { code: dealCode, memberId });
  if (side !== 'buyer') throw new AppError('deal.not_found', 'There is no such deal of yours.');
  if (deal.frozenAt)
    throw new AppError('deal.frozen', 'This deal is frozen. The market’s desk will write to both sides.');
  if (deal.state !== 'received')
    throw new AppError('deal.wrong_state', 'Photos for the weigh-in are added between receipt and weigh-in.');
  return { dealId: deal.id };
}

/** Refuses, before any byte is taken, whoever may not add a photo. */
export const beforeWeighInPhoto = async ({ db }: Pick<World, 'db'>, step: OwnStep): Promise<void> => {
  await assertMayAddPhoto(db.manager, step);
};

export async function addWeighInPhoto(
  world: Pick<World, 'db' | 'files'>,
  { upload, ...step }: OwnStep & { upload: Upload | undefined },
): Promise<PhotoView> {
  if (!upload) throw new AppError('photo.missing', 'Send the photo in the field named photo.');
  const { dealId } = await assertMayAddPhoto(world.db.manager, step);
  const stillAllowed = async (tx: EntityManager): Promise<void> => {
    await assertMayAddPhoto(tx, step);
  };
  return storePhoto(world, { ownerId: step.memberId, dealId, slot: 'on-scale', upload, stillAllowed });
}
