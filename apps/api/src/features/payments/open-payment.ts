import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { ProcessorFailure, ProcessorRefusal, type CheckoutOrder } from '../../platform/payments.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { lockOwnDeal } from '../deals/deal-steps.commands.ts';
import { Payment } from './payment.entity.ts';
import { dealToPay } from './payments.queries.ts';
import { refreshPayment } from './record-payment.ts';

type Parts = Pick<World, 'db' | 'payments' | 'settings' | 'log'>;

export interface Press {
  dealCode: string;
  buyerId: string;
}

/** An attempt whose page was never opened proves nothing after a day: the processor has forgotten its key. */
const keyLifeMs = 24 * 3_600_000;

/**
 * Opens the processor's payment page for a deal and gives its address; pressing again gives the same page as long as it is open.
 * In three phases, so that no lock is held while the processor is asked: decide, call, record.
 * @throws AppError deal.not_found, deal.frozen, deal.wrong_state, processor.unavailable
 */
export async function openPayment(world: Parts, press: Press): Promise<{ url: string }> {
  for (let round = 1; round <= 3; round += 1) {
    const payment = await inTransaction(world.db, (tx) => currentAttempt(tx, press));
    const url = payment.sessionId ? await openPageOf(world, payment) : await createPage(world, payment, press);
    if (url) return { url };
  }
  throw new AppError('deal.wrong_state', 'The payment is being looked at. Wait a minute, then look at the deal again.');
}

/** The attempt in progress, or a new one; decides under the deal's lock whether it may be paid at all. */
async function currentAttempt(tx: EntityManager, { dealCode, buyerId }: Press): Promise<Payment> {
  const { deal, now } = await lockOwnDeal(tx, { code: dealCode, side: 'buyer', memberId: buyerId });
  if (deal.state !== 'awaiting_payment')
    throw new AppError('deal.wrong_state', 'This deal is not waiting for a payment.', {
      context: { state: deal.state },
    });
  if (deal.dueAt && !deal.duePausedAt && now >= deal.dueAt)
    throw new AppError('deal.wrong_state', 'The time to pay is over.', { context: { state: deal.state } });
  const [latest] = await tx.find(Payment, { where: { dealId: deal.id }, order: { attempt: 'DESC' }, take: 1 });
  if (latest?.state === 'processing' || latest?.state === 'succeeded')
    throw new AppError('deal.wrong_state', 'Your bank is processing the payment. We write when it has arrived.');
  const isLive =
    latest &&
    (latest.sessionId
      ? latest.state === 'open' || latest.state === 'failed'
      : latest.state === 'created' && now.getTime() - latest.createdAt.getTime() < keyLifeMs);
  if (isLive) return latest;
  if (latest?.state === 'created') await tx.update(Payment, { id: latest.id }, { state: 'expired' });
  const id = randomUUID();
  await tx.insert(Payment, {
    id,
    dealId: deal.id,
    attempt: (latest?.attempt ?? 0) + 1,
    amountMinor: deal.holdMinor,
    state: 'created',
    message: '',
    createdAt: now,
  });
  return tx.findOneByOrFail(Payment, { id });
}

/** The address of an attempt's page while it is open. Otherwise ours is brought up to date, and null says: decide again. */
async function openPageOf(world: Parts, { id, sessionId }: Payment): Promise<string | null> {
  const page = await world.payments.retrieveCheckout(sessionId!);
  if (page.state === 'open') return page.url;
  if (page.intentId) await refreshPayment(world, page.intentId);
  // A debit that failed leaves a page that is complete, and a page can run out before anybody tried.
  await giveUp(world.db, id);
  return null;
}

const giveUp = (db: World['db'], paymentId: string): Promise<unknown> =>
  db.query(`update payments set state = 'expired' where id = $1 and state in ('created', 'open', 'failed')`, [
    paymentId,
  ]);

async function createPage(world: Parts, payment: Payment, { dealCode, buyerId }: Press): Promise<string> {
  const { db, payments, settings, log } = world;
  const deal = await dealToPay(db.manager, { code: dealCode, buyerId });
  const address = `${settings.PUBLIC_URL}/deals/${deal.code}`;
  const order: CheckoutOrder = {
    dealId: deal.id,
    dealCode: deal.code,
    paymentId: payment.id,
    amountMinor: payment.amountMinor,
    currency: settings.MARKET_CURRENCY,
    description: `${deal.code}: hold for ${deal.lotCode}, ${deal.title}`,
    buyerEmail: deal.buyerEmail,
    // The way back proves nothing: the page only waits for the webhook's news.
    successUrl: `${address}?paid=1`,
    cancelUrl: `${address}?paid=0`,
    key: `payment:${payment.id}:checkout:${payment.attempt}`,
  };
  const { sessionId, url } = await payments.createCheckout(order).catch(async (error: unknown) => {
    // The processor repeats this answer for this key: the next press makes a new attempt.
    if (error instanceof ProcessorFailure || error instanceof ProcessorRefusal) await giveUp(db, payment.id);
    if (!(error instanceof ProcessorRefusal)) throw error;
    log.error({ err: error, dealCode }, 'the processor refused a payment page');
    throw new AppError(
      'processor.unavailable',
      'The payment processor does not take this payment. Nothing was charged; write to the market’s desk.',
      { cause: error },
    );
  });
  await db.query(`update payments set session_id = $2, url = $3, state = 'open' where id = $1 and state = 'created'`, [
    payment.id,
    sessionId,
    url,
  ]);
  return url;
}
