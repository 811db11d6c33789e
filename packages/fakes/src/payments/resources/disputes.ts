import type { Stripe } from 'stripe';
import { z } from 'zod';
import { post } from '../balances.ts';
import { emit } from '../events.ts';
import { idOf, newId } from '../ids.ts';
import { listPage } from '../listing.ts';
import { flag, ignored, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { refused } from '../errors.ts';
import { mergeMetadata } from '../metadata.ts';
import { testMethod } from '../test-methods.ts';
import { mustFind, type Work } from '../work.ts';

const DISPUTE_FEE_MINOR = 1_500;
const ANSWER_WITHIN_S = 9 * 86_400;

const asksForAnswer = ['needs_response', 'warning_needs_response'];

/** The payer's bank opens a dispute (or, for the inquiry test card, asks first). An inquiry moves no money. */
export function openDispute(work: Work, chargeId: string): Stripe.Dispute {
  const charge = mustFind(work, 'charge', chargeId);
  if (charge.status !== 'succeeded' || charge.disputed) {
    throw refused('charge_disputed', `The charge ${chargeId} cannot be disputed now.`);
  }
  const { outcome } = testMethod(work.store.row('charge', chargeId)?.hidden.test ?? '') ?? {};
  const isInquiry = outcome?.kind === 'succeeds' && outcome.then === 'inquiry';
  const id = newId('du');
  const amountMinor = charge.amount_captured - charge.amount_refunded;
  const withdrawal = {
    amountMinor: -amountMinor,
    feeMinor: DISPUTE_FEE_MINOR,
    description: `Chargeback for ${chargeId}`,
  };
  const transactions = isInquiry
    ? []
    : [move(work, { id, currency: charge.currency, category: 'dispute', ...withdrawal })];
  const dispute: Stripe.Dispute = {
    id,
    object: 'dispute',
    amount: amountMinor,
    balance_transactions: transactions,
    charge: chargeId,
    created: work.nowS,
    currency: charge.currency,
    enhanced_eligibility_types: [],
    evidence: {} as Stripe.Dispute.Evidence,
    evidence_details: {
      due_by: work.nowS + ANSWER_WITHIN_S,
      enhanced_eligibility: {},
      has_evidence: false,
      past_due: false,
      submission_count: 0,
    } as Stripe.Dispute.EvidenceDetails,
    intended_submission_method: null,
    is_charge_refundable: isInquiry,
    livemode: false,
    metadata: {},
    payment_intent: charge.payment_intent,
    reason: 'fraudulent',
    status: isInquiry ? 'warning_needs_response' : 'needs_response',
  };
  work.store.put('dispute', dispute, { owner: work.owner });
  if (!isInquiry) work.store.put('charge', { ...charge, disputed: true });
  emit(work, 'charge.dispute.created', dispute);
  if (!isInquiry) emit(work, 'charge.dispute.funds_withdrawn', dispute);
  return dispute;
}

/** Ends a dispute: won gives the amount back (not the fee), lost gives nothing. */
export function closeDispute(work: Work, id: string, result: 'won' | 'lost'): Stripe.Dispute {
  const before = mustFind(work, 'dispute', id);
  if (['won', 'lost', 'warning_closed'].includes(before.status)) {
    throw refused('dispute_closed', `The dispute ${id} is closed already.`);
  }
  if (before.status.startsWith('warning_')) return saveClosed(work, { ...before, status: 'warning_closed' });
  if (result === 'lost') return saveClosed(work, { ...before, status: 'lost' });
  const description = `Chargeback reversal for ${idOf(before.charge)}`;
  const back = move(work, {
    id,
    currency: before.currency,
    category: 'dispute_reversal',
    amountMinor: before.amount,
    feeMinor: 0,
    description,
  });
  const won = saveClosed(work, {
    ...before,
    balance_transactions: [...before.balance_transactions, back],
    status: 'won',
  });
  const charge = mustFind(work, 'charge', idOf(before.charge)!);
  work.store.put('charge', { ...charge, disputed: false });
  emit(work, 'charge.dispute.funds_reinstated', won);
  return won;
}

function saveClosed(work: Work, dispute: Stripe.Dispute): Stripe.Dispute {
  work.store.put('dispute', dispute);
  emit(work, 'charge.dispute.closed', dispute);
  return dispute;
}

interface DisputeMove {
  id: string;
  currency: string;
  category: string;
  amountMinor: number;
  feeMinor: number;
  description: string;
}

function move(work: Work, { id, ...movement }: DisputeMove): Stripe.BalanceTransaction {
  return post(work, { ...movement, type: 'adjustment', source: id, availableOnS: work.nowS });
}

const updateInput = {
  evidence: z.record(z.string(), text()).optional(),
  submit: flag().optional(),
  metadata: metadata().optional(),
  ...ignored('intended_submission_method'),
};

const update = route('POST', '/disputes/:id', updateInput, (work, params, { id = '' }) => {
  const before = mustFind(work, 'dispute', id);
  if (params.evidence && !asksForAnswer.includes(before.status)) {
    throw refused('dispute_closed', `The dispute ${id} takes no more evidence.`);
  }
  const evidence = { ...before.evidence, ...params.evidence } as Stripe.Dispute.Evidence;
  const isSent = Boolean(params.evidence) && params.submit !== false;
  const after: Stripe.Dispute = {
    ...before,
    evidence,
    evidence_details: {
      ...before.evidence_details,
      has_evidence: before.evidence_details.has_evidence || Boolean(params.evidence),
      submission_count: before.evidence_details.submission_count + (isSent ? 1 : 0),
    },
    metadata: mergeMetadata(before.metadata, params.metadata),
    status: isSent ? (before.status.startsWith('warning_') ? 'warning_under_review' : 'under_review') : before.status,
  };
  work.store.put('dispute', after);
  emit(work, 'charge.dispute.updated', after);
  if (!isSent) return after;
  // The documented test texts decide a dispute at once.
  if (evidence.uncategorized_text === 'winning_evidence') return closeDispute(work, id, 'won');
  return evidence.uncategorized_text === 'losing_evidence' ? closeDispute(work, id, 'lost') : after;
});

const filter = { ...paging, charge: text().optional(), payment_intent: text().optional() };

export const disputeRoutes = [
  route('GET', '/disputes', filter, (work, page) => {
    const keep = (dispute: Stripe.Dispute) =>
      (!page.charge || idOf(dispute.charge) === page.charge) &&
      (!page.payment_intent || idOf(dispute.payment_intent) === page.payment_intent);
    return listPage(work, 'dispute', { url: '/v1/disputes', page, keep });
  }),
  route('GET', '/disputes/:id', {}, (work, _, { id = '' }) => mustFind(work, 'dispute', id)),
  update,
  route('POST', '/disputes/:id/close', {}, (work, _, { id = '' }) => closeDispute(work, id, 'lost')),
];
