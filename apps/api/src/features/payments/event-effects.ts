import type { ClaimedEvent, EventHandler } from '../../platform/inbox.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { bookOwnPayout, recordAccount, recordPayout } from '../payouts/payouts.commands.ts';
import { recordDispute } from './record-dispute.ts';
import { refreshPayment } from './record-payment.ts';
import { recordRefund, recordTransfer, rowIdOf } from './record-sent.ts';

type Parts = Pick<World, 'db' | 'payments' | 'settings' | 'log'>;
type Effect = (world: Parts, event: ClaimedEvent) => Promise<void>;

const payment: Effect = (world, { objectId }) => refreshPayment(world, objectId);

/** A hint only: the payment behind the page is what counts. */
const checkout: Effect = async (world, { objectId }) => {
  const { state, intentId } = await world.payments.retrieveCheckout(objectId);
  if (intentId) await refreshPayment(world, intentId);
  if (state === 'expired')
    await world.db.query(
      `update payments set state = 'expired' where session_id = $1 and state in ('open', 'failed')`,
      [objectId],
    );
};

const refund: Effect = async ({ db, payments, log }, { objectId }) => {
  const made = await payments.retrieveRefund(objectId);
  const id = rowIdOf('refund', made.reference);
  if (!id) {
    log.error({ refundId: objectId }, 'a refund that the market did not ask for');
    return;
  }
  await inTransaction(db, (tx) => recordRefund(tx, id, made));
};

const transfer: Effect = async ({ db, payments, log }, { objectId }) => {
  const made = await payments.retrieveTransfer(objectId);
  const id = rowIdOf('transfer', made.reference);
  if (!id) {
    log.error({ transferId: objectId }, 'a transfer that the market did not ask for');
    return;
  }
  await inTransaction(db, (tx) => recordTransfer(tx, id, made));
};

const dispute: Effect = async ({ db, payments }, { objectId }) => {
  const found = await payments.retrieveDispute(objectId);
  await inTransaction(db, (tx) => recordDispute(tx, found));
};

const account: Effect = async ({ db, payments }, { accountId, objectId }) => {
  const found = await payments.retrieveAccount(accountId ?? objectId);
  await inTransaction(db, (tx) => recordAccount(tx, found));
};

const payout: Effect = async ({ db, payments }, { accountId, objectId }) => {
  const found = await payments.retrievePayout({ payoutId: objectId, accountId });
  await inTransaction(db, (tx) => (accountId ? recordPayout(tx, accountId, found) : bookOwnPayout(tx, found)));
};

/** The events the market listens to, each with its one effect (money.md). */
const effects: Record<string, Effect> = {
  'payment_intent.succeeded': payment,
  'payment_intent.payment_failed': payment,
  'payment_intent.processing': payment,
  'payment_intent.canceled': payment,
  'checkout.session.completed': checkout,
  'checkout.session.expired': checkout,
  'checkout.session.async_payment_succeeded': checkout,
  'checkout.session.async_payment_failed': checkout,
  'refund.created': refund,
  'refund.updated': refund,
  'refund.failed': refund,
  'charge.dispute.created': dispute,
  'charge.dispute.funds_withdrawn': dispute,
  'charge.dispute.closed': dispute,
  'charge.dispute.funds_reinstated': dispute,
  'transfer.created': transfer,
  'transfer.reversed': transfer,
  'account.updated': account,
  'payout.created': payout,
  'payout.paid': payout,
  'payout.failed': payout,
};

export const isHeeded = (kind: string): boolean => Object.hasOwn(effects, kind);

/** Brings about an event's effect by reading its object at the processor; what the event itself says is not believed. */
export const applyEvent =
  (world: Parts): EventHandler =>
  async (event) =>
    effects[event.kind]?.(world, event);
