import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { line } from '../lot/line.fixture.ts';
import { simulateLot } from '../lot/simulate-lot.ts';
import { defaultTerms, type BuyerTerms } from './buyer-terms.ts';
import { valueLot } from './value-lot.ts';

const market = { pricePerGMinor: 10_300 };
const lines = [
  line({ massG: 40_000 }),
  line({ id: 'b', classCode: 'package-tops', massG: 900, massEvidence: 'stated' }),
];
const draws = simulateLot({ lines }, catalogue20261, { seed: 3 });
const value = (terms: Partial<BuyerTerms> = {}) => valueLot(draws, { ...defaultTerms, ...terms }, market);
const bid = fc.integer({ min: 0, max: 2_000_000 });

/** Two grams or four, a kilogram, by figures easy to reckon by hand. */
const byHand: BuyerTerms = {
  ...defaultTerms,
  recoveryYield: 0.9,
  accountableShare: 1,
  minimumDeductionG: 0.1,
  priceHaircut: 0.01,
  refiningPerGMinor: 100,
  treatmentPerKgMinor: 50,
  processingPerKgMinor: 300,
  batchCostMinor: 1000,
  freightMinor: 500,
  assayCostMinor: 200,
  buyerFeeShare: 0.02,
  daysToCash: 365,
  annualCostOfMoney: 0.25,
  margin: 0.1,
  wantedChance: 0.5,
  winnersCurse: false,
};
const two = { goldG: Float64Array.of(2, 4), massG: Float64Array.of(1000, 1000) };

describe('by hand', () => {
  const valued = valueLot(two, byHand, { pricePerGMinor: 10_000 });
  // 2 g: payable 1.7 g · (9 900 − 100) − 50 = 16 610; / 1.25 = 13 288; less 300 + 1 700 = 11 288.
  // 4 g: payable 3.5 g · 9 800 − 50 = 34 250; / 1.25 = 27 400; less 2 000 = 25 400.
  test('the value before the purchase, and the profit after it', () => {
    expect(valued.netMeanMinor).toBeCloseTo((11_288 + 25_400) / 2, 9);
    expect(valued.expectedProfitMinor(10_000)).toBeCloseTo(18_344 - 10_200, 9);
    expect(valued.profitQuantilesMinor(10_000).p50).toBeCloseTo(18_344 - 10_200, 9);
  });

  test('the highest safe bid is the smaller of what chance and margin allow', () => {
    expect(valued.highestSafeBidMinor).toBe(Math.floor(18_344 / 1.12));
    const sure = valueLot(two, { ...byHand, wantedChance: 1 }, { pricePerGMinor: 10_000 });
    expect(sure.highestSafeBidMinor).toBe(Math.floor(11_288 / 1.02));
  });

  test('a bid of 10 000 breaks even at 1.8458 g', () => {
    // (10 200 + 2 000) · 1.25 + 50 = 15 300; / 9 800 = 1.561224 g payable; + 0.1, / 0.9.
    expect(valued.breakEvenGoldG(10_000)).toBeCloseTo(1.845805, 6);
    expect(valued.breakEvenGradeGPerT(10_000)).toBeCloseTo(1845.805, 3);
    // Mean payable 2.6 g: 15 300 / 2.6 = 5 884.615; + 100, / 0.99.
    expect(valued.breakEvenPricePerGMinor(10_000)).toBeCloseTo(6045.066, 3);
  });

  test('the chance counts the draws that do not lose', () => {
    expect([0, 11_000, 11_067, 24_000, 25_000].map(valued.chanceOfProfit)).toEqual([1, 1, 0.5, 0.5, 0]);
  });
});

