import { expect, test } from 'vitest';
import { inLockOrder, kindOfAccount } from './ledger.rules.ts';

test('each account has its side, and what is owed to others cannot fall below nought', () => {
  expect(kindOfAccount('asset.processor')).toEqual({ normal: 'D', minZero: false });
  expect(kindOfAccount('hold.deal:D-1001')).toEqual({ normal: 'C', minZero: true });
  expect(kindOfAccount('clearing.refund:D-1001')).toEqual({ normal: 'C', minZero: true });
  expect(kindOfAccount('income.fee')).toEqual({ normal: 'C', minZero: false });
});

test.each(['asset.procesor', 'hold.deal:', 'hold.deal', 'income.fee:1', 'x.income.fee'])(
  '%s opens no account',
  (code) => {
    expect(() => kindOfAccount(code)).toThrow(RangeError);
  },
);

test('the accounts everybody uses are locked last', () => {
  const codes = ['asset.processor', 'payable.seller:b', 'income.fee', 'hold.deal:D-1'].map((account) => ({ account }));
  expect(inLockOrder(codes).map(({ account }) => account)).toEqual([
    'hold.deal:D-1',
    'payable.seller:b',
    'income.fee',
    'asset.processor',
  ]);
});
