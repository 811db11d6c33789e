import { HopelessEffect, type OutboxHandler } from '../../platform/outbox.ts';
import { ProcessorFailure, ProcessorRefusal, type ProcessorRefund, type RefundOrder } from '../../platform/payments.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { nextKey } from './next-key.rules.ts';
import { Payment, Refund } from './payment.entity.ts';
import { recordRefund, referenceOf } from './record-sent.ts';

type Parts = Pick<World, 'db' | 'payments' | 'log'>;

/** Sends a buyer's money back: the same steps as for a transfer. */
export const sendRefund =
  (world: Parts): OutboxHandler =>
  async ({ payload }) => {
    const id = String(payload.refundId);
    const row = await world.db.manager.findOneByOrFail(Refund, { id });
    if (row.state !== 'queued') return;
    const payment = await world.db.manager.findOneByOrFail(Payment, { id: row.paymentId });
    const order: RefundOrder = {
      intentId: payment.intentId!,
      reference: referenceOf('refund', id),
      amountMinor: row.amountMinor,
      key: row.key,
    };
    const made = (await world.payments.findRefund(order)) ?? (await create(world, id, order));
    await inTransaction(world.db, (tx) => recordRefund(tx, id, made));
  };

async function create({ db, payments, log }: Parts, id: string, order: RefundOrder): Promise<ProcessorRefund> {
  try {
    return await payments.createRefund(order);
  } catch (error) {
    if (error instanceof ProcessorFailure)
      await db.manager.update(Refund, { id, key: order.key }, { key: nextKey(order.key) });
    if (!(error instanceof ProcessorRefusal)) throw error;
    log.error({ err: error, refundId: id }, 'the processor refused a refund');
    const reason = 'The payment processor refused the refund. The desk looks into it.';
    await db.manager.update(Refund, { id, state: 'queued' }, { state: 'failed', reason });
    throw new HopelessEffect(`${error.code}: ${error.message}`);
  }
}

/** Closes a payment page nobody should pay on any more. */
export const expireCheckout =
  ({ payments }: Pick<World, 'payments'>): OutboxHandler =>
  ({ payload }) =>
    payments.expireCheckout(String(payload.sessionId));
