import { expect, test } from 'vitest';
import { nextKey } from './next-key.rules.ts';

test('counts attempts at the end of the key', () => {
  expect(nextKey('transfer:0c1d:create:1')).toBe('transfer:0c1d:create:2');
  expect(nextKey('refund:7:create:9')).toBe('refund:7:create:10');
  expect(() => nextKey('refund:7:create')).toThrow(RangeError);
});
