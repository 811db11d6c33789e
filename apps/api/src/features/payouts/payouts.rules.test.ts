import { expect, test } from 'vitest';
import { isNews, requirementWords } from './payouts.rules.ts';

test('a payout moves only forward, and a failure after success is news', () => {
  expect(isNews(null, 'paid')).toBe(true);
  expect(isNews('in_transit', 'paid')).toBe(true);
  expect(isNews('paid', 'in_transit')).toBe(false);
  expect(isNews('paid', 'paid')).toBe(false);
  expect(isNews('paid', 'failed')).toBe(true);
  expect(isNews('failed', 'paid')).toBe(false);
});

test('what the processor still asks for is said once and in words', () => {
  expect(requirementWords(['tos_acceptance.date', 'tos_acceptance.ip', 'external_account', 'novel.thing'])).toEqual([
    'Agreement with the payment processor',
    'Bank account for payouts',
    'Further details',
  ]);
});
