import type { DealView } from '@lydite/contracts';
import { massWords, type Words } from '../../platform/words.ts';
import type { DealEvent } from './deal.entity.ts';
import type { DealActor, DealMove, Side } from './deals.rules.ts';

export type EventKind = DealMove | 'award' | 'paid_too_late' | 'freeze' | 'release';

type Detail = DealEvent['detail'];
type Tell = (detail: Detail, words: Words) => string;

const nothing: Tell = () => '';
const say =
  (text: string): Tell =>
  () =>
    text;
const number = (detail: Detail, name: string): number => Number(detail[name] ?? 0);

/** What the timeline says of each kind of event: its title, and its detail from the facts kept with it. */
const told: Record<EventKind, [title: string, tell: Tell]> = {
  award: ['Awarded', (detail, { money }) => `At ${money(number(detail, 'priceMinor'))}`],
  hold: ['Paid into hold', (detail, { money }) => `${money(number(detail, 'holdMinor'))} is held`],
  pay_missed: ['Not paid in time', say('The award has lapsed')],
  paid_too_late: ['Paid after the award had lapsed', say('All of it goes back to the buyer')],
  freeze: ['Frozen', say('The buyer’s bank has asked for the money back; all deadlines stand still')],
  release: ['Released', say('The bank has decided for the market; the deadlines go on')],
  dispatch: ['Dispatched', ({ carrier, trackingCode }) => `${carrier}, ${trackingCode}`],
  mark_ready: ['Ready for collection', nothing],
  dispatch_missed: ['Not handed over in time', say('The buyer may cancel and have everything back')],
  cancel_late: ['Cancelled', say('Dispatch was late; all of the hold goes back to the buyer')],
  collect_missed: ['Not collected in time', say('The market’s desk takes it up')],
  receipt_missed: ['Did not arrive in time', say('The market’s desk takes it up')],
  receive: ['Received', nothing],
  weigh_in: [
    'Weighed in',
    (detail) => `${massWords(number(detail, 'netG'))} net, ${massWords(number(detail, 'declaredG'))} declared`,
  ],
  weigh_in_missed: [
    'Not weighed in in time',
    (detail) => `The declared mass of ${massWords(number(detail, 'netG'))} stands`,
  ],
  countersign: ['Weigh-in countersigned', nothing],
  countersign_missed: ['Not countersigned in time', say('The weigh-in stands')],
  accept: ['Delivery accepted', nothing],
  claim_mass: [
    'Claim: mass short',
    (detail, { money }) =>
      `${massWords(number(detail, 'shortG'))} short takes ${money(number(detail, 'adjustmentMinor'))} off the price`,
  ],
  accept_claim: ['Claim accepted', nothing],
  answer_missed: ['Claim not answered in time', say('The market’s desk decides on what there is')],
  decided: ['Ready to settle', ({ why }) => String(why)],
  approval_due: ['Awaits approval', say('Settlements of this size wait for an operator')],
  approval_missed: ['Not approved in time', say('All operators are told')],
  approve: ['Settlement approved', nothing],
  settle: [
    'Settled',
    (detail, { money }) => {
      const refundMinor = number(detail, 'refundMinor');
      const back = refundMinor > 0 ? `, ${money(refundMinor)} back to the buyer` : '';
      return `${money(number(detail, 'sellerGetsMinor'))} to the seller${back}`;
    },
  ],
};

export interface Viewer {
  side: Side;
  /** The other side's name, once it may be known. */
  counterpartyName: string | null;
}

/** Who did it, as this side reads it. */
export function byWords(actor: DealActor, { side, counterpartyName }: Viewer): string {
  if (actor === side) return 'You';
  if (actor === 'market') return 'The market';
  if (actor === 'desk') return 'The market’s desk';
  return counterpartyName ?? `The ${actor}`;
}

export const toEventView = (event: DealEvent, viewer: Viewer, words: Words): DealView['events'][number] => {
  const [title, tell] = told[event.kind as EventKind];
  return {
    at: event.at.toISOString(),
    by: byWords(event.actor, viewer),
    title,
    detail: tell(event.detail, words),
  };
};

const deskNames: Record<DealActor, string> = {
  seller: 'Seller',
  buyer: 'Buyer',
  market: 'The market',
  desk: 'The desk',
};

/** The same for the desk, which is on neither side. */
export const toDeskEvent = (event: DealEvent): { at: string; by: string; title: string } => ({
  at: event.at.toISOString(),
  by: deskNames[event.actor],
  title: told[event.kind as EventKind][0],
});
