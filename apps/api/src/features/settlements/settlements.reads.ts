import type { SettlementView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { moneyOnItsWay } from '../payments/payments.reads.ts';
import { Settlement } from './settlement.entity.ts';

export { holdOf } from './settle-outright.rules.ts';

/** How a deal was settled and what became of its transfer and refund; null before the settlement. */
export async function settlementOf(tx: EntityManager, dealId: string): Promise<SettlementView | null> {
  const settlement = await tx.findOneBy(Settlement, { dealId });
  if (!settlement) return null;
  return {
    settledAt: settlement.at.toISOString(),
    valueMinor: settlement.valueMinor,
    sellerGetsMinor: settlement.sellerGetsMinor,
    refundMinor: settlement.refundMinor,
    ...settlement.steps,
    hash: settlement.hash,
    ...(await moneyOnItsWay(tx, dealId)),
  };
}
