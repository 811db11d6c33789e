import fc from 'fast-check';
import { expect, test } from 'vitest';
import { netToSeller } from './net-to-seller.ts';
import { shareOf } from './share-of.ts';

const fees = { sellerFeeShare: 0.04, taxShare: 0, freightMinor: 0 };

test('a price of 4 210.00 with 35.00 freight leaves 4 076.60 without tax and 4 042.92 at 20 %', () => {
  expect(netToSeller(421_000, { ...fees, freightMinor: 3500 })).toEqual({
    priceMinor: 421_000,
    freightMinor: 3500,
    feeMinor: 16_840,
    taxMinor: 0,
    netMinor: 407_660,
  });
  expect(netToSeller(421_000, { ...fees, freightMinor: 3500, taxShare: 0.2 }).netMinor).toBe(404_292);
});

test('halves go to the even side', () => {
  expect(shareOf(50, 0.01)).toBe(0);
  expect(shareOf(150, 0.01)).toBe(2);
  expect(shareOf(250, 0.01)).toBe(2);
  // In binary 1.005 · 100 falls short of the half it is.
  expect(shareOf(1005, 0.1)).toBe(100);
  expect(shareOf(1015, 0.1)).toBe(102);
});

test('the parts add up, and never more than came in goes out', () => {
  const amount = fc.integer({ min: 0, max: 99_999_999 });
  const share = fc.integer({ min: 0, max: 10_000 }).map((basisPoints) => basisPoints / 10_000);
  fc.assert(
    fc.property(amount, amount, share, share, (priceMinor, freightMinor, sellerFeeShare, taxShare) => {
      const { feeMinor, taxMinor, netMinor } = netToSeller(priceMinor, { sellerFeeShare, taxShare, freightMinor });
      expect(netMinor + feeMinor + taxMinor).toBe(priceMinor + freightMinor);
      expect(Math.abs(feeMinor - priceMinor * sellerFeeShare)).toBeLessThanOrEqual(0.5 + 1e-6);
    }),
  );
});

test('amounts that are not whole minor units and shares above one are refused by name', () => {
  expect(() => netToSeller(10.5, fees)).toThrow('priceMinor must be whole minor units');
  expect(() => netToSeller(-1, fees)).toThrow('priceMinor');
  expect(() => netToSeller(100, { ...fees, freightMinor: 0.1 })).toThrow('freightMinor');
  expect(() => netToSeller(100, { ...fees, sellerFeeShare: 1.1 })).toThrow('share');
});
