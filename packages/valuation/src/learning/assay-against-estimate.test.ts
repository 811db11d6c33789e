import fc from 'fast-check';
import { expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { estimateLot } from '../lot/estimate-lot.ts';
import { line } from '../lot/line.fixture.ts';
import { simulateLot } from '../lot/simulate-lot.ts';
import { assayAgainstEstimate } from './assay-against-estimate.ts';
import { coverageOf, reliabilityTable, wilsonRange } from './coverage.ts';
import { journalYield } from './journal-yield.ts';
import { rankIn } from './rank-in.ts';

const input = { lines: [line({ classCode: 'phone-boards', massG: 5000 })] };
const estimate = estimateLot(input, catalogue20261, { seed: 1 });
const { quantiles } = estimate.goldG;

test('an assay at the middle agrees in every way', () => {
  const verdict = assayAgainstEstimate(estimate, { assayG: quantiles.p50, relativeSd: 0.05 });
  expect(verdict).toMatchObject({ logRatio: 0, insideHalf: true, insideEighty: true, normalizedError: 0 });
  expect(verdict.rank).toBeCloseTo(0.5, 6);
});

test('each stored quantile has its own rank, and ranks never fall', () => {
  expect(rankIn(estimate, quantiles.p10)).toBeCloseTo(0.1, 12);
  expect(rankIn(estimate, quantiles.p90)).toBeCloseTo(0.9, 12);
  expect(rankIn(estimate, 0)).toBeCloseTo(0.0015, 12);
  expect(rankIn(estimate, quantiles.p99_85 * 2)).toBeCloseTo(0.9985, 12);
  const mass = fc.double({ min: 0, max: quantiles.p99_85, noNaN: true });
  fc.assert(
    fc.property(mass, mass, (a, b) => {
      expect(rankIn(estimate, Math.max(a, b))).toBeGreaterThanOrEqual(rankIn(estimate, Math.min(a, b)));
    }),
  );
});

test('an assay beyond what both uncertainties explain has an E_n beyond one', () => {
  const narrow = estimateLot(
    { lines: [line({ classCode: 'phone-boards', assay: { gradeGPerT: 500, relativeSd: 0.05 } })] },
    catalogue20261,
    { seed: 1 },
  );
  const verdict = assayAgainstEstimate(narrow, { assayG: 0.65, relativeSd: 0.05 });
  expect(verdict.normalizedError).toBeCloseTo(Math.log(1.3) / (2 * Math.hypot(0.05, 0.05)), 2);
  expect(verdict).toMatchObject({ insideHalf: false, insideEighty: false });
});

test('assays that come from the estimate itself are covered as they should be', () => {
  const truths = simulateLot(input, catalogue20261, { seed: 77, draws: 2000 }).goldG;
  const ranks = [...truths].map((massG) => rankIn(estimate, massG));
  const { insideHalf, insideEighty, halfRange, eightyRange } = coverageOf(ranks);
  expect(insideHalf / 2000).toBeCloseTo(0.5, 1);
  expect(insideEighty / 2000).toBeCloseTo(0.8, 1);
  expect(halfRange[0]).toBeLessThan(0.5);
  expect(eightyRange[1]).toBeGreaterThan(0.8);
  for (const { expected, observed } of reliabilityTable(ranks)) expect(observed).toBeCloseTo(expected, 1);
});

test('without outcomes nothing is known', () => {
  expect(coverageOf([])).toEqual({
    outcomes: 0,
    insideHalf: 0,
    insideEighty: 0,
    halfRange: [0, 1],
    eightyRange: [0, 1],
  });
  expect(reliabilityTable([])).toEqual([]);
  expect(() => coverageOf([1.5])).toThrow('ranks[0]');
});

test('a share of none or all still has a range', () => {
  expect(wilsonRange(0, 10)[0]).toBe(0);
  expect(wilsonRange(10, 10)[1]).toBe(1);
  expect(() => wilsonRange(3, 2)).toThrow('hits');
});

test('an assay of nothing, or an estimate of nothing, is refused', () => {
  expect(() => assayAgainstEstimate(estimate, { assayG: 0, relativeSd: 0.1 })).toThrow('assayG');
  const nothing = estimateLot({ lines: [] }, catalogue20261, { seed: 1, draws: 100 });
  expect(() => assayAgainstEstimate(nothing, { assayG: 1, relativeSd: 0.1 })).toThrow('p10');
});

const prior = { yield: 0.9, sd: 0.05, effectiveG: 10 };

test('the journal’s yield moves from the route’s to the buyer’s own as gold goes through', () => {
  expect(journalYield(prior, []).yield).toBeCloseTo(0.9, 12);
  expect(journalYield(prior, []).sd).toBeCloseTo(0.05, 12);
  const some = journalYield(prior, [{ containedG: 10, recoveredG: 8 }]);
  expect(some.yield).toBeCloseTo(0.85, 12);
  expect(some.ownShare).toBe(0.5);
  const much = journalYield(prior, [{ containedG: 1000, recoveredG: 800 }]);
  expect(much.yield).toBeCloseTo(0.801, 3);
  expect(much.sd).toBeLessThan(some.sd);
});

test('a yield lies between the route’s and the own one, and how batches are split does not matter', () => {
  const mass = fc.double({ min: 0.01, max: 100, noNaN: true });
  fc.assert(
    fc.property(mass, mass, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, own) => {
      const batches = [a, b].map((containedG) => ({ containedG, recoveredG: containedG * own }));
      const shrunk = journalYield(prior, batches);
      expect(shrunk.yield).toBeGreaterThanOrEqual(Math.min(0.9, own) - 1e-9);
      expect(shrunk.yield).toBeLessThanOrEqual(Math.max(0.9, own) + 1e-9);
      expect(journalYield(prior, [{ containedG: a + b, recoveredG: (a + b) * own }]).yield).toBeCloseTo(
        shrunk.yield,
        9,
      );
    }),
  );
});

test('a batch that gave more than was thought in it never makes a yield above one', () => {
  expect(journalYield(prior, [{ containedG: 100, recoveredG: 140 }])).toMatchObject({ yield: 1, sd: 0 });
  expect(() => journalYield(prior, [{ containedG: 0, recoveredG: 1 }])).toThrow('batches[0].containedG');
  expect(() => journalYield({ ...prior, sd: 0.4 }, [])).toThrow('prior.sd');
});
