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

const words: [prefix: string, text: string][] = [
  ['external_account', 'Bank account for payouts'],
  ['tos_acceptance', 'Agreement with the payment processor'],
  ['business_type', 'Kind of business'],
  ['business_profile', 'What your business does'],
  ['company', 'Details of the company'],
  ['individual', 'Details of the person'],
  ['representative', 'Details of the person who signs'],
  ['owners', 'Details of the owners'],
];

/** The processor's own names of what it still asks for, in words for the seller, each once. */
export const requirementWords = (requirements: string[]): string[] => [
  ...new Set(requirements.map((name) => words.find(([prefix]) => name.startsWith(prefix))?.[1] ?? 'Further details')),
];
