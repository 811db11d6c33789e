import { expect, test } from 'vitest';
import { createWords, massWords, rateWords } from './words.ts';

const plain = (text: string): string => text.replaceAll('\u00a0', ' ');

test('masses are printed to the milligram, in the unit one would weigh them in', () => {
  expect([0.001, 412.5, 12_400, 14_500.5, -1_500.5, -20].map((massG) => plain(massWords(massG)))).toEqual([
    '0.001 g',
    '412.5 g',
    '12.4 kg',
    '14.5005 kg',
    '−1.5005 kg',
    '−20 g',
  ]);
});

test('rates and amounts, and moments in the market’s zone', () => {
  const words = createWords({ zone: 'Europe/Vienna', currency: 'USD' });
  expect([400, 250, 7].map((bp) => plain(rateWords(bp)))).toEqual(['4 %', '2.5 %', '0.07 %']);
  expect(words.money(123_450)).toBe('$1,234.50');
  expect(words.moment(new Date('2026-12-03T17:00:00Z'))).toBe('Thu 3 Dec, 18:00 CET');
  expect(words.date(new Date('2026-07-03T16:00:00Z'))).toBe('3 Jul 2026, 18:00 CEST');
});
