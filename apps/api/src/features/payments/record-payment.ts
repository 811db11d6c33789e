import type { EntityManager } from 'typeorm';
import { marketNow } from '../../platform/clock.ts';
import type { ProcessorPayment } from '../../platform/payments.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { recordHold, recordPaymentState } from '../deals/deals.commands.ts';
import { lockDeal } from '../deals/deal-steps.commands.ts';
import { accountCode } from '../ledger/ledger.reads.ts';
import { postTransfer } from '../ledger/ledger.commands.ts';
import { Payment, type PaymentState } from './payment.entity.ts';
import { orderRefundOf } from './payments.commands.ts';

type Parts = Pick<World, 'db' | 'payments' | 'settings' | 'log'>;

/** Reads a payment at the processor as it stands now and moves ours forward. Any order, any number of times. */
export async function refreshPayment(world: Parts, intentId: string): Promise<void> {
  const found = await world.payments.retrievePayment(intentId);
  if (!found.paymentId) {
    world.log.error({ intentId }, 'a payment that the market did not ask for');
    return;
  }
  await inTransaction(world.db, (tx) => recordPayment(tx, found, world.settings.MARKET_CURRENCY));
}

const isOver = (state: PaymentState): boolean => state === 'succeeded' || state === 'refunded';

async function recordPayment(tx: EntityManager, found: ProcessorPayment, currency: string): Promise<void> {
  const { dealId } = await tx.findOneByOrFail(Payment, { id: found.paymentId });
  // The deal before its payment, as everywhere.
  const { deal } = await lockDeal(tx, { id: dealId });
  const payment = await tx.findOneOrFail(Payment, {
    where: { id: found.paymentId },
    lock: { mode: 'pessimistic_write' },
  });
  if (isOver(payment.state)) return;
  if (found.state === 'succeeded') {
    if (found.amountMinor !== payment.amountMinor || found.currency !== currency)
      throw new Error(`${found.intentId} is over ${found.amountMinor} ${found.currency}, not what was asked for`);
    return recordSuccess(tx, { payment, dealCode: deal.code, found });
  }
  await recordProgress(tx, payment, found);
}

const progress: Record<Exclude<ProcessorPayment['state'], 'succeeded'>, PaymentState> = {
  open: 'open',
  processing: 'processing',
  failed: 'failed',
  cancelled: 'expired',
};

async function recordProgress(tx: EntityManager, payment: Payment, found: ProcessorPayment): Promise<void> {
  const state = progress[found.state as keyof typeof progress];
  // A page that has run out for us may only still bring money.
  if (payment.state === 'expired' && state !== 'processing') return;
  const { intentId, message } = found;
  await tx.update(Payment, { id: payment.id }, { state, intentId, message });
  if (state === 'processing') await recordPaymentState(tx, { dealId: payment.dealId, state: 'processing' });
  else if (payment.state === 'processing') await recordPaymentState(tx, { dealId: payment.dealId, state: 'failed' });
}

interface Success {
  payment: Payment;
  dealCode: string;
  found: ProcessorPayment;
}

/** Posts the money, then the deal takes it; what it can't take, because it is paid already, goes back whole. */
async function recordSuccess(tx: EntityManager, { payment, dealCode, found }: Success): Promise<void> {
  const { charge, amountMinor, intentId } = found;
  if (!charge) throw new Error(`${intentId} succeeded, but its money has not moved yet`);
  const { dealId } = payment;
  const isSecond = await tx.existsBy(Payment, { dealId, state: 'succeeded' });
  const now = await marketNow(tx);
  await tx.update(
    Payment,
    { id: payment.id },
    {
      state: isSecond ? 'refunded' : 'succeeded',
      intentId,
      chargeId: charge.chargeId,
      processorFeeMinor: charge.feeMinor,
      message: '',
      succeededAt: now,
    },
  );
  await postTransfer(tx, {
    kind: 'pay in',
    dealId,
    key: `txn:${charge.transactionId}`,
    eventAt: now,
    entries: [
      { account: accountCode.hold(dealCode), amountMinor: -amountMinor },
      { account: accountCode.processorFees, amountMinor: charge.feeMinor },
      { account: accountCode.processor, amountMinor: amountMinor - charge.feeMinor },
    ],
  });
  if (isSecond) return giveBack(tx, { payment, dealCode, now });
  if ((await recordHold(tx, { dealId })) === 'refunded')
    await tx.update(
      Payment,
      { id: payment.id },
      { message: 'The payment came after the award had lapsed. All of it goes back to you.' },
    );
}

async function giveBack(
  tx: EntityManager,
  { payment, dealCode, now }: { payment: Payment; dealCode: string; now: Date },
): Promise<void> {
  const { id, dealId, amountMinor } = payment;
  await postTransfer(tx, {
    kind: 'payment returned',
    dealId,
    key: `payment:${id}:returned`,
    eventAt: now,
    entries: [
      { account: accountCode.hold(dealCode), amountMinor },
      { account: accountCode.refund(dealCode), amountMinor: -amountMinor },
    ],
  });
  await orderRefundOf(tx, payment, { amountMinor, why: 'paid twice' });
}
