import type { EntityManager } from 'typeorm';
import { weighInOf, type WeighInFacts } from '../deliveries/deliveries.reads.ts';
import { lotHeadline } from '../lots/lots.reads.ts';
import type { LockedDeal } from './deal-steps.commands.ts';

/** The weigh-in of a deal that must have one. @throws Error when it has none */
export async function weighInFor(tx: EntityManager, deal: LockedDeal): Promise<WeighInFacts> {
  const { massG } = await lotHeadline(tx, deal.lotId);
  const found = await weighInOf(tx, { dealId: deal.id, declaredG: massG, priceMinor: deal.priceMinor });
  if (!found) throw new Error(`${deal.code} is weighed in without a weigh-in`);
  return found;
}
