import fc from 'fast-check';
import { expect, test } from 'vitest';
import { massShortAdjustment } from '../money/mass-short-adjustment.ts';
import { claimValue, type ClaimGround } from './claim-value.ts';

const priceMinor = 100_000;
const short: ClaimGround = { kind: 'mass', declaredG: 10_000, foundG: 9000, resolutionG: 5, estimateShare: 0.4 };

test.each([
  ['a tenth short of two fifths of the gold', short, 4000],
  ['a mass within tolerance', { ...short, foundG: 9951 }, 0],
  ['30 of 40 pieces', { kind: 'count', stated: 40, found: 30, estimateShare: 1 }, 25_000],
  ['more pieces than stated', { kind: 'count', stated: 40, found: 50, estimateShare: 1 }, 0],
  ['half the plating on a part', { kind: 'plating', statedUm: 0.8, foundUm: 0.4, estimateShare: 0.5 }, 25_000],
  ['a class of a third the gold', { kind: 'class', statedG: 6, foundG: 2, estimateShare: 0.3 }, 20_000],
  ['a better class', { kind: 'class', statedG: 6, foundG: 7, estimateShare: 0.3 }, 0],
  ['7.2 g where 8 g were the least', { kind: 'least-content', statedG: 8, foundG: 7.2 }, 10_000],
  ['nothing arrived', { kind: 'not-arrived' }, 100_000],
] as [string, ClaimGround, number][])('%s', (_words, ground, changeMinor) => {
  const { grounds, adjustmentMinor } = claimValue(priceMinor, [ground]);
  expect(grounds[0]?.changeMinor).toBe(changeMinor);
  expect(adjustmentMinor).toBe(changeMinor);
});

test('a hazard’s cost is shown and left to the desk', () => {
  const claim = claimValue(priceMinor, [short, { kind: 'hazard', costMinor: 12_000 }]);
  expect(claim).toMatchObject({ adjustmentMinor: 4000, hazardMinor: 12_000 });
  expect(claim.grounds[1]).toEqual({ kind: 'hazard', loss: 0, changeMinor: 12_000 });
});

test('all grounds together never take more than the price', () => {
  expect(claimValue(priceMinor, [short, { kind: 'not-arrived' }]).adjustmentMinor).toBe(priceMinor);
});

test('mass alone is what the weigh-in would take', () => {
  const grams = fc.integer({ min: 1, max: 1_000_000 });
  fc.assert(
    fc.property(grams, grams, fc.double({ min: 0, max: 1, noNaN: true }), (declaredG, foundG, estimateShare) => {
      const weighed = { declaredG, foundG, estimateShare, resolutionG: 5 };
      expect(claimValue(priceMinor, [{ kind: 'mass', ...weighed }]).adjustmentMinor).toBe(
        massShortAdjustment(priceMinor, [weighed]),
      );
    }),
  );
});

test('a figure out of range is refused by name', () => {
  expect(() => claimValue(-1, [])).toThrow('priceMinor');
  expect(() => claimValue(1, [{ kind: 'count', stated: 0, found: 0, estimateShare: 1 }])).toThrow('stated');
  expect(() => claimValue(1, [{ kind: 'hazard', costMinor: 0.5 }])).toThrow('costMinor');
});
