import type { Stripe } from 'stripe';
import { availableMinor, balanceOf, post } from '../balances.ts';
import { refused } from '../errors.ts';
import { emit } from '../events.ts';
import { takePayoutFault } from '../faults.ts';
import { idOf, newId } from '../ids.ts';
import { listPage, within } from '../listing.ts';
import { amount, currency, ignored, metadata, momentFilter, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { mustFind, schedule, type Work } from '../work.ts';

/** The test bank account whose payouts the bank sends back. */
export const FAILING_BANK_ACCOUNT = '000111111116';

interface PayoutInput {
  amountMinor: number;
  currency: string;
  automatic: boolean;
  description?: string | undefined;
  metadata?: Record<string, string> | undefined;
  statementDescriptor?: string | undefined;
}

/** Sends money of the account acted for to its bank; it arrives after the payout delay. */
function createPayout(work: Work, input: PayoutInput): Stripe.Payout {
  const id = newId('po');
  const movement = { currency: input.currency, source: id, availableOnS: work.nowS, amountMinor: -input.amountMinor };
  const transaction = post(work, { ...movement, type: 'payout', category: 'payout' });
  const bank = work.store.all('bank_account').find(({ owner }) => owner === work.owner)?.value;
  const payout: Stripe.Payout = {
    id,
    object: 'payout',
    amount: input.amountMinor,
    application_fee: null,
    application_fee_amount: null,
    arrival_date: work.nowS + work.settings.payoutDelayS,
    automatic: input.automatic,
    balance_transaction: transaction.id,
    created: work.nowS,
    currency: input.currency,
    description: input.description ?? (input.automatic ? 'Automatic payout' : null),
    destination: bank?.id ?? null,
    failure_balance_transaction: null,
    failure_code: null,
    failure_message: null,
    livemode: false,
    metadata: input.metadata ?? {},
    method: 'standard',
    original_payout: null,
    payout_method: null,
    reconciliation_status: input.automatic ? 'completed' : 'not_applicable',
    reversed_by: null,
    source_type: 'card',
    statement_descriptor: input.statementDescriptor ?? null,
    status: 'in_transit',
    trace_id: null,
    type: 'bank_account',
  };
  work.store.put('payout', payout, { owner: work.owner });
  emit(work, 'payout.created', payout);
  schedule(work, 'land-payout', id, work.settings.payoutDelayS);
  return payout;
}

/** Pays a connected account all it has available, once it may be paid. */
export function payOut(work: Work): void {
  const account = work.store.find('account', work.owner ?? '');
  if (!account?.payouts_enabled) return;
  for (const [currencyOf, { availableMinor: sumMinor }] of balanceOf(work)) {
    if (sumMinor > 0) createPayout(work, { amountMinor: sumMinor, currency: currencyOf, automatic: true });
  }
}

/** The payout reaches the bank, or the bank sends it back. */
export function landPayout(work: Work, id: string): void {
  const payout = mustFind(work, 'payout', id);
  if (payout.status !== 'in_transit') return;
  const bank = work.store.find('bank_account', idOf(payout.destination) ?? '');
  const fails = takePayoutFault(work.store) ?? bank?.last4 === FAILING_BANK_ACCOUNT.slice(-4);
  if (fails) return failPayout(work, id);
  const paid: Stripe.Payout = { ...payout, status: 'paid' };
  work.store.put('payout', paid);
  emit(work, 'payout.paid', paid);
}

/** The bank sends a payout back: the money returns to the balance. */
export function failPayout(work: Work, id: string): void {
  const payout = mustFind(work, 'payout', id);
  if (payout.status === 'failed' || payout.status === 'canceled') return;
  const failed: Stripe.Payout = {
    ...payout,
    failure_balance_transaction: giveBack(work, payout, { type: 'payout_failure', category: 'payout_reversal' }),
    failure_code: 'account_closed',
    failure_message: 'The bank account has been closed.',
    status: 'failed',
  };
  work.store.put('payout', failed);
  emit(work, 'payout.failed', failed);
}

function giveBack(
  work: Work,
  payout: Stripe.Payout,
  kind: Pick<Parameters<typeof post>[1], 'type' | 'category'>,
): string {
  const movement = {
    currency: payout.currency,
    source: payout.id,
    availableOnS: work.nowS,
    amountMinor: payout.amount,
  };
  return post(work, { ...movement, ...kind }).id;
}

const createInput = {
  amount: amount(),
  currency: currency(),
  description: text().optional(),
  metadata: metadata().optional(),
  statement_descriptor: text().optional(),
  ...ignored('destination', 'method', 'source_type'),
};

const create = route('POST', '/payouts', createInput, (work, params) => {
  if (availableMinor(work, params.currency) < params.amount) {
    throw refused('balance_insufficient', 'You have insufficient funds in your balance for this payout.');
  }
  return createPayout(work, {
    amountMinor: params.amount,
    currency: params.currency,
    automatic: false,
    description: params.description,
    metadata: params.metadata,
    statementDescriptor: params.statement_descriptor,
  });
});

const cancel = route('POST', '/payouts/:id/cancel', {}, (work, _, { id = '' }) => {
  const payout = mustFind(work, 'payout', id);
  if (payout.status !== 'in_transit' || payout.automatic) {
    throw refused('payout_not_cancelable', 'Payouts can only be canceled while they are pending.');
  }
  giveBack(work, payout, { type: 'payout_cancel', category: 'payout_reversal' });
  const canceled: Stripe.Payout = { ...payout, status: 'canceled' };
  work.store.put('payout', canceled);
  emit(work, 'payout.canceled', canceled);
  return canceled;
});

const filter = { ...paging, status: text().optional(), destination: text().optional(), arrival_date: momentFilter() };

export const payoutRoutes = [
  create,
  route('GET', '/payouts', filter, (work, page) => {
    const keep = (payout: Stripe.Payout) =>
      (!page.status || payout.status === page.status) &&
      (!page.destination || idOf(payout.destination) === page.destination) &&
      within(payout.arrival_date, page.arrival_date);
    return listPage(work, 'payout', { url: '/v1/payouts', page, keep });
  }),
  route('GET', '/payouts/:id', {}, (work, _, { id = '' }) => mustFind(work, 'payout', id)),
  cancel,
];
