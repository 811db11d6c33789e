import type { EntityManager } from 'typeorm';
import { offerToUnderBidder } from './close-lot.ts';

/** The buyer of this lot did not pay and the deal is cancelled: the under-bidder is asked, or the lot is unsold. */
export const lapseAward = (tx: EntityManager, { lotId }: { lotId: string }): Promise<void> =>
  offerToUnderBidder(tx, lotId);
