import { expect, test } from 'vitest';
import { massShortAdjustment } from './mass-short-adjustment.ts';

const lines = (estimateShare: number, declaredG: number, foundG: number) => ({
  estimateShare,
  declaredG,
  foundG,
  resolutionG: 10,
});

test('a lot one tenth short costs a tenth of its price', () => {
  expect(massShortAdjustment(421_000, [lines(1, 20_000, 18_000)])).toBe(42_100);
});

test('each weighing takes by its share of the estimate, and an excess elsewhere gives nothing back', () => {
  expect(massShortAdjustment(100_000, [lines(0.7, 10_000, 8000), lines(0.3, 5000, 6000)])).toBe(14_000);
});

test('within the tolerance nothing comes off', () => {
  expect(massShortAdjustment(100_000, [lines(1, 10_000, 9960)])).toBe(0);
});

test('the half goes to the even side, once at the end', () => {
  // 0.25 · 0.1 of 500 is 12.5; of 540 it is 13.5.
  expect(massShortAdjustment(500, [lines(0.25, 10_000, 9000)])).toBe(12);
  expect(massShortAdjustment(540, [lines(0.25, 10_000, 9000)])).toBe(14);
});

test('never more than the price, even if the shares were to overlap', () => {
  expect(massShortAdjustment(1000, [lines(0.8, 10_000, 0), lines(0.8, 10_000, 0)])).toBe(1000);
});

test('a share above one is refused', () => {
  expect(() => massShortAdjustment(1000, [lines(1.5, 10_000, 0)])).toThrow('estimateShare');
});
