import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  applyBid,
  closeAfterBid,
  leastNextMinor,
  replay,
  reserveReached,
  stepMinor,
  type Auction,
} from './bids.rules.ts';

const fresh = (startMinor: number, reserveMinor: number | null = null): Auction => ({
  startMinor,
  reserveMinor,
  priceMinor: null,
  leaderId: null,
  leaderCeilingMinor: null,
});
const amount = fc.integer({ min: 1, max: 99_999_999 });

describe('step', () => {
  test.each([
    [1, 1],
    [125, 1],
    [126, 2],
    [250, 2],
    [251, 5],
    [62_500, 500],
    [62_501, 1000],
    [595_000, 5000],
    [99_999_999, 1_000_000],
  ])('of %i is %i', (price, step) => expect(stepMinor(price)).toBe(step));

  test('is one of 1, 2, 5 × 10ⁿ, at least 0.8 %, and the next smaller one is less', () => {
    fc.assert(
      fc.property(amount, (price) => {
        const step = stepMinor(price);
        const digit = Number(String(step)[0]);
        expect([1, 2, 5]).toContain(digit);
        expect(step * 1000).toBeGreaterThanOrEqual(price * 8);
        const smaller = digit === 5 ? (step / 5) * 2 : step / 2;
        if (smaller >= 1) expect(smaller * 1000).toBeLessThan(price * 8);
      }),
    );
  });
});

describe('price', () => {
  test('one bidder: the start price; a second ceiling lifts it by one step over the lower one', () => {
    const first = applyBid(fresh(400_000), { bidderId: 'a', ceilingMinor: 620_000 });
    expect(first).toMatchObject({ priceMinor: 400_000, leaderId: 'a' });
    const second = applyBid(first, { bidderId: 'b', ceilingMinor: 520_000 });
    expect(second).toMatchObject({ priceMinor: 525_000, leaderId: 'a' });
    const third = applyBid(second, { bidderId: 'b', ceilingMinor: 700_000 });
    expect(third).toMatchObject({ priceMinor: 625_000, leaderId: 'b', leaderCeilingMinor: 700_000 });
  });

  test('equal ceilings: the earlier leads, at the ceiling', () => {
    const one = applyBid(fresh(1000), { bidderId: 'a', ceilingMinor: 50_000 });
    expect(applyBid(one, { bidderId: 'b', ceilingMinor: 50_000 })).toMatchObject({ leaderId: 'a', priceMinor: 50_000 });
  });

  test('an own raise leaves the price, unless it reaches the reserve', () => {
    const one = applyBid(fresh(1000, 9000), { bidderId: 'a', ceilingMinor: 5000 });
    const two = applyBid(one, { bidderId: 'a', ceilingMinor: 8999 });
    expect(two).toMatchObject({ priceMinor: 1000 });
    expect(reserveReached(two)).toBe(false);
    const three = applyBid(two, { bidderId: 'a', ceilingMinor: 9500 });
    expect(three).toMatchObject({ priceMinor: 9000, leaderCeilingMinor: 9500 });
    expect(reserveReached(three)).toBe(true);
    expect(leastNextMinor(three, 'a')).toBe(9501);
    expect(leastNextMinor(three, 'b')).toBe(9100);
  });

  test('invariants over any run of bids', () => {
    const bid = fc.record({
      bidderId: fc.constantFrom('a', 'b', 'c', 'd'),
      ceilingMinor: fc.integer({ min: 1, max: 60_000 }),
    });
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 20_000 }),
        fc.option(fc.integer({ min: 1, max: 50_000 })),
        fc.array(bid, { maxLength: 30 }),
        (start, reserve, bids) => {
          let auction = fresh(start, reserve);
          const ceilings = new Map<string, number>();
          for (const one of bids) {
            if (one.ceilingMinor < leastNextMinor(auction, one.bidderId)) continue;
            const before = auction.priceMinor ?? 0;
            auction = applyBid(auction, one);
            ceilings.set(one.bidderId, Math.max(ceilings.get(one.bidderId) ?? 0, one.ceilingMinor));
            const next = Math.max(
              0,
              ...[...ceilings].filter(([id]) => id !== auction.leaderId).map(([, value]) => value),
            );
            expect(auction.priceMinor!).toBeGreaterThanOrEqual(before);
            expect(auction.priceMinor!).toBeLessThanOrEqual(auction.leaderCeilingMinor!);
            expect(auction.priceMinor!).toBeLessThanOrEqual(Math.max(start, next + stepMinor(next), reserve ?? 0));
            expect(auction.leaderCeilingMinor).toBe(Math.max(...ceilings.values()));
          }
        },
      ),
    );
  });
});

test('without the defaulter the next bidder is asked for what beats the rest, never more than the own ceiling', () => {
  const bids = [
    { bidderId: 'b', ceilingMinor: 5000 },
    { bidderId: 'c', ceilingMinor: 7000 },
  ];
  expect(replay({ startMinor: 1000, reserveMinor: null }, bids)).toMatchObject({ leaderId: 'c', priceMinor: 5050 });
  expect(replay({ startMinor: 1000, reserveMinor: null }, bids.slice(0, 1))).toMatchObject({
    leaderId: 'b',
    priceMinor: 1000,
  });
  expect(replay({ startMinor: 1000, reserveMinor: null }, [])).toMatchObject({ leaderId: null });
});

describe('late-bid extension', () => {
  const closesAt = new Date('2026-03-05T15:00:00Z');
  const latestClosesAt = new Date('2026-03-05T17:00:00Z');
  const after = (at: string, changed = true) =>
    closeAfterBid({ at: new Date(at), closesAt, latestClosesAt, changed }).toISOString();

  test('moves the close to five minutes after a late bid that changes something', () => {
    expect(after('2026-03-05T14:57:00Z')).toBe('2026-03-05T15:02:00.000Z');
    expect(after('2026-03-05T14:57:00Z', false)).toBe('2026-03-05T15:00:00.000Z');
    expect(after('2026-03-05T14:54:59Z')).toBe('2026-03-05T15:00:00.000Z');
  });

  test('never past the latest close', () => {
    const late = closeAfterBid({
      at: new Date('2026-03-05T16:58:00Z'),
      closesAt: new Date('2026-03-05T16:59:00Z'),
      latestClosesAt,
      changed: true,
    });
    expect(late).toEqual(latestClosesAt);
  });
});

test('the least next bid never passes the largest amount', () => {
  const top = { ...fresh(100), priceMinor: 99_500_000, leaderId: 'a', leaderCeilingMinor: 99_999_999 };
  expect(leastNextMinor(top, 'a')).toBe(99_999_999);
  expect(leastNextMinor(top, 'b')).toBe(99_999_999);
});
