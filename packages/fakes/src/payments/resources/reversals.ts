import type { Stripe } from 'stripe';
import { post, totalMinor } from '../balances.ts';
import { availableOnS } from '../charges.ts';
import { missing, refused } from '../errors.ts';
import { emit } from '../events.ts';
import { idOf, newId } from '../ids.ts';
import { pageOf } from '../listing.ts';
import { amount, flag, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { mustFind, type Work } from '../work.ts';

const reversalInput = {
  amount: amount().optional(),
  description: text().optional(),
  metadata: metadata().optional(),
  refund_application_fee: flag().optional(),
};

const reverse = route('POST', '/transfers/:id/reversals', reversalInput, (work, params, { id = '' }) =>
  reverseTransfer(work, mustFind(work, 'transfer', id), { amountMinor: params.amount, metadata: params.metadata }),
);

interface ReversalInput {
  amountMinor?: number | undefined;
  metadata?: Record<string, string> | undefined;
  refund?: string;
}

/** Takes back part or all of a transfer, if the connected account still holds as much. */
export function reverseTransfer(work: Work, transfer: Stripe.Transfer, input: ReversalInput): Stripe.TransferReversal {
  const leftMinor = transfer.amount - transfer.amount_reversed;
  const amountMinor = input.amountMinor ?? leftMinor;
  if (amountMinor > leftMinor || leftMinor === 0) {
    const message = `Reversal amount (${amountMinor}) is greater than what is left of the transfer (${leftMinor}).`;
    throw refused('parameter_invalid', message, { param: 'amount' });
  }
  const there: Work = { ...work, owner: idOf(transfer.destination)! };
  if (totalMinor(there, transfer.currency) < amountMinor) {
    throw refused('balance_insufficient', 'The connected account does not hold enough to reverse this transfer.');
  }
  const reversalId = newId('trr');
  const paymentId = idOf(transfer.destination_payment)!;
  const payment = work.store.find('charge', paymentId)!;
  // Money that is still on its way can be taken back only from what is on its way.
  const movement = { currency: transfer.currency, availableOnS: availableOnS(there, payment) };
  const back = post(work, {
    ...movement,
    type: 'transfer_cancel',
    category: 'transfer_reversal',
    amountMinor,
    source: reversalId,
  });
  post(there, {
    ...movement,
    type: 'payment_refund',
    category: 'refund',
    amountMinor: -amountMinor,
    source: paymentId,
  });
  work.store.put('charge', {
    ...payment,
    amount_refunded: payment.amount_refunded + amountMinor,
    refunded: payment.amount_refunded + amountMinor === payment.amount,
  });
  const reversal: Stripe.TransferReversal = {
    id: reversalId,
    object: 'transfer_reversal',
    amount: amountMinor,
    balance_transaction: back.id,
    created: work.nowS,
    currency: transfer.currency,
    destination_payment_refund: null,
    metadata: input.metadata ?? {},
    source_refund: input.refund ?? null,
    transfer: transfer.id,
  };
  work.store.put('transfer_reversal', reversal, { owner: work.owner });
  const reversed: Stripe.Transfer = {
    ...transfer,
    amount_reversed: transfer.amount_reversed + amountMinor,
    reversed: amountMinor === leftMinor,
    reversals: { ...transfer.reversals, data: [reversal, ...transfer.reversals.data].slice(0, 10) },
  };
  work.store.put('transfer', reversed);
  emit(work, 'transfer.reversed', reversed);
  return reversal;
}

const reversalsOf = (work: Work, id: string) => {
  mustFind(work, 'transfer', id);
  return work.store.all('transfer_reversal').flatMap(({ value }) => (value.transfer === id ? [value] : []));
};

export const reversalRoutes = [
  reverse,
  route('GET', '/transfers/:id/reversals', paging, (work, page, { id = '' }) =>
    pageOf(reversalsOf(work, id).toReversed(), { url: `/v1/transfers/${id}/reversals`, page }),
  ),
  route('GET', '/transfers/:id/reversals/:reversal', {}, (work, _, { id = '', reversal = '' }) => {
    const found = reversalsOf(work, id).find((item) => item.id === reversal);
    if (!found) throw missing('transfer reversal', reversal);
    return found;
  }),
];
