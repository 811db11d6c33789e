import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { line } from '../lot/line.fixture.ts';
import { simulateLot } from '../lot/simulate-lot.ts';
import { defaultAssaySale, type AssaySale } from './assay-sale.ts';
import { defaultTerms, type BuyerTerms } from './buyer-terms.ts';
import { valueLot } from './value-lot.ts';
import { valueOnAssay } from './value-on-assay.ts';

const market = { pricePerGMinor: 10_300 };
const lines = [line({ massG: 40_000 }), line({ id: 'b', classCode: 'package-tops', massG: 900 })];
const draws = simulateLot({ lines }, catalogue20261, { seed: 3, draws: 2003 });
const value = (terms: Partial<BuyerTerms> = {}, sale: Partial<AssaySale> = {}) =>
  valueOnAssay(draws, { ...defaultTerms, ...terms }, market, { ...defaultAssaySale, ...sale });
const anyShare = fc.integer({ min: 0, max: 10_000 });

/** Two grams or four in a kilogram, by figures easy to reckon by hand. */
const byHand: BuyerTerms = {
  ...defaultTerms,
  recoveryYield: 0.9,
  accountableShare: 1,
  priceHaircut: 0,
  refiningPerGMinor: 0,
  processingPerKgMinor: 300,
  batchCostMinor: 0,
  freightMinor: 0,
  assayCostMinor: 0,
  buyerFeeShare: 0.02,
  annualCostOfMoney: 0,
  margin: 0.1,
  wantedChance: 0.5,
  winnersCurse: false,
};
const two = { goldG: Float64Array.of(2, 4), massG: Float64Array.of(1000, 1000) };
const sale = { minimumDeductionG: 0.1, treatmentPerKgMinor: 50, refiningPerGMinor: 100, freightMinor: 700 };

describe('by hand', () => {
  const valued = valueOnAssay(two, byHand, { pricePerGMinor: 10_000 }, sale);
  // At 50 %: 2 g: 1.9 · 9 900 · 0.5 − 50 = 9 355; 4 g: 3.9 · 9 900 · 0.5 − 50 = 19 255. Own return less costs: 17 000 and 35 000.
  test('purchase and profit', () => {
    expect(valued.expectedPurchaseMinor(5000)).toBeCloseTo((9355 + 19_255) / 2, 9);
    expect(valued.expectedProfitMinor(5000)).toBeCloseTo(26_000 - 14_305 * 1.02, 9);
    expect(valued.profitQuantilesMinor(5000).p50).toBeCloseTo(26_000 - 14_305 * 1.02, 9);
  });

  test('the highest safe share is the last that keeps the margin', () => {
    // 26 000 ≥ E[purchase] · 1.12, E[purchase] = p · 28 710 − 50: p ≤ (23 214.2857 + 50) / 28 710 = 0.81032.
    expect(valued.highestSafeShareBp).toBe(8103);
  });

  test('the break-even content of a share', () => {
    // 9 000 g − 300 − 700 = 1.02 · (0.8 · (g − 0.1) · 9 900 − 50): 921.6 g = 1000 − 51 − 807.84 = 141.16.
    expect(valued.breakEvenGoldG(8000)).toBeCloseTo(141.16 / 921.6, 9);
    expect(valued.breakEvenGradeGPerT(8000)).toBeCloseTo((141.16 / 921.6) * 1000, 6);
  });

  test('a share that pays more than comes back breaks even nowhere', () => {
    expect(valued.breakEvenGoldG(9500)).toBeNull();
    expect(valued.breakEvenPricePerGMinor(9500)).toBeNull();
    expect(valued.chanceOfProfit(9500)).toBe(0);
  });

  test('at the break-even price the expected profit is nothing', () => {
    const pricePerGMinor = valued.breakEvenPricePerGMinor(8000) as number;
    const there = valueOnAssay(two, byHand, { pricePerGMinor }, sale);
    expect(there.expectedProfitMinor(8000)).toBeCloseTo(0, 4);
  });
});

