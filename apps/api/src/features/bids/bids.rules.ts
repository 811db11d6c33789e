/** The rules of bidding (docs/rules.md, Bids), as pure functions. Amounts in minor units. */

const minuteMs = 60_000;
export const lateBidMs = 5 * minuteMs;
export const underOfferHours = 24;
export const bidsPerMinute = 60;
/** No amount of the market is larger (docs/rules.md). */
export const mostMinor = 99_999_999;

/** Smallest of 1, 2, 5 × 10ⁿ that is at least 0.8 % of `amountMinor`, and at least one minor unit. */
export function stepMinor(amountMinor: number): number {
  for (let decade = 1; ; decade *= 10)
    for (const digit of [1, 2, 5]) if (digit * decade * 1000 >= amountMinor * 8) return digit * decade;
}

export interface Auction {
  startMinor: number;
  /** Lowest price at which the seller sells; null when there is none. */
  reserveMinor: number | null;
  /** Null before the first bid, and then so are the leader and the leader's ceiling. */
  priceMinor: number | null;
  leaderId: string | null;
  leaderCeilingMinor: number | null;
}

export interface CeilingBid {
  bidderId: string;
  ceilingMinor: number;
}

/** Least ceiling a bidder may name now: for the leader one minor unit over the own ceiling, for others one step over the price; never over the largest amount. */
export function leastNextMinor(auction: Auction, bidderId: string | null): number {
  if (auction.priceMinor === null) return auction.startMinor;
  if (bidderId !== null && bidderId === auction.leaderId) return Math.min(mostMinor, auction.leaderCeilingMinor! + 1);
  return Math.min(mostMinor, auction.priceMinor + stepMinor(auction.priceMinor));
}

/**
 * The auction after a bid: the leader pays the least that beats the next ceiling, and the reserve as soon as a ceiling reaches it.
 * Equal ceilings: the earlier leads. The price never falls and never passes the leader's ceiling.
 */
export function applyBid(auction: Auction, { bidderId, ceilingMinor }: CeilingBid): Auction {
  const { startMinor, priceMinor, leaderId, leaderCeilingMinor } = auction;
  if (priceMinor === null || leaderId === null || leaderCeilingMinor === null)
    return withReserve({ ...auction, leaderId: bidderId, leaderCeilingMinor: ceilingMinor, priceMinor: startMinor });
  if (bidderId === leaderId)
    return withReserve({ ...auction, leaderCeilingMinor: Math.max(leaderCeilingMinor, ceilingMinor) });
  const overtakes = ceilingMinor > leaderCeilingMinor;
  const top = overtakes ? ceilingMinor : leaderCeilingMinor;
  const next = overtakes ? leaderCeilingMinor : ceilingMinor;
  return withReserve({
    ...auction,
    leaderId: overtakes ? bidderId : leaderId,
    leaderCeilingMinor: top,
    priceMinor: Math.max(priceMinor, Math.min(top, next + stepMinor(next))),
  });
}

function withReserve(auction: Auction): Auction {
  const { reserveMinor, leaderCeilingMinor, priceMinor } = auction;
  if (reserveMinor === null || leaderCeilingMinor! < reserveMinor) return auction;
  return { ...auction, priceMinor: Math.max(priceMinor!, reserveMinor) };
}

export const reserveReached = ({
  reserveMinor,
  leaderCeilingMinor,
}: Pick<Auction, 'reserveMinor' | 'leaderCeilingMinor'>): boolean =>
  leaderCeilingMinor !== null && leaderCeilingMinor >= (reserveMinor ?? 0);

/** The close after a bid at `at`: a late bid that changes price or leader moves it to five minutes later, never past the latest close. */
export function closeAfterBid({
  at,
  closesAt,
  latestClosesAt,
  changed,
}: {
  at: Date;
  closesAt: Date;
  latestClosesAt: Date;
  changed: boolean;
}): Date {
  if (!changed || closesAt.getTime() - at.getTime() > lateBidMs) return closesAt;
  return new Date(Math.min(latestClosesAt.getTime(), Math.max(closesAt.getTime(), at.getTime() + lateBidMs)));
}

/**
 * The auction computed again from each bidder's last ceiling, in the order those were placed; for the under-bidder of a lot
 * whose winner did not pay, leave the defaulter's bids out. `leaderId` is null when nobody is left.
 */
export function replay(terms: Pick<Auction, 'startMinor' | 'reserveMinor'>, lastBids: readonly CeilingBid[]): Auction {
  const empty: Auction = { ...terms, priceMinor: null, leaderId: null, leaderCeilingMinor: null };
  return lastBids.reduce(applyBid, empty);
}
