import { randomUUID } from 'node:crypto';
import type { MyLotView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../../platform/actor.ts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { setAlarm } from '../../platform/jobs.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { catalogueInForce } from '../catalogue/catalogue.reads.ts';
import { freezeEstimate } from '../estimates/estimates.commands.ts';
import { photosOf } from '../photos/photos.reads.ts';
import { priceInForce } from '../prices/prices.reads.ts';
import { missingOf } from './draft.rules.ts';
import { listedFields, listedLines, reviewNote } from './listing.rules.ts';
import { Lot, LotLine } from './lot.entity.ts';
import { assertDraft, assertVersion, findOwnLot, toMyLotView } from './own-lot.ts';

const listingsPerHour = 10;

interface ListOrder {
  lotCode: string;
  /** The version the seller saw: what opens to the market is what was read. */
  version: number;
  actor: Actor;
}

/**
 * Opens a draft to the market: what it says is fixed, its estimate frozen, its close set.
 * @throws AppError lot.not_found, lot.wrong_state, lot.changed, lot.incomplete, request.too_many, price.unavailable
 */
export const listLot = (world: Pick<World, 'db' | 'settings'>, order: ListOrder): Promise<MyLotView> =>
  inTransaction(world.db, async (tx) => {
    const own = { lotCode: order.lotCode, sellerId: order.actor.id };
    const lot = await findOwnLot(tx, own, { lock: true });
    assertDraft(lot);
    await assertVersion(tx, lot, order.version);
    await assertNotTooMany(tx, world, lot.sellerId);
    await open(tx, world, lot);
    await audit(tx, order.actor, { action: 'lot.list', objectKind: 'lot', objectId: lot.id });
    return toMyLotView(tx, await findOwnLot(tx, own));
  });

async function open(tx: EntityManager, { settings }: Pick<World, 'settings'>, lot: Lot): Promise<void> {
  const { id, draft } = lot;
  const catalogue = await catalogueInForce(tx);
  const photos = await photosOf(tx, { lotId: id });
  assertComplete(
    missingOf({ draft, photoCount: photos.length, classCodes: new Set(catalogue.classes.map((one) => one.code)) }),
  );
  const price = await priceInForce(tx);
  if (!price)
    throw new AppError('price.unavailable', 'There is no gold price yet to list against. Try again in a few minutes.');
  const lines = listedLines(draft.lines, { classes: catalogue.classes, newId: randomUUID });
  const estimate = await freezeEstimate(tx, { lotId: id, lines, catalogue, referencePriceId: price.id });
  const times = await timesOf(tx, { days: draft.sale.days, zone: settings.MARKET_ZONE });
  await tx.update(
    Lot,
    { id },
    {
      ...listedFields(draft),
      ...times,
      state: 'open',
      coverPhotoId: photos[0]!.id,
      reviewReason: reviewNote(draft, estimate),
    },
  );
  for (const [position, input] of lines.entries()) {
    const { label, classCode, massG, pieces } = input;
    await tx.insert(LotLine, { id: input.id, lotId: id, position, label, classCode, massG, pieces, input });
  }
  await setAlarm(tx, { job: 'lot.close', objectId: id, at: times.closesAt });
}

function assertComplete(missing: MyLotView['missing']): void {
  if (missing.length === 0) return;
  throw new AppError('lot.incomplete', missing.map(({ message }) => message).join(' '), {
    fields: missing.map(({ path, message }) => ({ path, message })),
    context: { missing },
  });
}

interface Times {
  listedAt: Date;
  firstClosesAt: Date;
  closesAt: Date;
  latestClosesAt: Date;
}

/** Opens now, closes on the next full hour of the market's zone after so many days, two hours later at the latest. */
async function timesOf(tx: EntityManager, { days, zone }: { days: number; zone: string }): Promise<Times> {
  const rows: { listedAt: Date; closesAt: Date }[] = await tx.query(
    `select now as "listedAt",
            date_trunc('hour', (now at time zone $2) + make_interval(days => $1) + interval '1 hour' - interval '1 microsecond') at time zone $2 as "closesAt"
       from (select market_now() as now) clock`,
    [days, zone],
  );
  const { listedAt, closesAt } = rows[0]!;
  return { listedAt, firstClosesAt: closesAt, closesAt, latestClosesAt: new Date(closesAt.getTime() + 2 * 3_600_000) };
}

/** Locks the seller, so that lots listed at once are counted one after the other. */
async function assertNotTooMany(
  tx: EntityManager,
  { settings }: Pick<World, 'settings'>,
  sellerId: string,
): Promise<void> {
  if (!settings.LIMITS) return;
  await tx.query('select 1 from members where id = $1 for no key update', [sellerId]);
  const rows: { n: number }[] = await tx.query(
    `select count(*)::int as n from lots where seller_id = $1 and listed_at > market_now() - interval '1 hour'`,
    [sellerId],
  );
  if (rows[0]!.n >= listingsPerHour)
    throw new AppError(
      'request.too_many',
      `You have listed ${listingsPerHour} lots within an hour. List the next one later.`,
      {
        context: { retryAfterS: 3600 },
      },
    );
}
