import type { EntityManager } from 'typeorm';
import { marketNow } from '../../platform/clock.ts';
import type { ProcessorRefund, ProcessorTransfer } from '../../platform/payments.ts';
import { dealParties } from '../deals/deals.reads.ts';
import { accountCode } from '../ledger/ledger.reads.ts';
import { postTransfer } from '../ledger/ledger.commands.ts';
import { Refund, Transfer } from './payment.entity.ts';

/** What a transfer's `reference` at the processor is made of, and found again by. */
export const referenceOf = (kind: 'transfer' | 'refund', id: string): string => `${kind}:${id}`;

/** Our row behind an object of the processor; null when the market did not ask for it. */
export function rowIdOf(kind: 'transfer' | 'refund', reference: string): string | null {
  const [of, id] = reference.split(':');
  return of === kind && id ? id : null;
}

/** The processor has made this transfer: the row is sent, the money posted. Told by our own call or by its event, whichever is first. */
export async function recordTransfer(tx: EntityManager, transferRowId: string, made: ProcessorTransfer): Promise<void> {
  const row = await tx.findOneOrFail(Transfer, { where: { id: transferRowId }, lock: { mode: 'pessimistic_write' } });
  const now = await marketNow(tx);
  if (row.state !== 'sent')
    await tx.update(Transfer, { id: row.id }, { state: 'sent', reason: '', transferId: made.transferId, sentAt: now });
  await postTransfer(tx, {
    kind: 'transfer',
    dealId: row.dealId,
    key: `txn:${made.transactionId}`,
    eventAt: now,
    entries: [
      { account: accountCode.payable(row.memberId), amountMinor: made.amountMinor },
      { account: accountCode.processor, amountMinor: -made.amountMinor },
    ],
  });
  for (const { amountMinor, transactionId } of made.reversals)
    await postTransfer(tx, {
      kind: 'transfer reversed',
      dealId: row.dealId,
      key: `txn:${transactionId}`,
      eventAt: now,
      entries: [
        { account: accountCode.payable(row.memberId), amountMinor: -amountMinor },
        { account: accountCode.processor, amountMinor },
      ],
    });
}

/** The same for a refund, which may come back from the bank days later: then the money is owed again, and the desk must act. */
export async function recordRefund(tx: EntityManager, refundRowId: string, made: ProcessorRefund): Promise<void> {
  const row = await tx.findOneOrFail(Refund, { where: { id: refundRowId }, lock: { mode: 'pessimistic_write' } });
  const deal = await dealParties(tx, { id: row.dealId });
  const now = await marketNow(tx);
  const move = (kind: string, transactionId: string, amountMinor: number): Promise<boolean> =>
    postTransfer(tx, {
      kind,
      dealId: row.dealId,
      key: `txn:${transactionId}`,
      eventAt: now,
      entries: [
        { account: accountCode.refund(deal!.code), amountMinor },
        { account: accountCode.processor, amountMinor: -amountMinor },
      ],
    });
  if (made.transactionId) await move('refund', made.transactionId, made.amountMinor);
  if (made.failureTransactionId) await move('refund failed', made.failureTransactionId, -made.amountMinor);
  if (row.state === 'failed') return;
  const failed = made.state === 'failed';
  await tx.update(
    Refund,
    { id: row.id },
    {
      state: failed ? 'failed' : 'sent',
      reason: failed ? 'The bank sent the money back. The desk finds another way.' : '',
      refundId: made.refundId,
      sentAt: row.sentAt ?? now,
    },
  );
}