describe('the highest safe bid', () => {
  test('keeps the wanted chance, and one unit more would not keep both', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 1, noNaN: true }),
        fc.double({ min: 0, max: 0.6, noNaN: true }),
        (wantedChance, margin) => {
          const valued = value({ wantedChance, margin });
          const safe = valued.highestSafeBidMinor;
          if (safe === null) {
            expect(valued.chanceOfProfit(0)).toBeLessThan(wantedChance);
            return;
          }
          const keeps = (amount: number) =>
            valued.chanceOfProfit(amount) >= wantedChance &&
            valued.expectedProfitMinor(amount) >= margin * amount - 1e-6;
          expect(keeps(safe)).toBe(true);
          expect(keeps(safe + 1)).toBe(false);
        },
      ),
      { numRuns: 60 },
    );
  });

  test('rises with recovery, share, chance given up and price, and falls with every cost', () => {
    const base = value().highestSafeBidMinor as number;
    const safe = (terms: Partial<BuyerTerms>) => value(terms).highestSafeBidMinor as number;
    expect(safe({ recoveryYield: 0.95 })).toBeGreaterThan(base);
    expect(safe({ accountableShare: 0.98 })).toBeGreaterThan(base);
    expect(safe({ wantedChance: 0.6 })).toBeGreaterThan(base);
    expect(safe({ winnersCurse: false })).toBeGreaterThan(base);
    expect(valueLot(draws, defaultTerms, { pricePerGMinor: 11_000 }).highestSafeBidMinor).toBeGreaterThan(base);
    for (const cost of [
      'minimumDeductionG',
      'refiningPerGMinor',
      'treatmentPerKgMinor',
      'processingPerKgMinor',
    ] as const) {
      expect(safe({ [cost]: defaultTerms[cost] + 1 })).toBeLessThan(base);
    }
    for (const cost of ['batchCostMinor', 'freightMinor', 'assayCostMinor'] as const) {
      expect(safe({ [cost]: defaultTerms[cost] + 1000 })).toBeLessThan(base);
    }
    expect(safe({ priceHaircut: 0.02 })).toBeLessThan(base);
    expect(safe({ buyerFeeShare: 0.03 })).toBeLessThan(base);
    expect(safe({ daysToCash: 90 })).toBeLessThan(base);
    expect(safe({ rivals: 6 })).toBeLessThan(base);
  });

  test('is null when the costs alone eat the lot', () => {
    expect(value({ batchCostMinor: 50_000_000 }).highestSafeBidMinor).toBeNull();
  });
});

test('the chance of profit never rises with the bid', () => {
  const valued = value();
  fc.assert(
    fc.property(bid, bid, (a, b) => {
      expect(valued.chanceOfProfit(Math.max(a, b))).toBeLessThanOrEqual(valued.chanceOfProfit(Math.min(a, b)));
    }),
  );
});

test('the steps add up to the cent, to the expected profit', () => {
  const valued = value({ minimumDeductionG: 0.1, treatmentPerKgMinor: 33 });
  fc.assert(
    fc.property(bid, (amount) => {
      const { rows, profit } = valued.steps(amount);
      expect(rows.reduce((sum, { amountMinor }) => sum + amountMinor, 0)).toBe(profit.amountMinor);
      expect(Math.abs(profit.amountMinor - valued.expectedProfitMinor(amount))).toBeLessThanOrEqual(0.5 + 1e-6);
      expect(rows.every(({ amountMinor }) => Number.isInteger(amountMinor) && amountMinor !== 0)).toBe(true);
      expect(rows[0]).toMatchObject({ key: 'contained' });
    }),
  );
});

test('at the break-even price the expected profit is nothing', () => {
  const [amount, valued] = [300_000, value()];
  const pricePerGMinor = valued.breakEvenPricePerGMinor(amount) as number;
  expect(valueLot(draws, defaultTerms, { pricePerGMinor }).expectedProfitMinor(amount)).toBeCloseTo(0, 4);
});

test('about as many draws lie above the break-even gold as the chance of profit says', () => {
  const valued = value();
  const breakEvenG = valued.breakEvenGoldG(300_000) as number;
  const above = draws.goldG.filter((gold) => gold >= breakEvenG).length / draws.draws;
  expect(above).toBeCloseTo(valued.chanceOfProfit(300_000), 2);
});

test('what can never break even has no break-even point', () => {
  expect(value({ recoveryYield: 0 }).breakEvenGoldG(1)).toBeNull();
  expect(value({ recoveryYield: 0 }).breakEvenPricePerGMinor(1)).toBeNull();
  expect(value({ priceHaircut: 1 }).breakEvenGradeGPerT(1)).toBeNull();
  const nothing = simulateLot({ lines: [] }, catalogue20261, { seed: 1, draws: 100 });
  expect(valueLot(nothing, defaultTerms, market).breakEvenGradeGPerT(1)).toBeNull();
});

test.each([
  [{ recoveryYield: 1.1 }, 'terms.recoveryYield'],
  [{ freightMinor: -1 }, 'terms.freightMinor'],
  [{ wantedChance: 0 }, 'terms.wantedChance'],
  [{ rivals: 1.5 }, 'terms.rivals'],
  [{ tau: Number.NaN }, 'terms.tau'],
] as [Partial<BuyerTerms>, string][])('terms out of range are refused by name: %o', (terms, name) => {
  expect(() => value(terms)).toThrow(name);
});

test('a price or a bid out of range is refused by name', () => {
  expect(() => valueLot(draws, defaultTerms, { pricePerGMinor: 0 })).toThrow('market.pricePerGMinor');
  expect(() => value().chanceOfProfit(-1)).toThrow('bidMinor');
});
