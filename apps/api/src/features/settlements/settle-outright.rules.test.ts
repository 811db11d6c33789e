import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { feeMinor } from '../../platform/fee-minor.ts';
import { holdOf, settleOutright } from './settle-outright.rules.ts';

const rate = fc.integer({ min: 0, max: 2500 });
const deal = fc
  .record({
    priceMinor: fc.integer({ min: 1, max: 50_000_000 }),
    part: fc.double({ min: 0, max: 1, noNaN: true }),
    freightMinor: fc.integer({ min: 0, max: 1_000_000 }),
    buyerFeeBp: rate,
    sellerFeeBp: rate,
    buyerTaxBp: rate,
    sellerTaxBp: rate,
  })
  .map(({ part, ...rest }) => ({
    ...rest,
    adjustmentMinor: Math.round(part * rest.priceMinor),
    paidInMinor: holdOf(rest),
  }));

describe('an outright settlement', () => {
  test('divides the hold to the cent, and nobody gets less than nothing', () => {
    fc.assert(
      fc.property(deal, (one) => {
        const { valueMinor, ...parts } = settleOutright(one);
        expect(Object.values(parts).reduce((sum, part) => sum + part, 0)).toBe(one.paidInMinor);
        expect(Math.min(valueMinor, ...Object.values(parts))).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 2000 },
    );
  });

  test('a larger adjustment never gives the seller more or the buyer less', () => {
    fc.assert(
      fc.property(deal, fc.integer({ min: 0, max: 10_000 }), (one, more) => {
        const adjustmentMinor = Math.min(one.priceMinor, one.adjustmentMinor + more);
        const [before, after] = [settleOutright(one), settleOutright({ ...one, adjustmentMinor })];
        expect(after.sellerGetsMinor).toBeLessThanOrEqual(before.sellerGetsMinor);
        expect(after.refundMinor).toBeGreaterThanOrEqual(before.refundMinor);
      }),
    );
  });

  test('without a claim nothing goes back', () => {
    fc.assert(fc.property(deal, (one) => settleOutright({ ...one, adjustmentMinor: 0 }).refundMinor === 0));
  });

  test('a lot worth nothing: the buyer has all back but the freight, the fees are nought', () => {
    const terms = { priceMinor: 90_000, freightMinor: 1_450, buyerFeeBp: 200, buyerTaxBp: 2000 };
    const figures = settleOutright({
      ...terms,
      adjustmentMinor: 90_000,
      sellerFeeBp: 400,
      sellerTaxBp: 0,
      paidInMinor: holdOf(terms),
    });
    expect(figures).toMatchObject({ valueMinor: 0, buyerFeeMinor: 0, sellerFeeMinor: 0, sellerGetsMinor: 1_450 });
    expect(figures.refundMinor).toBe(90_000 + 1_800 + 360);
  });

  test('fees are rounded half even, as in the worked example of the market’s rules', () => {
    expect(feeMinor(75_549, 400)).toBe(3_022);
    expect(feeMinor(75_549, 200)).toBe(1_511);
    expect([25, 75, 125].map((amountMinor) => feeMinor(amountMinor, 200))).toEqual([0, 2, 2]);
  });

  test('a hold that is too small is refused, not made up', () => {
    expect(() =>
      settleOutright({
        priceMinor: 1000,
        adjustmentMinor: 0,
        freightMinor: 0,
        buyerFeeBp: 200,
        sellerFeeBp: 400,
        buyerTaxBp: 0,
        sellerTaxBp: 0,
        paidInMinor: 1019,
      }),
    ).toThrow(RangeError);
  });
});
