import { describe, expect, it } from 'vitest';
import { bidStepMinor } from './bid-step.ts';
import { holdFor } from './hold.ts';
import { mostParam, readMost } from './most-param.ts';

describe('one bid step', () => {
  it.each([
    [0, 1],
    [125, 1],
    [126, 2],
    [240_000, 2000],
    [250_001, 5000],
    [620_000, 5000],
    [630_000, 10_000],
  ])('at %i is %i', (amountMinor, step) => expect(bidStepMinor(amountMinor)).toBe(step));
});

describe('the hold', () => {
  it('is price, freight and the fee rounded half to even', () => {
    expect(holdFor(620_000, { freightMinor: 6000, buyerFeeBp: 200 })).toEqual({
      priceMinor: 620_000,
      freightMinor: 6000,
      feeMinor: 12_400,
      totalMinor: 638_400,
    });
    expect(holdFor(125, { freightMinor: 0, buyerFeeBp: 200 }).feeMinor).toBe(2);
    expect(holdFor(175, { freightMinor: 0, buyerFeeBp: 200 }).feeMinor).toBe(4);
  });
});

describe('an amount in an address', () => {
  it.each([1, 242_000, 620_050, 99_999_999])('comes back as %i', (amountMinor) =>
    expect(readMost(new URLSearchParams(mostParam(amountMinor)))).toBe(amountMinor),
  );

  it.each(['', 'most=', 'most=lots', 'most=-5', 'most=1e9'])('is none in "%s"', (search) =>
    expect(readMost(new URLSearchParams(search))).toBeNull(),
  );
});
