import type { LotView } from '@lydite/contracts';

interface Check {
  amountMinor: number | null;
  leastNextMinor: number;
  /** The own ceiling while it leads: only more than it is a raise. */
  leadingMinor?: number | null;
  /** What the buyer's limit has room for; null when unknown. */
  roomMinor: number | null;
  money: (amountMinor: number) => string;
}

/** Why an amount can't be bid, in words for beside its field; null when it can. The market decides all the same. */
export function bidProblem({ amountMinor, leastNextMinor, leadingMinor, roomMinor, money }: Check): string | null {
  if (amountMinor === null) return 'Enter the most you would pay, such as 6,200';
  if (leadingMinor != null && amountMinor <= leadingMinor)
    return `You already lead with up to ${money(leadingMinor)}; enter more to raise it`;
  if (amountMinor < leastNextMinor) return `The next bid starts at ${money(leastNextMinor)}`;
  if (roomMinor !== null && amountMinor > roomMinor) return `Your limit has room for ${money(roomMinor)}`;
  return null;
}

/** What of a lot binds its reader's next bid. */
export const boundsOf = ({ you }: Pick<LotView, 'you'>) => ({
  roomMinor: you?.roomMinor ?? null,
  leadingMinor: you?.standing === 'highest' ? you.ceilingMinor : null,
});
