import { expect, test } from 'vitest';
import { normalDensity, normalProbability } from '../quantity/normal-distribution.ts';
import { curseFactor } from './curse-factor.ts';

const terms = { winnersCurse: true, rivals: 3, tau: 0.12 };

test('three rivals and an error of 12 % take 11.6 % of the gold', () => {
  expect(curseFactor(terms)).toBeCloseTo(Math.exp(-0.12 * 1.02938), 5);
});

test('switched off, without rivals or without error nothing is taken', () => {
  expect(curseFactor({ ...terms, winnersCurse: false })).toBe(1);
  expect(curseFactor({ ...terms, rivals: 0 })).toBeCloseTo(1, 12);
  expect(curseFactor({ ...terms, tau: 0 })).toBe(1);
});

// The mean of exp(−tau · largest of n normals) itself, by the trapezoidal rule; the factor takes the exponential of the mean.
test.each([
  [3, 0.12, 0.005],
  [1, 0.12, 0.005],
  [9, 0.12, 0.005],
  [3, 0.25, 0.02],
])('with %i rivals and tau %s it is good to %s', (rivals, tau, within) => {
  const step = 0.01;
  let mean = 0;
  for (let x = -9; x <= 9; x += step) {
    mean += Math.exp(-tau * x) * (rivals + 1) * normalDensity(x) * normalProbability(x) ** rivals * step;
  }
  expect(Math.abs(curseFactor({ winnersCurse: true, rivals, tau }) / mean - 1)).toBeLessThan(within);
});
