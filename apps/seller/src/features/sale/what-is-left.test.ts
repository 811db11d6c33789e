import { catalogue20261 as catalogue } from '@lydite/valuation';
import { describe, expect, it } from 'vitest';
import { aDraft } from '../../lib/draft.fixture.ts';
import { inHandMinor, leftRows, usualSafeBidMinor } from './what-is-left.ts';

const price = { perGramMinor: 10_850, at: '2026-12-01T10:00:00.000Z', source: 'Test', stale: false };

describe('what a price leaves', () => {
  it('is price and freight less the fee, to the cent', () => {
    expect(inHandMinor(512_000, { sellerFeeBp: 400, freightMinor: 8500 })).toBe(512_000 + 8500 - 20_480);
    expect(inHandMinor(7, { sellerFeeBp: 400, freightMinor: 0 })).toBe(7);
  });

  it('is shown for the prices named, and without freight where the buyer collects', () => {
    const draft = aDraft({ sale: { ...aDraft().sale, reserveMinor: 420_000 } });
    const rows = leftRows(draft, { sellerFeeBp: 400 }, null);
    expect(rows.map(({ label, netMinor }) => [label, netMinor])).toEqual([
      ['Start price', 152_500],
      ['Lowest price', 411_700],
    ]);
    const collected = aDraft({
      sale: { ...aDraft().sale, form: 'asking-price', askingMinor: 100_000 },
      delivery: { ...aDraft().delivery, way: 'collection' },
    });
    expect(leftRows(collected, { sellerFeeBp: 400 }, null)).toMatchObject([
      { label: 'Asking price', netMinor: 96_000 },
    ]);
  });
});

describe('a buyer’s safe bid', () => {
  const line = { ...aDraft().lines[0]!, classCode: 'memory-modules' };
  const { label: _label, massText: _text, massUnit: _unit, ...input } = line;

  it('follows the gold price, in whole tens', () => {
    const at = (perGramMinor: number) =>
      usualSafeBidMinor({ lines: [input] }, catalogue, { sellerFeeBp: 400, price: { ...price, perGramMinor } })!;
    expect(at(10_850) % 1000).toBe(0);
    expect(at(21_700)).toBeGreaterThan(at(10_850) * 1.8);
  });

  it('is not told without a price or without lines', () => {
    expect(usualSafeBidMinor({ lines: [input] }, catalogue, { sellerFeeBp: 400, price: null })).toBeNull();
    expect(usualSafeBidMinor({ lines: [] }, catalogue, { sellerFeeBp: 400, price })).toBeNull();
  });
});
