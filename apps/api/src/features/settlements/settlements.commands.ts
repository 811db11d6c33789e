import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { marketTerms } from '../../platform/market-terms.ts';
import { createWords } from '../../platform/words.ts';
import { dueAfter, moveDeal, type LockedDeal } from '../deals/deal-steps.commands.ts';
import { postTransfer } from '../ledger/ledger.commands.ts';
import { accountCode } from '../ledger/ledger.reads.ts';
import { notify } from '../notices/notices.commands.ts';
import { orderRefund, orderTransfer } from '../payments/payments.commands.ts';
import { settleOutright } from './settle-outright.rules.ts';
import { Settlement } from './settlement.entity.ts';
import { hashOfStatement } from './statement-hash.rules.ts';
import { statementSteps } from './statement-steps.rules.ts';

/** An automatic settlement above this value waits for an operator's approval (rules.md, Money). */
const approvalAboveMinor = 2_000_000;

export interface SettleOrder {
  /** What accepted claims take off the price, and why. */
  adjustmentMinor: number;
  reason: string;
  now: Date;
  /** An operator has approved it. */
  approved?: boolean;
}

/**
 * Settles a locked deal whose state is `settling`: divides the hold, posts it, orders transfer and refund, tells both
 * sides. Above the limit it waits for approval instead. Safe to try again: a settled deal refuses the step.
 */
export async function settleDeal(tx: EntityManager, deal: LockedDeal, order: SettleOrder): Promise<void> {
  const { adjustmentMinor, reason, now, approved = false } = order;
  const terms = { ...deal, adjustmentMinor, paidInMinor: deal.holdMinor };
  const figures = settleOutright(terms);
  if (figures.valueMinor > approvalAboveMinor && !approved) {
    const due = await dueAfter(tx, deal, { kind: 'approval', from: now });
    return moveDeal(tx, deal, { move: 'approval_due', actor: 'market', now, due });
  }
  const words = createWords(await marketTerms(tx));
  const steps = statementSteps({ deal: terms, figures, reason, words });
  const record = { ...figures, adjustmentMinor, freightMinor: deal.freightMinor, paidInMinor: deal.holdMinor };
  const settlement: Settlement = {
    id: randomUUID(),
    dealId: deal.id,
    ...record,
    steps,
    hash: hashOfStatement({ deal: deal.code, at: now.toISOString(), ...record, ...steps }),
    at: now,
  };
  await tx.insert(Settlement, settlement);
  await moveDeal(tx, deal, {
    move: 'settle',
    actor: 'market',
    now,
    due: null,
    detail: { sellerGetsMinor: figures.sellerGetsMinor, refundMinor: figures.refundMinor },
    patch: { settledAt: now, endedAt: now },
  });
  await payOut(tx, deal, settlement);
  await tellSettled(tx, deal, settlement);
}

/** Posts the division of the hold and orders what leaves it. */
async function payOut(tx: EntityManager, deal: LockedDeal, settlement: Settlement): Promise<void> {
  const { id, paidInMinor, sellerGetsMinor, refundMinor, at } = settlement;
  const entries = [
    { account: accountCode.hold(deal.code), amountMinor: paidInMinor },
    { account: accountCode.payable(deal.sellerId), amountMinor: -sellerGetsMinor },
    { account: accountCode.fees, amountMinor: -(settlement.buyerFeeMinor + settlement.sellerFeeMinor) },
    { account: accountCode.tax, amountMinor: -(settlement.buyerTaxMinor + settlement.sellerTaxMinor) },
    { account: accountCode.refund(deal.code), amountMinor: -refundMinor },
  ];
  await orderTransfer(tx, {
    settlementId: id,
    memberId: deal.sellerId,
    dealId: deal.id,
    amountMinor: sellerGetsMinor,
  });
  await orderRefund(tx, { dealId: deal.id, amountMinor: refundMinor, why: 'settlement' });
  // Last, since it locks the accounts that every deal shares.
  await postTransfer(tx, { kind: 'settlement', dealId: deal.id, key: `settlement:${deal.id}`, eventAt: at, entries });
}

async function tellSettled(tx: EntityManager, deal: LockedDeal, settlement: Settlement): Promise<void> {
  const { money } = createWords(await marketTerms(tx));
  const { sellerGetsMinor, refundMinor } = settlement;
  const common = { kind: 'settled', subject: `${deal.code} is settled`, link: `/deals/${deal.code}` };
  await notify(tx, {
    ...common,
    memberId: deal.sellerId,
    key: `settled:${deal.id}:seller`,
    text: `${money(sellerGetsMinor)} goes to your account. The statement shows every step.`,
    link: `/sell/deals/${deal.code}`,
  });
  await notify(tx, {
    ...common,
    memberId: deal.buyerId,
    key: `settled:${deal.id}:buyer`,
    text:
      refundMinor > 0
        ? `The hold is released; ${money(refundMinor)} comes back to you. The statement shows every step.`
        : 'The hold is released to the seller. The statement shows every step.',
  });
}
