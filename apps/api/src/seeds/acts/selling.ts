import type { DateTime } from 'luxon';
import { beginDraft, saveDraft } from '../../features/lots/drafts.ts';
import { listLot } from '../../features/lots/list-lot.ts';
import { actorOf, firms, type FirmKey } from '../people.ts';
import { openAccountLink } from '../../features/payouts/payout-account.ts';
import { toDraft, type LotPlan } from '../lot-plan.ts';
import type { Stage } from '../stage.ts';
import { setUpOnPage } from './at-the-processor.ts';

export interface Draft {
  lotCode: string;
  version: number;
}

/** Describes a lot and adds its photos, as the task list has it. */
export async function describeLot(stage: Stage, seller: FirmKey, plan: LotPlan): Promise<Draft> {
  const { world, people, album } = stage;
  const { id: sellerId, place } = people[seller];
  const begun = await beginDraft(world, sellerId);
  const lots: { id: string }[] = await world.db.query('select id from lots where code = $1', [begun.code]);
  const of = { lotId: lots[0]!.id };
  for (const [position, photo] of plan.photos.entries())
    await album.hang({ ...photo, position, ownerId: sellerId, of });
  const { code, version } = begun;
  const saved = await saveDraft(world, { lotCode: code, sellerId, version, draft: toDraft(plan, place) });
  return { lotCode: code, version: saved.version };
}

/** Lists a lot now; its code. */
export async function list(stage: Stage, seller: FirmKey, plan: LotPlan): Promise<string> {
  const draft = await describeLot(stage, seller, plan);
  await listLot(stage.world, { ...draft, actor: actorOf(stage.people, seller) });
  return draft.lotCode;
}

/** When to list a lot so that it closes on this full hour. */
export const listingTime = (closes: DateTime, { sale }: LotPlan): DateTime =>
  closes.minus({ days: sale.days }).minus({ minutes: 25 });

/** Sets the account for payouts up at the processor, in a browser as it were. */
export async function setUpPayouts({ world, people, hear }: Stage, seller: FirmKey): Promise<void> {
  const { url } = await openAccountLink(world, people[seller].id);
  await setUpOnPage(world.settings, url, firms[seller].name);
  await hear();
}
