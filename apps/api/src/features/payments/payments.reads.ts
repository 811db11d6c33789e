import type { DealView, SettlementView } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { Payment, Refund, Transfer, type PaymentState } from './payment.entity.ts';

const shownAs: Record<PaymentState, DealView['payment']['state']> = {
  created: 'none',
  open: 'open',
  processing: 'processing',
  failed: 'failed',
  expired: 'none',
  succeeded: 'succeeded',
  refunded: 'succeeded',
};

/** Where the buyer's payment stands, with neutral words after a decline: the payment that counted, else the latest attempt. */
export async function paymentStanding(tx: EntityManager, dealId: string): Promise<DealView['payment']> {
  const all = await tx.find(Payment, { where: { dealId }, order: { attempt: 'DESC' } });
  const payment = all.find(({ state }) => state === 'succeeded') ?? all[0];
  return { state: payment ? shownAs[payment.state] : 'none', message: payment?.message ?? '' };
}

/** What a settlement's statement says of the money on its way: the seller's transfer and the buyer's refund. */
export async function moneyOnItsWay(
  tx: EntityManager,
  dealId: string,
): Promise<Pick<SettlementView, 'transfer' | 'refund'>> {
  const transfer = await tx.findOneBy(Transfer, { dealId });
  const [refund] = await tx.find(Refund, {
    where: { dealId },
    order: { sentAt: { direction: 'DESC', nulls: 'FIRST' } },
    take: 1,
  });
  return {
    transfer: transfer && {
      state: transfer.state,
      reason: transfer.reason,
      at: transfer.sentAt?.toISOString() ?? null,
    },
    refund: refund ? { state: refund.state, at: refund.sentAt?.toISOString() ?? null } : null,
  };
}

/** What waits or is under way for a seller, in minor units. */
export async function waitingMinor(tx: EntityManager, memberId: string): Promise<number> {
  const rows: { minor: number }[] = await tx.query(
    `select coalesce(sum(amount_minor), 0)::float8 as minor from transfers where member_id = $1 and state in ('waiting', 'queued')`,
    [memberId],
  );
  return rows[0]!.minor;
}
