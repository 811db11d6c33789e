import type { Side } from './deals.rules.ts';

interface DeadlineRule {
  /** Calendar days; null when no clock runs any more. */
  days: number | null;
  whose: Side | 'desk';
  /** To whoever has the duty, and to the other side. */
  duty: string;
  others: string;
  ifMissed: string;
}

/** The deadlines of a deal sold outright (rules.md, Deadlines). */
export const deadlineRules = {
  pay: {
    days: 2,
    whose: 'buyer',
    duty: 'Pay into hold',
    others: 'The buyer pays into hold',
    ifMissed: 'The award lapses, and the next bidder is asked.',
  },
  dispatch: {
    days: 5,
    whose: 'seller',
    duty: 'Hand the lot over for delivery',
    others: 'The seller hands the lot over for delivery',
    ifMissed: 'The buyer may cancel and has everything back; it counts on the seller’s record.',
  },
  dispatch_late: {
    days: null,
    whose: 'seller',
    duty: 'Hand the lot over for delivery: you are late',
    others: 'The seller is late: wait, or cancel and have everything back',
    ifMissed: '',
  },
  collect: {
    days: 10,
    whose: 'buyer',
    duty: 'Collect the lot and record the receipt',
    others: 'The buyer collects the lot',
    ifMissed: 'The market’s desk takes up the case.',
  },
  receipt: {
    days: 21,
    whose: 'buyer',
    duty: 'Record the receipt when the lot arrives',
    others: 'The buyer records the receipt',
    ifMissed: 'The market’s desk takes it up as “did not arrive”.',
  },
  weigh_in: {
    days: 3,
    whose: 'buyer',
    duty: 'Weigh in',
    others: 'The buyer weighs in',
    ifMissed: 'The declared mass stands.',
  },
  countersign: {
    days: 2,
    whose: 'seller',
    duty: 'Countersign the weigh-in',
    others: 'The seller countersigns the weigh-in',
    ifMissed: 'The weigh-in stands.',
  },
  claim: {
    days: 5,
    whose: 'buyer',
    duty: 'Accept the delivery, or claim',
    others: 'The buyer accepts the delivery, or claims',
    ifMissed: 'The hold is settled as if accepted.',
  },
  answer: {
    days: 3,
    whose: 'seller',
    duty: 'Answer the claim',
    others: 'The seller answers the claim',
    ifMissed: 'The market’s desk decides on what there is.',
  },
  approval: {
    days: 2,
    whose: 'desk',
    duty: 'The market’s desk approves the settlement',
    others: 'The market’s desk approves the settlement',
    ifMissed: 'All operators are told.',
  },
  desk: {
    days: null,
    whose: 'desk',
    duty: 'The market’s desk takes it up',
    others: 'The market’s desk takes it up',
    ifMissed: '',
  },
} as const satisfies Record<string, DeadlineRule>;
export type DueKind = keyof typeof deadlineRules;
/** The kinds whose clock runs. */
export type RunningKind = Exclude<DueKind, 'dispatch_late' | 'desk'>;

/** While money is held every deadline ends on this day at the latest, ten days before the hold itself ends. */
export const lastDayOfHold = 80;

const dayMs = 86_400_000;

/** When mails remind of a deadline: at half time and a day before, as far as they lie within it. */
export function reminderMoments({ from, at }: { from: Date; at: Date }): Date[] {
  const half = new Date((from.getTime() + at.getTime()) / 2);
  const dayBefore = new Date(at.getTime() - dayMs);
  return [half, dayBefore].filter((moment) => moment > from).sort((a, b) => a.getTime() - b.getTime());
}
