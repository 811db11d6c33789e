import { catalogue20261, estimateLot } from '@lydite/valuation';
import { expect, test } from 'vitest';
import { kilogram } from './published/kilogram.ts';

const grades = (classCode: string) =>
  estimateLot({ lines: [kilogram(classCode)] }, catalogue20261, { seed: 1 }).gradeGPerT;

test('copper-wired chips at 1 g/t (maker’s declaration) lie outside the class of gold-wired ones', () => {
  expect(grades('plastic-chips').p01).toBeGreaterThan(1);
});

test('high-grade boards begin at 100 g/t (Chancerel 2010): low-grade boards lie below, named kinds above', () => {
  expect(grades('low-grade-boards').p50).toBeLessThan(100);
  for (const code of ['desktop-boards', 'notebook-boards', 'network-boards', 'phone-boards', 'drive-boards']) {
    expect(grades(code).p50).toBeGreaterThan(100);
  }
});
