import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatBreakEvenG, formatGoldG, GRAMS_PER_OZT } from '../text/format-mass.ts';
import { lognormalEstimate } from './streak-fixtures.ts';
import { streakTable } from './streak-rows.ts';
import { streakSvg } from './streak-svg.ts';
import { streakText } from './streak-text.ts';

const estimate = lognormalEstimate(64, 0.2);
const bid = { amountMinor: 620_000, breakEvenG: 53.06, resultPerGMinor: 12_369 };

describe('the sentence', () => {
  it('counts results before it names the range', () => {
    expect(streakText({ estimate, bid }).sentence).toBe(
      '41 of 50 equally likely results hold more than the 53.1\u00a0g you need at this bid. Eight in ten lie between 50 and 83\u00a0g.',
    );
  });
  it('speaks of the lot alone without a bid, and to a seller', () => {
    const alone = 'Eight results in ten lie between 50 and 83\u00a0g; half lie above 64\u00a0g.';
    expect(streakText({ estimate }).sentence).toBe(alone);
    expect(streakText({ estimate, bid, reader: 'other' }).sentence).toBe(alone);
  });
  it('says so when there is no estimate', () => {
    expect(streakText({ estimate: null }).sentence).toBe('Not yet estimated.');
  });
  it('never lets a seller hear a buyer’s break-even', () => {
    expect(streakText({ estimate, bid, reader: 'other' }).description).not.toContain('53.1');
  });
});

describe('the description', () => {
  it('keeps its order: range, middle, break-even and count, assays', () => {
    const assays = [
      { goldG: 60.4, plusMinusG: 0.9, by: 'buyer' as const },
      { goldG: 44, plusMinusG: null, by: 'seller' as const },
    ];
    expect(streakText({ estimate, bid, assays }).description).toBe(
      'Eight results in ten lie between 50 and 83\u00a0g. Half lie above 64\u00a0g. ' +
        'At a bid of $6,200 you break even at 53.1\u00a0g: 41 of 50 equally likely results are above that. ' +
        'The buyer’s assay found 60.4 ± 0.9\u00a0g, inside that range. The seller’s assay found 44\u00a0g, below that range.',
    );
  });
});

describe('the table', () => {
  it('breaks even where the notch stands', () => {
    const rows = streakTable({ estimate: lognormalEstimate(bid.breakEvenG, 0.2), pricePerGMinor: 13_020, bid });
    const middle = rows.find(({ percentile }) => percentile === 50);
    expect(Math.abs(middle?.resultMinor ?? NaN)).toBeLessThanOrEqual(1);
    expect(middle?.valueMinor).toBe(Math.round((middle?.goldG ?? NaN) * 13_020));
    expect(middle?.goldOzt).toBeCloseTo(bid.breakEvenG / GRAMS_PER_OZT, 6);
  });
  it('leaves value and result out when it can’t know them', () => {
    for (const row of streakTable({ estimate })) expect([row.valueMinor, row.resultMinor]).toEqual([null, null]);
  });

  it('agrees with the sentence and the drawing', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 500, noNaN: true }),
        fc.double({ min: 0.05, max: 0.9, noNaN: true }),
        fc.double({ min: 0.3, max: 1.8, noNaN: true }),
        (median, sigma, share) => {
          const one = lognormalEstimate(median, sigma);
          const own = { ...bid, breakEvenG: median * share };
          const { sentence, description } = streakText({ estimate: one, bid: own });
          const rows = streakTable({ estimate: one, bid: own });
          expect(rows.map(({ percentile }) => percentile)).toEqual([5, 10, 25, 50, 75, 90, 95]);
          expect(rows.every((row, i) => i === 0 || row.goldG >= (rows[i - 1]?.goldG ?? 0))).toBe(true);
          expect(description).toContain(`Half lie above ${formatGoldG(rows[3]?.goldG ?? NaN)}.`);
          expect(sentence).toContain(formatBreakEvenG(own.breakEvenG));
          const drawn = streakSvg({ id: 's', size: 'large', theme: 'mail', estimate: one, breakEvenG: own.breakEvenG });
          const solid = drawn.match(/<circle [^>]*fill="#EDBB47"/g)?.length ?? 0;
          expect(sentence.startsWith(`${solid} of 50 `)).toBe(true);
        },
      ),
      { numRuns: 60 },
    );
  });
});
