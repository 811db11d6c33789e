import type { SettlementView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { Settlement } from './settlement.entity.ts';

export { holdOf } from './settle-outright.rules.ts';

interface Outgoing {
  transferState: 'waiting' | 'queued' | 'sent' | 'failed' | null;
  transferReason: string | null;
  transferAt: Date | null;
  refundState: 'queued' | 'sent' | 'failed' | null;
  refundAt: Date | null;
}

const iso = (at: Date | null): string | null => at?.toISOString() ?? null;

/** How a deal was settled and what became of its transfer and refund; null before the settlement. */
export async function settlementOf(tx: EntityManager, dealId: string): Promise<SettlementView | null> {
  const settlement = await tx.findOneBy(Settlement, { dealId });
  if (!settlement) return null;
  const rows: Outgoing[] = await tx.query(
    `select t.state as "transferState", t.reason as "transferReason", t.sent_at as "transferAt", r.state as "refundState", r.sent_at as "refundAt"
       from settlements s left join transfers t on t.settlement_id = s.id left join refunds r on r.deal_id = s.deal_id
      where s.deal_id = $1`,
    [dealId],
  );
  const out = rows[0]!;
  return {
    settledAt: settlement.at.toISOString(),
    valueMinor: settlement.valueMinor,
    sellerGetsMinor: settlement.sellerGetsMinor,
    refundMinor: settlement.refundMinor,
    ...settlement.steps,
    hash: settlement.hash,
    transfer: out.transferState && {
      state: out.transferState,
      reason: out.transferReason ?? '',
      at: iso(out.transferAt),
    },
    refund: out.refundState && { state: out.refundState, at: iso(out.refundAt) },
  };
}
