import type { EntityManager } from 'typeorm';
import { HopelessEffect, type OutboxHandler } from '../../platform/outbox.ts';
import {
  ProcessorFailure,
  ProcessorRefusal,
  type ProcessorTransfer,
  type TransferOrder,
} from '../../platform/payments.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { dealParties } from '../deals/deals.reads.ts';
import { recordAccount } from '../payouts/payouts.commands.ts';
import { payoutReadiness } from '../payouts/payouts.reads.ts';
import { nextKey } from './next-key.rules.ts';
import { Payment, Transfer } from './payment.entity.ts';
import { recordTransfer, referenceOf } from './record-sent.ts';

type Parts = Pick<World, 'db' | 'payments' | 'settings' | 'log'>;

/**
 * Sends a seller's share to their account: decide, call, record. Looks the transfer up before making it, so that a lost answer,
 * a second worker or a key the processor has forgotten never pay twice.
 */
export const sendTransfer =
  (world: Parts): OutboxHandler =>
  async ({ payload }) => {
    const id = String(payload.transferId);
    const order = await inTransaction(world.db, (tx) => decide(tx, id, world.settings.MARKET_CURRENCY));
    if (!order) return;
    const made = (await world.payments.findTransfer(order)) ?? (await create(world, id, order));
    if (made) await inTransaction(world.db, (tx) => recordTransfer(tx, id, made));
  };

/** What to send, or null when it is sent already or has to wait. */
async function decide(tx: EntityManager, id: string, currency: string): Promise<TransferOrder | null> {
  const row = await tx.findOneOrFail(Transfer, { where: { id }, lock: { mode: 'pessimistic_write' } });
  if (row.state !== 'queued') return null;
  const deal = await dealParties(tx, { id: row.dealId });
  const { accountId, reason } = await payoutReadiness(tx, row.memberId);
  const hindrance = deal!.frozen ? 'The deal is frozen.' : reason;
  if (hindrance || !accountId) {
    await tx.update(Transfer, { id }, { state: 'waiting', reason: hindrance });
    return null;
  }
  const payment = await tx.findOneByOrFail(Payment, { dealId: row.dealId, state: 'succeeded' });
  return {
    dealId: row.dealId,
    reference: referenceOf('transfer', id),
    amountMinor: row.amountMinor,
    currency,
    accountId,
    chargeId: payment.chargeId!,
    key: row.key,
  };
}

async function create(world: Parts, id: string, order: TransferOrder): Promise<ProcessorTransfer | null> {
  try {
    return await world.payments.createTransfer(order);
  } catch (error) {
    if (error instanceof ProcessorFailure)
      await world.db.manager.update(Transfer, { id, key: order.key }, { key: nextKey(order.key) });
    if (error instanceof ProcessorRefusal) return refuse(world, { id, order, error });
    throw error;
  }
}

/** Our picture of the account was old, so the transfer waits; any other refusal is the desk's. */
async function refuse(
  { db, payments, log }: Parts,
  { id, order, error }: { id: string; order: TransferOrder; error: ProcessorRefusal },
): Promise<null> {
  const account = await payments.retrieveAccount(order.accountId);
  if (!account.transfersActive) {
    await db.manager.update(Transfer, { id, state: 'queued' }, { state: 'waiting', reason: '' });
    await inTransaction(db, (tx) => recordAccount(tx, account));
    return null;
  }
  log.error({ err: error, transferId: id }, 'the processor refused a transfer');
  const reason = 'The payment processor refused the transfer. The desk looks into it.';
  await db.manager.update(Transfer, { id, state: 'queued' }, { state: 'failed', reason });
  throw new HopelessEffect(`${error.code}: ${error.message}`);
}
