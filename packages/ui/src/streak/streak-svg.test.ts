import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { beadsAhead, placeBeads } from './beads.ts';
import { streakGeometry } from './geometry.ts';
import { linearAxis, streakAxisMaxG } from './streak-axis.ts';
import { lognormalEstimate } from './streak-fixtures.ts';
import { streakSvg } from './streak-svg.ts';
import type { StreakInput } from './streak-types.ts';

const estimate = lognormalEstimate(64, 0.2);
const wider = lognormalEstimate(61, 0.42);
const base: StreakInput = { id: 's', size: 'large', theme: 'mail', estimate };

const count = (svg: string, pattern: RegExp) => svg.match(pattern)?.length ?? 0;
const beadGroup = (svg: string) => /<g class="streak-beads">(.*?)<\/g>/s.exec(svg)?.[1] ?? '';
const solid = (svg: string) => count(beadGroup(svg), /<circle [^>]*fill="#EDBB47"/g);
const open = (svg: string) => count(beadGroup(svg), /<circle [^>]*fill="none"/g);

const anyEstimate = fc
  .record({
    median: fc.double({ min: 0.05, max: 4000, noNaN: true }),
    sigma: fc.double({ min: 0.03, max: 1.2, noNaN: true }),
  })
  .map(({ median, sigma }) => lognormalEstimate(median, sigma));
const anySize = fc.constantFrom<'large' | 'phone'>('large', 'phone');

describe('beads', () => {
  it('are as many as the estimate has, split by the notch as counted', () => {
    fc.assert(
      fc.property(anyEstimate, anySize, fc.double({ min: 0, max: 2, noNaN: true }), (one, size, share) => {
        const breakEvenG = one.goldG.quantiles.p50 * share;
        const svg = streakSvg({ ...base, estimate: one, size, breakEvenG });
        expect(solid(svg)).toBe(beadsAhead(one.beadsG, breakEvenG));
        expect(solid(svg) + open(svg)).toBe(50);
      }),
      { numRuns: 60 },
    );
  });

  it('ahead are 50 times the chance, rounded', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1000 }), (permille) => {
        const uniform = Array.from({ length: 50 }, (_, i) => (i + 0.5) / 50);
        // On a tie of the rounding either count is right.
        const exact = 50 * (1 - permille / 1000);
        expect(Math.abs(beadsAhead(uniform, permille / 1000) - exact)).toBeLessThanOrEqual(0.5 + 1e-9);
      }),
    );
  });

  it('fall as the bid rises', () => {
    fc.assert(
      fc.property(
        anyEstimate,
        fc.double({ min: 0, max: 500, noNaN: true }),
        fc.double({ min: 0, max: 500, noNaN: true }),
        (one, a, b) => {
          const [low, high] = a < b ? [a, b] : [b, a];
          expect(beadsAhead(one.beadsG, high)).toBeLessThanOrEqual(beadsAhead(one.beadsG, low));
        },
      ),
    );
  });

  it('stand on the stone below the smear, in order and apart', () => {
    fc.assert(
      fc.property(anyEstimate, anySize, (one, size) => {
        const geometry = streakGeometry(size);
        const axis = linearAxis(geometry, streakAxisMaxG(one));
        const { beads, diameter } = placeBeads(one.beadsG, axis, geometry);
        const ceiling = geometry.smearY + geometry.smearHeight / 2;
        for (const { x, y } of beads) {
          expect(y - diameter / 2).toBeGreaterThanOrEqual(ceiling - 1e-6);
          expect(y + diameter / 2).toBeLessThanOrEqual(geometry.height);
          expect(x + diameter / 2).toBeLessThanOrEqual(geometry.width);
        }
        const columns = [...new Set(beads.map(({ x }) => x))];
        columns.slice(1).forEach((x, i) => expect(x - (columns[i] ?? 0)).toBeGreaterThanOrEqual(diameter));
      }),
      { numRuns: 60 },
    );
  });
});

