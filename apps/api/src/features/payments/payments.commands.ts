import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { addToOutbox } from '../../platform/outbox.ts';
import { marketNow } from '../../platform/clock.ts';
import { accountCode, balanceOf } from '../ledger/ledger.reads.ts';
import { postTransfer } from '../ledger/ledger.commands.ts';
import { payoutReadiness } from '../payouts/payouts.reads.ts';
import { Payment, Refund, Transfer } from './payment.entity.ts';

export interface TransferOrderOfSettlement {
  settlementId: string;
  memberId: string;
  dealId: string;
  amountMinor: number;
}

/**
 * Orders a seller's share of a settlement, which the caller posts to their payable account. It waits, with the reason,
 * until the seller may be paid. Twice is once per settlement and member; nought orders nothing.
 */
export async function orderTransfer(tx: EntityManager, order: TransferOrderOfSettlement): Promise<void> {
  const { settlementId, memberId, dealId, amountMinor } = order;
  if (amountMinor === 0) return;
  const { reason } = await payoutReadiness(tx, memberId);
  const id = randomUUID();
  const rows: unknown[] = await tx.query(
    `insert into transfers (id, settlement_id, deal_id, member_id, amount_minor, state, reason, key) values ($1, $2, $3, $4, $5, $6, $7, $8)
     on conflict (settlement_id, member_id) do nothing returning id`,
    [id, settlementId, dealId, memberId, amountMinor, reason ? 'waiting' : 'queued', reason, `transfer:${id}:create:1`],
  );
  if (rows.length > 0 && !reason) await queueTransfer(tx, id);
}

/** Sends whatever waits for this member, if they may be paid now. Call it when their account or their papers come right. */
export async function releaseWaitingTransfers(tx: EntityManager, memberId: string): Promise<void> {
  const { reason } = await payoutReadiness(tx, memberId);
  const [rows]: [{ id: string }[], number] = await tx.query(
    `update transfers t set state = case when $2 = '' then 'queued' else 'waiting' end, reason = $2 from deals d
      where t.member_id = $1 and t.state = 'waiting' and d.id = t.deal_id and d.frozen_at is null returning t.id`,
    [memberId, reason],
  );
  if (reason) return;
  for (const { id } of rows) await queueTransfer(tx, id);
}

/** The same for the transfers of one deal that is no longer frozen. */
export async function releaseDealTransfers(tx: EntityManager, dealId: string): Promise<void> {
  const waiting = await tx.findBy(Transfer, { dealId, state: 'waiting' });
  for (const { memberId } of waiting) await releaseWaitingTransfers(tx, memberId);
}

/** A transfer may be queued again after it waited, so each time is an item of its own; the row's key makes the call happen once. */
const queueTransfer = (tx: EntityManager, transferId: string): Promise<void> =>
  addToOutbox(tx, { kind: 'transfer.create', key: `transfer:${transferId}:${randomUUID()}`, payload: { transferId } });

export interface RefundOrderOfDeal {
  dealId: string;
  amountMinor: number;
  /** In words for the buyer and the desk, such as `settlement`. */
  why: string;
}

/**
 * Orders part or all of a deal's payment back to the buyer; the caller posts it to the deal's refund account.
 * Nought orders nothing.
 * @throws Error when the deal has no payment, or not as much is left of it
 */
export async function orderRefund(tx: EntityManager, { dealId, amountMinor, why }: RefundOrderOfDeal): Promise<void> {
  if (amountMinor === 0) return;
  const payment = await tx.findOne(Payment, {
    where: { dealId, state: 'succeeded' },
    lock: { mode: 'pessimistic_write' },
  });
  if (!payment) throw new Error(`The deal ${dealId} has no payment to refund`);
  await orderRefundOf(tx, payment, { amountMinor, why });
}

/** The same for a payment that is named, such as one that came too late. */
export async function orderRefundOf(
  tx: EntityManager,
  payment: Payment,
  { amountMinor, why }: Omit<RefundOrderOfDeal, 'dealId'>,
): Promise<void> {
  const rows: { minor: number }[] = await tx.query(
    `select coalesce(sum(amount_minor), 0)::int as minor from refunds where payment_id = $1 and state <> 'failed'`,
    [payment.id],
  );
  const leftMinor = payment.amountMinor - rows[0]!.minor;
  if (amountMinor > leftMinor)
    throw new Error(`Only ${leftMinor} of the payment ${payment.id} is left to refund, not ${amountMinor}`);
  const id = randomUUID();
  const key = `refund:${id}:create:1`;
  await tx.insert(Refund, {
    id,
    dealId: payment.dealId,
    paymentId: payment.id,
    amountMinor,
    why,
    state: 'queued',
    reason: '',
    key,
  });
  await addToOutbox(tx, { kind: 'refund.create', key, payload: { refundId: id } });
}

/** Gives the whole hold back, with its posting: for a deal that is cancelled after payment. Nothing held is nothing to do. */
export async function returnHold(tx: EntityManager, deal: { id: string; code: string }, why: string): Promise<void> {
  const heldMinor = await balanceOf(tx, accountCode.hold(deal.code));
  if (heldMinor === 0) return;
  await postTransfer(tx, {
    kind: 'hold returned',
    dealId: deal.id,
    key: `deal:${deal.id}:hold-returned`,
    eventAt: await marketNow(tx),
    entries: [
      { account: accountCode.hold(deal.code), amountMinor: heldMinor },
      { account: accountCode.refund(deal.code), amountMinor: -heldMinor },
    ],
  });
  await orderRefund(tx, { dealId: deal.id, amountMinor: heldMinor, why });
}

/** Closes the payment pages of a deal that takes no payment any more. A payment that slips through is refunded when it is heard of. */
export async function closePaymentPages(tx: EntityManager, dealId: string): Promise<void> {
  const open = await tx.find(Payment, {
    where: [
      { dealId, state: 'open' },
      { dealId, state: 'failed' },
    ],
  });
  for (const { id, sessionId } of open)
    if (sessionId)
      await addToOutbox(tx, { kind: 'checkout.expire', key: `payment:${id}:expire`, payload: { sessionId } });
}
