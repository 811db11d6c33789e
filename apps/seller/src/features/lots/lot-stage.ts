import type { MyLotRow } from '@lydite/contracts';

export const stages = ['draft', 'open', 'hold', 'transit', 'paid'] as const;
export type Stage = (typeof stages)[number];

export const stageNames: Record<Stage, string> = {
  draft: 'Draft',
  open: 'Open',
  hold: 'Hold',
  transit: 'Transit',
  paid: 'Paid',
};

export interface Standing {
  /** Where on the chain the lot is; the stage it ended at when it goes no further. */
  stage: Stage;
  /** All of the chain is behind it. */
  isPaid: boolean;
  /** It left the chain: withdrawn, unsold, refunded. */
  hasEnded: boolean;
  /** What happens there, in words. */
  words: string;
}

const at = (stage: Stage, words: string): Standing => ({ stage, words, isPaid: false, hasEnded: false });
const ended = (stage: Stage, words: string): Standing => ({ ...at(stage, words), hasEnded: true });

const dealStandings: Record<string, Standing> = {
  awaiting_payment: at('hold', 'Awaits the buyer’s payment'),
  held: at('hold', 'Paid into hold'),
  dispatched: at('transit', 'On its way'),
  ready: at('transit', 'Ready for collection'),
  received: at('transit', 'Received, not weighed in yet'),
  weighed_in: at('transit', 'Weighed in'),
  in_dispute: at('transit', 'Claim open'),
  settling: at('paid', 'Being settled'),
  needs_approval: at('paid', 'Awaits an operator’s approval'),
  settled: { ...at('paid', 'Settled'), isPaid: true },
  cancelled: ended('hold', 'Cancelled'),
  refunded: ended('transit', 'Refunded'),
};

const lotStandings: Record<MyLotRow['state'], Standing> = {
  draft: at('draft', 'Draft'),
  in_review: at('open', 'With the desk before it opens'),
  open: at('open', 'Open'),
  frozen: at('open', 'Frozen by the desk'),
  awarded: at('hold', 'Awarded'),
  offered: at('hold', 'Offered to the next bidder'),
  unsold: ended('open', 'Unsold'),
  withdrawn: ended('open', 'Withdrawn'),
};

/** Where a lot stands on the chain from draft to paid; a live deal says more than the lot's own state. */
export const standingOf = ({ state, dealState }: Pick<MyLotRow, 'state' | 'dealState'>): Standing =>
  (dealState ? dealStandings[dealState] : undefined) ?? lotStandings[state];

export const views = ['all', 'duties', 'drafts', 'open', 'deals', 'ended'] as const;
export type View = (typeof views)[number];

export const viewNames: Record<View, string> = {
  all: 'All',
  duties: 'Your turn',
  drafts: 'Drafts',
  open: 'Open',
  deals: 'Sold, under way',
  ended: 'Ended',
};

/** Whether a lot belongs to a view of the list. */
export function isInView(lot: MyLotRow, view: View): boolean {
  const { stage, hasEnded, isPaid } = standingOf(lot);
  switch (view) {
    case 'all':
      return true;
    case 'duties':
      return lot.duty !== '';
    case 'drafts':
      return stage === 'draft';
    case 'open':
      return stage === 'open' && !hasEnded;
    case 'deals':
      return ['hold', 'transit', 'paid'].includes(stage) && !hasEnded && !isPaid;
    case 'ended':
      return hasEnded || isPaid;
  }
}

/** Duties with a date first, the nearest on top; then other duties; then the rest, the last touched first. */
export function byDuty(a: MyLotRow, b: MyLotRow): number {
  const rank = ({ duty, dutyBy }: MyLotRow) => (duty === '' ? 2 : dutyBy === null ? 1 : 0);
  const byRank = rank(a) - rank(b);
  if (byRank !== 0) return byRank;
  if (a.dutyBy !== null && b.dutyBy !== null) return a.dutyBy.localeCompare(b.dutyBy);
  return b.updatedAt.localeCompare(a.updatedAt);
}
