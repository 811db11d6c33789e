import type { MyBidRow } from '@lydite/contracts';
import { formatMoney } from '@lydite/ui';
import { describe, expect, it } from 'vitest';
import { groupOf } from './bid-groups.ts';
import { bidProblem } from './bid-problem.ts';

const money = (amountMinor: number) => formatMoney(amountMinor, 'USD');
const check = { leastNextMinor: 242_000, leadingMinor: null, roomMinor: 400_000, money };

describe('an amount to bid', () => {
  it.each([
    [null, 'Enter the most you would pay, such as 6,200'],
    [241_999, 'The next bid starts at $2,420'],
    [400_001, 'Your limit has room for $4,000'],
    [242_000, null],
    [400_000, null],
  ])('%s: %s', (amountMinor, words) => expect(bidProblem({ ...check, amountMinor })).toBe(words));

  it('has to be more than the own ceiling while that leads', () => {
    const leading = { ...check, leadingMinor: 300_000, leastNextMinor: 300_001 };
    expect(bidProblem({ ...leading, amountMinor: 300_000 })).toContain('already lead with up to $3,000');
    expect(bidProblem({ ...leading, amountMinor: 300_001 })).toBeNull();
  });
});

describe('own bids', () => {
  const row: MyBidRow = {
    lotCode: 'L-2481',
    title: 'Server memory',
    coverPhotoId: null,
    lotState: 'open',
    standing: 'outbid',
    ceilingMinor: 200_000,
    priceMinor: 240_000,
    leastNextMinor: 242_000,
    closesAt: '2026-12-03T15:00:00.000Z',
    dealCode: null,
    dealState: null,
    offer: null,
  };
  const won = { ...row, lotState: 'awarded', standing: 'highest', leastNextMinor: null, dealCode: 'D-1' } as const;

  it.each<[string, Partial<MyBidRow>, string]>([
    ['an open lot led by another', row, 'outbid'],
    ['an open lot led', { ...row, standing: 'highest' }, 'highest'],
    ['a frozen lot led', { ...row, standing: 'highest', lotState: 'frozen', leastNextMinor: null }, 'highest'],
    ['a lot past its close', { ...row, leastNextMinor: null }, 'over'],
    ['an unpaid award', { ...won, dealState: 'awaiting_payment' }, 'answer'],
    ['a paid award', { ...won, dealState: 'held' }, 'over'],
    ['an offer', { ...row, lotState: 'offered', offer: { priceMinor: 1, answerBy: row.closesAt } }, 'answer'],
    ['a lot lost', { ...row, lotState: 'awarded', leastNextMinor: null }, 'over'],
  ])('%s', (_, changes, group) => expect(groupOf({ ...row, ...changes })).toBe(group));
});
