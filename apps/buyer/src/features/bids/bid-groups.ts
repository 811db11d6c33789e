import type { MyBidRow } from '@lydite/contracts';

export type BidGroup = 'answer' | 'highest' | 'outbid' | 'over';

/** Where a bid belongs: what waits for the buyer first, then what still runs, then what is over. */
export function groupOf({ offer, dealState, lotState, standing, leastNextMinor }: MyBidRow): BidGroup {
  if (offer || dealState === 'awaiting_payment') return 'answer';
  const runs = lotState === 'frozen' || (lotState === 'open' && leastNextMinor !== null);
  return runs ? standing : 'over';
}
