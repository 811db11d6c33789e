import type { BalanceTransaction } from '../../platform/payments.ts';

const dayMs = 86_400_000;

/** Days over which movements and postings are matched one by one; what is older is proved by the balance. */
export const matchedDays = 30;
/** How much further back the other side of a match may lie. */
export const marginDays = 5;
export interface Movements {
  /** The processor's balance transactions of the matched days and the margin before them. */
  seen: BalanceTransaction[];
  /** The ledger's postings of the matched days and twice the margin before them. */
  posted: { transactionId: string; at: Date }[];
  /** When the books were read; the processor was asked after that. */
  now: Date;
  /** A movement no further than this from now may still be on its way into the books. */
  patienceMs: number;
}

export interface Comparison {
  /** Moved at the processor and not posted. */
  missing: BalanceTransaction[];
  /** Posted, and the processor knows nothing of it. */
  unknown: string[];
  /** Net sum of what has moved and may be posted any moment. */
  onItsWayMinor: number;
}

/** Matches the processor's movements with the ledger's postings, one to one. */
export function compareMovements({ seen, posted, now, patienceMs }: Movements): Comparison {
  const seenIds = new Set(seen.map(({ id }) => id));
  const postedIds = new Set(posted.map(({ transactionId }) => transactionId));
  const unposted = seen.filter(({ id }) => !postedIds.has(id));
  const isYoung = ({ at }: BalanceTransaction): boolean => Math.abs(now.getTime() - at.getTime()) < patienceMs;
  const isMatched = ({ at }: { at: Date }): boolean => now.getTime() - at.getTime() < matchedDays * dayMs;
  return {
    missing: unposted.filter((one) => !isYoung(one)),
    unknown: posted
      .filter(isMatched)
      .map(({ transactionId }) => transactionId)
      .filter((id) => !seenIds.has(id)),
    onItsWayMinor: unposted.filter(isYoung).reduce((sum, { netMinor }) => sum + netMinor, 0),
  };
}
