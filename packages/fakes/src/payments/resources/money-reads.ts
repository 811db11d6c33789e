import type { Stripe } from 'stripe';
import { balanceOf } from '../balances.ts';
import { idOf } from '../ids.ts';
import { listPage } from '../listing.ts';
import { ignored, metadata, momentFilter, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { mustFind } from '../work.ts';
import { mergeMetadata } from '../metadata.ts';

const chargeFilter = {
  ...paging,
  customer: text().optional(),
  payment_intent: text().optional(),
  transfer_group: text().optional(),
};

const listCharges = route('GET', '/charges', chargeFilter, (work, page) => {
  const keep = (charge: Stripe.Charge) =>
    (!page.customer || idOf(charge.customer) === page.customer) &&
    (!page.payment_intent || idOf(charge.payment_intent) === page.payment_intent) &&
    (!page.transfer_group || charge.transfer_group === page.transfer_group);
  return listPage(work, 'charge', { url: '/v1/charges', page, keep });
});

const chargeFacts = {
  description: text().optional(),
  metadata: metadata().optional(),
  transfer_group: text().optional(),
};

const updateCharge = route('POST', '/charges/:id', chargeFacts, (work, params, { id = '' }) => {
  const charge = mustFind(work, 'charge', id);
  return work.store.put('charge', {
    ...charge,
    description: params.description ?? charge.description,
    metadata: mergeMetadata(charge.metadata, params.metadata),
    transfer_group: params.transfer_group ?? charge.transfer_group,
  });
});

const balance = route('GET', '/balance', {}, (work): Stripe.Balance => {
  const sums = [...balanceOf(work)];
  const ofKind = (kind: 'availableMinor' | 'pendingMinor') =>
    (sums.length > 0 ? sums : [['usd', { availableMinor: 0, pendingMinor: 0 }] as const]).map(([currency, sum]) => ({
      amount: sum[kind],
      currency,
      source_types: { card: sum[kind] },
    }));
  return { object: 'balance', available: ofKind('availableMinor'), livemode: false, pending: ofKind('pendingMinor') };
});

const transactionFilter = {
  ...paging,
  type: text().optional(),
  source: text().optional(),
  currency: text().optional(),
  payout: text().optional(),
  available_on: momentFilter(),
};

const listTransactions = route('GET', '/balance_transactions', transactionFilter, (work, page) => {
  const source = page.payout ?? page.source;
  const keep = (transaction: Stripe.BalanceTransaction) =>
    (!page.type || transaction.type === page.type) &&
    (!source || idOf(transaction.source) === source) &&
    (!page.currency || transaction.currency === page.currency);
  return listPage(work, 'balance_transaction', { url: '/v1/balance_transactions', page, keep });
});

export const moneyReadRoutes = [
  listCharges,
  route('GET', '/charges/:id', {}, (work, _, { id = '' }) => mustFind(work, 'charge', id)),
  updateCharge,
  balance,
  listTransactions,
  route('GET', '/balance_transactions/:id', ignored(), (work, _, { id = '' }) =>
    mustFind(work, 'balance_transaction', id),
  ),
];
