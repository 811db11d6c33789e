import type { EntityManager } from 'typeorm';
import { marketNow } from '../../platform/clock.ts';
import type { ProcessorDispute } from '../../platform/payments.ts';
import { freezeDeal, releaseDeal } from '../deals/freeze-deal.commands.ts';
import { dealParties } from '../deals/deals.reads.ts';
import { accountCode, balanceOf } from '../ledger/ledger.reads.ts';
import { postTransfer } from '../ledger/ledger.commands.ts';
import { Payment } from './payment.entity.ts';
import { releaseDealTransfers } from './payments.commands.ts';

/**
 * The buyer's bank takes a payment back: the deal is frozen and the money in suspense until the bank decides. Won, the deal goes on.
 * Lost, it comes out of the hold as far as that reaches, and is the market's expense after that. A mere inquiry changes nothing.
 * @throws Error while the payment is not known yet: its own event is still to come
 */
export async function recordDispute(tx: EntityManager, dispute: ProcessorDispute): Promise<void> {
  if (dispute.state === 'inquiry') return;
  const payment = await tx.findOneBy(Payment, { chargeId: dispute.chargeId });
  if (!payment) throw new Error(`The charge ${dispute.chargeId} is in dispute and not known yet`);
  const { dealId } = payment;
  // The deal is locked first, as everywhere; a dispute that is won already freezes nothing any more.
  await (dispute.state === 'won' ? releaseDeal : freezeDeal)(tx, { dealId });
  await postMovements(tx, dealId, dispute);
  if (dispute.state === 'lost') await postLoss(tx, dealId, dispute);
  if (dispute.state === 'won') await releaseDealTransfers(tx, dealId);
}

async function postMovements(
  tx: EntityManager,
  dealId: string,
  { disputeId, movements }: ProcessorDispute,
): Promise<void> {
  for (const { amountMinor, feeMinor, transactionId } of movements)
    await postTransfer(tx, {
      kind: amountMinor < 0 ? 'dispute' : 'dispute won',
      dealId,
      key: `txn:${transactionId}`,
      eventAt: await marketNow(tx),
      entries: [
        { account: accountCode.disputed(disputeId), amountMinor: -amountMinor },
        { account: accountCode.disputeCosts, amountMinor: feeMinor },
        { account: accountCode.processor, amountMinor: amountMinor - feeMinor },
      ],
    });
}

async function postLoss(tx: EntityManager, dealId: string, { disputeId }: ProcessorDispute): Promise<void> {
  // Once posted, nothing is left in suspense and told again it posts nothing.
  const lostMinor = await balanceOf(tx, accountCode.disputed(disputeId));
  if (lostMinor === 0) return;
  const deal = await dealParties(tx, { id: dealId });
  const hold = accountCode.hold(deal!.code);
  const fromHoldMinor = Math.min(lostMinor, await balanceOf(tx, hold));
  await postTransfer(tx, {
    kind: 'dispute lost',
    dealId,
    key: `dispute:${disputeId}:lost`,
    eventAt: await marketNow(tx),
    entries: [
      { account: hold, amountMinor: fromHoldMinor },
      { account: accountCode.disputeCosts, amountMinor: lostMinor - fromHoldMinor },
      { account: accountCode.disputed(disputeId), amountMinor: -lostMinor },
    ],
  });
}
