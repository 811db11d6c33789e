import type { PayoutAccount, PayoutState } from './payout-account.entity.ts';

/** Gate on what the processor says of the account, never on the seller's return from its page. */
export const isReady = ({
  transfersActive,
  payoutsEnabled,
}: Pick<PayoutAccount, 'transfersActive' | 'payoutsEnabled'>): boolean => transfersActive && payoutsEnabled;

/** A bank may send a payout back after it was paid, so failure outranks success. */
const rank: Record<PayoutState, number> = { pending: 0, in_transit: 1, paid: 2, failed: 3, cancelled: 3 };

/** States move only forward, whatever order the news comes in. */
export const isNews = (known: PayoutState | null, heard: PayoutState): boolean =>
  known === null || rank[heard] > rank[known];