describe('the drawing', () => {
  it('is the same string for the same input', () => {
    fc.assert(
      fc.property(
        anyEstimate,
        (one) => streakSvg({ ...base, estimate: one }) === streakSvg({ ...base, estimate: structuredClone(one) }),
      ),
      { numRuns: 20 },
    );
  });

  it('holds no NaN, no style attribute and closes what it opens', () => {
    for (const size of ['large', 'phone', 'medium', 'card', 'row', 'cell', 'inline'] as const) {
      for (const theme of ['screen', 'mail', 'print'] as const) {
        const svg = streakSvg({
          ...base,
          size,
          theme,
          breakEvenG: 53,
          leadBreakEvenG: 51,
          before: wider,
          title: 'A & B',
          description: '<',
        });
        expect(svg).not.toMatch(/NaN|undefined|style=/);
        expect(svg).toContain('A &amp; B');
        expect(new DOMParser().parseFromString(svg, 'image/svg+xml').querySelector('parsererror')).toBeNull();
      }
    }
  });

  it('bears an estimate without spread and one without gold', () => {
    for (const goldG of [12.5, 0]) {
      const quantiles = Object.fromEntries(Object.keys(estimate.goldG.quantiles).map((name) => [name, goldG]));
      const flat = {
        massG: 1000,
        goldG: { quantiles: quantiles as unknown as typeof estimate.goldG.quantiles },
        beadsG: estimate.beadsG.map(() => goldG),
        density: { fromG: goldG, toG: goldG, perG: Array.from({ length: 96 }, () => 0) },
      };
      for (const size of ['large', 'cell', 'inline'] as const) {
        expect(streakSvg({ ...base, size, estimate: flat, breakEvenG: 5 })).not.toMatch(/NaN|Infinity/);
      }
    }
  });

  it('names colours by variable on screen only', () => {
    expect(streakSvg({ ...base, theme: 'screen' })).toContain('fill="var(--gold)"');
    expect(streakSvg({ ...base, theme: 'print', breakEvenG: 53 })).not.toMatch(/var\(|#EDBB47/);
  });

  it('has no scratches and no beads on the smallest stones', () => {
    const svg = streakSvg({ ...base, size: 'inline' });
    expect(svg).not.toContain('streak-scratches');
    expect(svg).not.toContain('streak-beads');
    expect(streakSvg({ ...base, size: 'card' })).toContain('streak-scratches');
  });

  it('says on the bare stone that nothing is known yet', () => {
    const svg = streakSvg({ ...base, estimate: null, breakEvenG: 10 });
    expect(svg).toContain('Not yet estimated');
    expect(svg).not.toContain('streak-beads');
  });

  it('keeps results beyond a fixed axis in the count', () => {
    const svg = streakSvg({ ...base, estimate: lognormalEstimate(90, 0.2), axisMaxG: 120, breakEvenG: 60 });
    const shown = solid(svg) + open(svg);
    expect(svg).toContain(`${50 - shown} of 50 beyond`);
  });

  it('tells own bid, other bid and assays by shape', () => {
    const svg = streakSvg({
      ...base,
      size: 'medium',
      breakEvenG: 38,
      leadBreakEvenG: 51,
      assays: [
        { goldG: 52.5, plusMinusG: 0.9, by: 'buyer' },
        { goldG: 66.4, plusMinusG: null, by: 'seller' },
      ],
    });
    expect(svg).toMatch(/class="streak-notch"[^>]*fill="#E7EBE8"/);
    expect(svg).toMatch(/class="streak-lead"[^>]*fill="none"/);
    expect(count(svg, /class="streak-assay"/g)).toBe(2);
  });

  it('draws its line down only while bids are open', () => {
    expect(streakSvg({ ...base, breakEvenG: 53 })).toContain('stroke-dasharray="1 4"');
    expect(streakSvg({ ...base, breakEvenG: 53, closed: true })).not.toContain('stroke-dasharray="1 4"');
  });
});

describe('golden drawings', () => {
  const states: Record<string, Partial<StreakInput>> = {
    'large-bid': { breakEvenG: 53.06, leadBreakEvenG: 51.04, legend: 'bid' },
    'phone-bid': { size: 'phone', breakEvenG: 53.06 },
    'medium-bare': { size: 'medium', estimate: null },
    'medium-wide': { size: 'medium', estimate: wider },
    'medium-narrowed': { size: 'medium', before: wider },
    'medium-closed': { size: 'medium', breakEvenG: 53.06, closed: true },
    'medium-umpire': {
      size: 'medium',
      breakEvenG: 53.06,
      assays: [
        { goldG: 52.5, plusMinusG: 0.9, by: 'buyer' },
        { goldG: 66.4, plusMinusG: 0.9, by: 'seller' },
        { goldG: 59.6, plusMinusG: null, by: 'umpire' },
      ],
    },
    'card-mail': { size: 'card', breakEvenG: 53.06 },
    'cell-list': { size: 'cell', breakEvenG: 38.5, leadBreakEvenG: 51.04 },
    'inline-row': { size: 'inline' },
    'large-print': { theme: 'print', breakEvenG: 53.06 },
  };
  it.each(Object.entries(states))('%s', async (name, change) => {
    const svg = streakSvg({ ...base, id: name, title: name, ...change });
    await expect(svg.replaceAll('><', '>\n<') + '\n').toMatchFileSnapshot(`golden/${name}.svg`);
  });
});
