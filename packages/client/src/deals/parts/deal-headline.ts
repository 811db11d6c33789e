import type { DealState, DealView } from '@lydite/contracts';
import type { Words } from '../../market/use-words.ts';

type Facts = Pick<DealView, 'side' | 'state' | 'frozen' | 'actions' | 'settlement' | 'holdMinor' | 'delivery'>;
type Tell = (deal: Facts, words: Pick<Words, 'money'>) => string;

const say =
  (text: string): Tell =>
  () =>
    text;

const buyer: Record<DealState, Tell> = {
  awaiting_payment: ({ holdMinor }, { money }) => `Pay ${money(holdMinor)} into the hold`,
  held: ({ actions, delivery }) =>
    actions.includes('cancel_late')
      ? 'The seller is late: you may cancel'
      : delivery.way === 'collection'
        ? 'Paid. The seller gets the lot ready'
        : 'Paid. The seller sends the lot next',
  dispatched: say('On its way to you'),
  ready: say('Ready for you to collect'),
  received: say('Weigh the delivery in'),
  weighed_in: ({ actions }) =>
    actions.includes('claim_mass')
      ? 'The mass is short: claim it, or accept'
      : actions.includes('accept')
        ? 'Weighed in. Accept the delivery'
        : 'Accepted. The seller countersigns next',
  in_dispute: say('You have claimed a mass short'),
  settling: say('Being settled'),
  needs_approval: say('The desk approves the settlement next'),
  settled: ({ settlement }, { money }) =>
    settlement && settlement.refundMinor > 0
      ? `Settled, ${money(settlement.refundMinor)} comes back to you`
      : 'Settled',
  cancelled: say('Cancelled'),
  refunded: say('Refunded'),
};

const seller: Record<DealState, Tell> = {
  awaiting_payment: say('Awarded. The buyer pays next'),
  held: ({ delivery }) => (delivery.way === 'collection' ? 'Make the lot ready for collection' : 'Send the lot'),
  dispatched: say('On its way to the buyer'),
  ready: say('Ready. The buyer collects it'),
  received: say('Arrived. The buyer weighs it in next'),
  weighed_in: ({ actions }) =>
    actions.includes('countersign') ? 'Countersign the weigh-in' : 'Countersigned. The buyer accepts or claims next',
  in_dispute: say('The buyer claims a mass short'),
  settling: say('Being settled'),
  needs_approval: say('The desk approves the settlement next'),
  settled: ({ settlement }, { money }) =>
    settlement ? `Settled, ${money(settlement.sellerGetsMinor)} for you` : 'Settled',
  cancelled: say('Cancelled'),
  refunded: say('Refunded'),
};

/** The finding that heads a deal's page: what is so, or what this side has to do. */
export const dealHeadline: Tell = (deal, words) =>
  deal.frozen ? 'Frozen: all deadlines stand still' : (deal.side === 'buyer' ? buyer : seller)[deal.state](deal, words);

/** States in a few words, for lists. */
export const stateWords: Record<DealState, string> = {
  awaiting_payment: 'Awaiting payment',
  held: 'Paid into hold',
  dispatched: 'On its way',
  ready: 'Ready for collection',
  received: 'Received',
  weighed_in: 'Weighed in',
  in_dispute: 'In dispute',
  settling: 'Being settled',
  needs_approval: 'Awaiting approval',
  settled: 'Settled',
  cancelled: 'Cancelled',
  refunded: 'Refunded',
};
