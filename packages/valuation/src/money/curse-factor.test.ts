import { expect, test } from 'vitest';
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
