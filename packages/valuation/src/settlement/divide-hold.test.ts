import fc from 'fast-check';
import { expect, test } from 'vitest';
import { divideHold, largestCoveredValue, type HoldDivision } from './divide-hold.ts';

const amount = fc.integer({ min: 0, max: 9_999_999 });
const share = fc.integer({ min: 0, max: 2500 }).map((bp) => bp / 10_000);
const anyDivision: fc.Arbitrary<HoldDivision> = fc.record({
  valueMinor: amount,
  freightMinor: fc.integer({ min: 0, max: 50_000 }),
  buyerFeeShare: share,
  sellerFeeShare: share,
  buyerTaxShare: share,
  sellerTaxShare: share,
  umpireBuyerMinor: fc.integer({ min: 0, max: 30_000 }),
  umpireSellerMinor: fc.integer({ min: 0, max: 30_000 }),
  buyerPaidInMinor: amount,
  sellerPaidInMinor: fc.integer({ min: 0, max: 30_000 }),
});

test('what comes in goes out, to the cent', () => {
  fc.assert(
    fc.property(anyDivision, (given) => {
      const d = divideHold(given);
      const comesIn = given.buyerPaidInMinor + given.sellerPaidInMinor + d.secondPaymentMinor + d.sellerDebtMinor;
      const fees = d.buyerFeeMinor + d.sellerFeeMinor + d.buyerTaxMinor + d.sellerTaxMinor;
      expect(d.sellerGetsMinor + fees + d.refundBuyerMinor + d.refundSellerMinor + d.umpireMinor).toBe(comesIn);
      expect(Object.values(d).every((minor) => Number.isSafeInteger(minor) && minor >= 0)).toBe(true);
    }),
  );
});

test('a hold as full payment is used up to the last cent that a fee allows', () => {
  fc.assert(
    fc.property(anyDivision, (given) => {
      const valueMinor = largestCoveredValue(given);
      if (valueMinor === null) {
        expect(divideHold({ ...given, valueMinor: 0 }).secondPaymentMinor).toBeGreaterThan(0);
        return;
      }
      expect(divideHold({ ...given, valueMinor }).secondPaymentMinor).toBe(0);
      expect(divideHold({ ...given, valueMinor: valueMinor + 1 }).secondPaymentMinor).toBeGreaterThan(0);
    }),
  );
});

test('an amount or share out of range is refused by name', () => {
  const [given] = fc.sample(anyDivision, 1) as [HoldDivision];
  expect(() => divideHold({ ...given, valueMinor: 1.5 })).toThrow('valueMinor');
  expect(() => divideHold({ ...given, sellerTaxShare: 2 })).toThrow('sellerTaxShare');
});
