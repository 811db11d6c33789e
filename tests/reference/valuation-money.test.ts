import { defaultTerms, expectedLargestNormal, valueLot } from '@lydite/valuation';
import { expect, test } from 'vitest';

// H. L. Harter, Biometrika 48 (1961) 151–165; also half of d₂ for 2 in control-chart tables.
test.each([
  [2, 0.564_19],
  [3, 0.846_28],
  [4, 1.029_38],
  [5, 1.162_96],
  [6, 1.267_21],
  [7, 1.352_18],
  [8, 1.4236],
  [9, 1.485_01],
  [10, 1.538_75],
])('the largest of %i standard normals is on average %s', (count, expected) => {
  expect(expectedLargestNormal(count)).toBeCloseTo(expected, 5);
});

/*
 * Net smelter return, Wills' Mineral Processing Technology, ch. 1 (from memory; the arithmetic recomputed), per tonne of ore:
 * 0.6 % metal, concentrate of 25 % at 85 % recovery (20.4 kg), price 980 a tonne, one unit deducted, treatment 30 a tonne of
 * concentrate, refining 115 a payable tonne: 4.798 − 0.612 − 0.563 = 3.62. Hundredths are minor units here.
 */
test('net smelter return of the textbook’s copper ore: 3.62 a tonne', () => {
  const concentrateG = 20_400;
  const one = { goldG: Float64Array.of(6000, 6000), massG: Float64Array.of(concentrateG, concentrateG) };
  const terms = {
    ...defaultTerms,
    recoveryYield: 0.85,
    accountableShare: 1,
    minimumDeductionG: 0.01 * concentrateG,
    priceHaircut: 0,
    treatmentPerKgMinor: 3,
    refiningPerGMinor: 0.0115,
    processingPerKgMinor: 0,
    batchCostMinor: 0,
    freightMinor: 0,
    assayCostMinor: 0,
    annualCostOfMoney: 0,
    winnersCurse: false,
  };
  const { netMeanMinor } = valueLot(one, terms, { pricePerGMinor: 0.098 });
  expect(netMeanMinor / 100).toBeCloseTo(4.798 - 0.612 - 0.563, 3);
  expect((netMeanMinor / 100).toFixed(2)).toBe('3.62');
});
