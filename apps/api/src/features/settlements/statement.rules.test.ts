import { expect, test } from 'vitest';
import { createWords } from '../../platform/words.ts';
import { settleOutright } from './settle-outright.rules.ts';
import { canonicalJson, hashOfStatement } from './statement-hash.rules.ts';
import { statementSteps } from './statement-steps.rules.ts';

const words = createWords({ zone: 'Europe/Vienna', currency: 'USD' });
const deal = {
  priceMinor: 90_000,
  adjustmentMinor: 9_000,
  freightMinor: 1_800,
  buyerFeeBp: 200,
  sellerFeeBp: 400,
  buyerTaxBp: 0,
  sellerTaxBp: 2000,
  paidInMinor: 93_600,
};

test('each side’s rows add up to its result', () => {
  const figures = settleOutright(deal);
  const { sellerSteps, buyerSteps } = statementSteps({ deal, figures, reason: 'Mass', words });
  const sum = (steps: typeof sellerSteps): number =>
    steps.filter(({ total }) => !total).reduce((all, { amountMinor }) => all + amountMinor, 0);
  expect(sum(sellerSteps)).toBe(figures.sellerGetsMinor);
  expect(sum(buyerSteps)).toBe(figures.refundMinor);
  expect(sellerSteps.map(({ label }) => label)).toContain('Tax on the fee');
  expect(buyerSteps.map(({ label }) => label)).not.toContain('Tax on the fee');
});

test('the record’s hash is of its content, whatever the order of its keys', () => {
  expect(canonicalJson({ b: [1, { d: 'x', c: null }], a: 2 })).toBe('{"a":2,"b":[1,{"c":null,"d":"x"}]}');
  expect(hashOfStatement({ a: 1, b: 2 })).toBe(hashOfStatement({ b: 2, a: 1 }));
  expect(hashOfStatement({ a: 1, b: 2 })).not.toBe(hashOfStatement({ a: 1, b: 3 }));
});
