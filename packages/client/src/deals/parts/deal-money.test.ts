import { describe, expect, it } from 'vitest';
import { someDeal } from '../deal.fixture.ts';
import { holdRows, moneyRows } from './deal-money.ts';
import type { MoneyRow } from './MoneyTable.tsx';

const sumAbove = (rows: MoneyRow[]) =>
  rows.filter(({ total }) => !total).reduce((sum, { amountMinor }) => sum + amountMinor, 0);

describe('the money of a deal', () => {
  it('adds up to the hold, with what the parts leave over as tax', () => {
    const rows = holdRows(someDeal({ holdMinor: 104_380 }));
    expect(rows.find(({ label }) => label === 'Tax on the fee')?.amountMinor).toBe(380);
    expect(sumAbove(rows)).toBe(104_380);
  });
  it('leaves out what is nought', () => {
    const rows = holdRows(someDeal({ freightMinor: 0, holdMinor: 102_000 }));
    expect(rows.map(({ label }) => label)).toEqual(['Price', 'Buyer’s fee', 'Into the hold']);
  });
  it('adds up for the seller to price and freight less the own fee', () => {
    const rows = moneyRows(someDeal({ side: 'seller' }));
    expect(rows.at(-1)).toMatchObject({ label: 'To you', amountMinor: 98_000 });
    expect(sumAbove(rows)).toBe(98_000);
  });
});