describe('the highest safe share', () => {
  test('keeps chance and margin, and a hundredth of a point more would not', () => {
    const anyTerms = fc.record({
      wantedChance: fc.double({ min: 0.05, max: 1, noNaN: true }),
      margin: fc.double({ min: 0, max: 0.6, noNaN: true }),
      batchCostMinor: fc.integer({ min: 0, max: 100_000 }),
    });
    fc.assert(
      fc.property(anyTerms, (terms) => {
        const valued = value(terms);
        const safe = valued.highestSafeShareBp;
        if (safe === null) {
          expect(valued.chanceOfProfit(0)).toBeLessThan(terms.wantedChance);
          return;
        }
        const keeps = (shareBp: number) =>
          valued.chanceOfProfit(shareBp) >= terms.wantedChance &&
          valued.expectedProfitMinor(shareBp) >= terms.margin * valued.expectedPurchaseMinor(shareBp) - 1e-6;
        expect(keeps(safe)).toBe(true);
        expect(safe === 10_000 || !keeps(safe + 1)).toBe(true);
      }),
      { numRuns: 40 },
    );
  });

  test('rises with the yield and with what the seller leaves, and falls with costs and rivals', () => {
    const base = value().highestSafeShareBp as number;
    expect(value({ recoveryYield: 0.95 }).highestSafeShareBp).toBeGreaterThan(base);
    expect(value({}, { minimumDeductionG: 2 }).highestSafeShareBp).toBeGreaterThan(base);
    expect(value({}, { refiningPerGMinor: 500 }).highestSafeShareBp).toBeGreaterThan(base);
    expect(value({ processingPerKgMinor: 400 }).highestSafeShareBp).toBeLessThan(base);
    expect(value({ rivals: 9 }).highestSafeShareBp).toBeLessThan(base);
    expect(value({}, { freightMinor: 20_000 }).highestSafeShareBp).toBeLessThan(base);
  });

  test('is null when the costs alone eat the lot, and whole when the costs are the seller’s', () => {
    expect(value({ batchCostMinor: 50_000_000 }).highestSafeShareBp).toBeNull();
    expect(value({}, { treatmentPerKgMinor: 50_000 }).highestSafeShareBp).toBe(10_000);
  });

  test('keeps a chance that no outright bid of the same middle keeps: what is paid moves with what is there', () => {
    const sharing = value({ winnersCurse: false });
    const outright = valueLot(draws, { ...defaultTerms, winnersCurse: false }, market);
    const purchase = sharing.expectedPurchaseMinor(7000);
    expect(sharing.chanceOfProfit(7000)).toBeGreaterThan(outright.chanceOfProfit(purchase));
  });
});

test('the chance of profit never rises with the share', () => {
  const valued = value();
  fc.assert(
    fc.property(anyShare, anyShare, (a, b) => {
      expect(valued.chanceOfProfit(Math.max(a, b))).toBeLessThanOrEqual(valued.chanceOfProfit(Math.min(a, b)));
    }),
  );
});

test('below the break-even content a share loses, above it gains', () => {
  const anySale = fc.record({
    minimumDeductionG: fc.double({ min: 0, max: 3, noNaN: true }),
    treatmentPerKgMinor: fc.double({ min: 0, max: 400, noNaN: true }),
    refiningPerGMinor: fc.double({ min: 0, max: 400, noNaN: true }),
    freightMinor: fc.integer({ min: 0, max: 20_000 }),
  });
  fc.assert(
    fc.property(anySale, anyShare, fc.double({ min: 0, max: 2, noNaN: true }), (of, shareBp, minimumDeductionG) => {
      const terms = { ...defaultTerms, minimumDeductionG };
      const at = (goldG: number) =>
        valueOnAssay(
          { goldG: Float64Array.of(goldG, goldG), massG: Float64Array.of(9000, 9000) },
          terms,
          market,
          of,
        ).expectedProfitMinor(shareBp);
      const content = valueOnAssay(
        { goldG: Float64Array.of(1), massG: Float64Array.of(9000) },
        terms,
        market,
        of,
      ).breakEvenGoldG(shareBp);
      if (content === null) {
        expect(at(1e6)).toBeLessThan(0);
        return;
      }
      expect(at(content)).toBeCloseTo(0, 3);
      expect(at(content * 0.999)).toBeLessThanOrEqual(1e-6);
    }),
  );
});

test('the steps add up to the cent, to the expected profit', () => {
  const valued = value({}, { freightMinor: 1234, treatmentPerKgMinor: 3 });
  fc.assert(
    fc.property(anyShare, (shareBp) => {
      const { rows, profit } = valued.steps(shareBp);
      expect(rows.reduce((sum, { amountMinor }) => sum + amountMinor, 0)).toBe(profit.amountMinor);
      expect(Math.abs(profit.amountMinor - valued.expectedProfitMinor(shareBp))).toBeLessThanOrEqual(0.5 + 1e-6);
    }),
  );
});

test('a share or a sale out of range is refused by name', () => {
  expect(() => value().chanceOfProfit(10_001)).toThrow('shareBp');
  expect(() => value({}, { freightMinor: -1 })).toThrow('sale.freightMinor');
});
