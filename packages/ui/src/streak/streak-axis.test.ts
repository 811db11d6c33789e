import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bidAt, goldAt, goldTicks, gradeShare, gradeTicks, moneyTicks, streakAxisMaxG } from './streak-axis.ts';
import { lognormalEstimate } from './streak-fixtures.ts';

const money = { currency: 'USD', atZeroMinor: -36_300, perGMinor: 12_369 };

describe('the gram axis', () => {
  it('ends on a tick, at or past 1.1 times p99.5 and not far past it', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 1e5, noNaN: true }),
        fc.double({ min: 0.03, max: 1.2, noNaN: true }),
        (median, sigma) => {
          const one = lognormalEstimate(median, sigma);
          const maxG = streakAxisMaxG(one);
          const wanted = one.goldG.quantiles.p99_5 * 1.1;
          expect(maxG).toBeGreaterThanOrEqual(wanted * (1 - 1e-9));
          expect(maxG).toBeLessThan(wanted * 1.25);
          expect(goldTicks(maxG, 12).at(-1)).toBeCloseTo(maxG, 6);
        },
      ),
    );
  });
});

describe('the money axis', () => {
  it('maps a bid to gold and back', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 99_999_999 }), (amountMinor) => {
        expect(bidAt(goldAt(amountMinor, money), money)).toBeCloseTo(amountMinor, 3);
      }),
    );
  });
  it('never offers a negative bid', () => {
    expect(bidAt(0, money)).toBe(0);
    expect(moneyTicks(120, money, 14).every(({ amountMinor, goldG }) => amountMinor >= 0 && goldG > 0)).toBe(true);
  });
});

describe('the list’s axis', () => {
  it('leaves room between the figures of a phone’s stone', () => {
    const phonePx = 390;
    const figurePx = 50;
    const sparse = gradeTicks().filter(({ isSparse }) => isSparse);
    for (const [i, { share }] of sparse.slice(1).entries())
      expect((share - (sparse[i]?.share ?? 0)) * phonePx).toBeGreaterThan(figurePx);
  });
  it('keeps what lies outside at its ends', () => {
    expect(gradeShare(10)).toBe(0);
    expect(gradeShare(1)).toBe(0);
    expect(gradeShare(20_000)).toBe(1);
    expect(gradeShare(50_000)).toBe(1);
  });
});
