import type { DealAction, DealView } from '@lydite/contracts';
import { formatMassG } from '@lydite/ui';
import { call } from '../../call/call.ts';
import type { Words } from '../../market/use-words.ts';
import { withFreshPassword } from '../../session/fresh-call.ts';
import { holdRows } from './deal-money.ts';
import type { MoneyRow } from './MoneyTable.tsx';

/** A step that binds: it has a page of its own to check, then a button. */
export interface CheckedStep {
  action: DealAction;
  title: string;
  rows?: (deal: DealView) => MoneyRow[];
  /** What happens by it, and when, one sentence each. */
  points: (deal: DealView, words: Words) => string[];
  button: (deal: DealView, words: Words) => string;
  busy: string;
  look?: 'danger';
  /** Said once it is done. */
  done: string;
  /** The deal after it, or the address of the page where it goes on. */
  send: (dealCode: string) => Promise<DealView | { url: string }>;
}

const claimRows = ({ priceMinor, weighIn, claim }: DealView): MoneyRow[] => {
  const adjustmentMinor = claim?.adjustmentMinor ?? weighIn?.claimableMinor ?? 0;
  return [
    { label: 'Price', amountMinor: priceMinor },
    { label: 'Mass short', amountMinor: -adjustmentMinor },
    { label: 'Value', detail: 'Fees are taken on this', amountMinor: priceMinor - adjustmentMinor, total: true },
  ];
};

const weighed = ({ weighIn }: DealView): string =>
  weighIn
    ? `${formatMassG(weighIn.netG)} net was weighed in; ${formatMassG(weighIn.declaredG)} was declared. The tolerance is ${formatMassG(weighIn.toleranceG)}.`
    : '';

const pay: CheckedStep = {
  action: 'pay',
  title: 'Check and pay into the hold',
  rows: holdRows,
  points: ({ delivery }) => [
    'The payment processor takes the money. In the hold it is owed to neither side yet.',
    delivery.way === 'collection'
      ? 'The seller has 5 days to make the lot ready for collection. If that is late, you may cancel and have all of it back.'
      : 'The seller has 5 days to dispatch. If that is late, you may cancel and have all of it back.',
    'You weigh the delivery in. A mass short beyond the tolerance comes off the price if you claim it within 5 days.',
    'Then the hold is settled: the seller is paid, and what is left comes back to you with a statement.',
  ],
  button: ({ holdMinor }, { exactMoney }) => `Pay ${exactMoney(holdMinor)} into the hold`,
  busy: 'Opening the payment page',
  done: 'The payment page opens.',
  send: (dealCode) => withFreshPassword(() => call('POST /deals/:dealCode/payment', { params: { dealCode } })),
};

const accept: CheckedStep = {
  action: 'accept',
  title: 'Check and accept the delivery',
  points: (deal, { money }) => [
    weighed(deal),
    `The seller is paid on the whole price, ${money(deal.priceMinor)}. Nothing can be claimed afterwards.`,
    deal.weighIn?.countersignedAt
      ? 'The seller has countersigned the weigh-in, so the hold is settled at once.'
      : 'The hold is settled when the seller has countersigned the weigh-in, or when the time for that is over.',
  ],
  button: () => 'Accept the delivery',
  busy: 'Accepting',
  done: 'The delivery is accepted.',
  send: (dealCode) => withFreshPassword(() => call('POST /deals/:dealCode/accept', { params: { dealCode } })),
};

const claim: CheckedStep = {
  action: 'claim_mass',
  title: 'Check and claim the mass short',
  rows: claimRows,
  points: (deal) => [
    weighed(deal),
    'Beyond the tolerance the whole shortage counts. The hold is frozen until the claim is settled.',
    'The seller accepts the claim, or the market’s desk decides on what there is.',
  ],
  button: ({ weighIn }, { exactMoney }) => `Claim ${exactMoney(weighIn?.claimableMinor ?? 0)} off the price`,
  busy: 'Claiming',
  done: 'The claim is made. The seller is told.',
  send: (dealCode) => call('POST /deals/:dealCode/claim', { params: { dealCode }, body: { ground: 'mass' } }),
};

const countersign: CheckedStep = {
  action: 'countersign',
  title: 'Check and countersign the weigh-in',
  points: (deal) => [
    weighed(deal),
    'By countersigning you agree that this is what arrived on the scale. It is no word on what the lot is worth.',
    'If you do nothing, the weigh-in stands when the time is over.',
  ],
  button: () => 'Countersign',
  busy: 'Countersigning',
  done: 'The weigh-in is countersigned.',
  send: (dealCode) => call('POST /deals/:dealCode/countersign', { params: { dealCode } }),
};

const acceptClaim: CheckedStep = {
  action: 'accept_claim',
  title: 'Check and accept the claim',
  rows: claimRows,
  points: (deal) => [
    weighed(deal),
    'The hold is settled at once on the value above: you are paid it with the freight, less your fee.',
    'If you do not answer, the market’s desk decides on what there is.',
  ],
  button: ({ claim: made }, { exactMoney }) => `Accept ${exactMoney(made?.adjustmentMinor ?? 0)} off the price`,
  busy: 'Accepting',
  done: 'The claim is accepted.',
  send: (dealCode) => withFreshPassword(() => call('POST /deals/:dealCode/accept-claim', { params: { dealCode } })),
};

const cancel: CheckedStep = {
  action: 'cancel_late',
  title: 'Check and cancel the deal',
  points: ({ holdMinor }, { exactMoney }) => [
    `Dispatch is late. All of the hold, ${exactMoney(holdMinor)}, goes back to you; no fee is taken.`,
    'The deal ends. You can’t take it up again.',
    'You need not cancel: you may also wait for the seller.',
  ],
  button: () => 'Cancel the deal',
  busy: 'Cancelling',
  look: 'danger',
  done: 'The deal is cancelled. The hold goes back to you.',
  send: (dealCode) => withFreshPassword(() => call('POST /deals/:dealCode/cancel', { params: { dealCode } })),
};

/** By the last part of the step's address. */
export const checkedSteps: Record<string, CheckedStep> = {
  pay,
  accept,
  claim,
  countersign,
  'accept-claim': acceptClaim,
  cancel,
};
