import { catalogue20261 as catalogue } from '@lydite/valuation';
import { describe, expect, it } from 'vitest';
import { aDraft, aLine } from '../../lib/draft.fixture.ts';
import { toLotInput } from './lot-input.ts';
import { liveEstimate } from './use-live-estimate.ts';

const secondId = '00000000-0000-4000-8000-000000000002';
const of = (...lines: ReturnType<typeof aLine>[]) => liveEstimate(aDraft({ lines }), catalogue);
const widthOf = (live: ReturnType<typeof of>) => {
  const { p10, p90 } = live.estimate!.goldG.quantiles;
  return p90 - p10;
};

describe('the input of an estimate', () => {
  it('leaves out lines that say too little, and kinds the catalogue has not', () => {
    const lines = [aLine({ classCode: null }), aLine({ massG: null, pieces: null }), aLine({ classCode: 'moon-dust' })];
    expect(toLotInput({ lines }, catalogue).lines).toEqual([]);
    expect(of(...lines).estimate).toBeNull();
  });

  it('leaves out a range typed upside down instead of failing', () => {
    const { estimate } = of(aLine({ plating: { kind: 'range', leastUm: 2, mostUm: 0.5 } }));
    expect(estimate!.goldG.quantiles.p50).toBe(of(aLine()).estimate!.goldG.quantiles.p50);
  });
});

describe('what buyers would see', () => {
  it('gets narrower when the seller measures, and shows from where', () => {
    const guessed = of(aLine({ massEvidence: 'stated', scaleResolutionG: null, countEvidence: 'stated' }));
    const assayed = of(aLine({ assay: { gradeGPerT: 700, relativeSd: 0.05 } }));
    expect(guessed.before).toBeNull();
    expect(widthOf(assayed)).toBeLessThan(widthOf(guessed) / 2);
    expect(assayed.before!.goldG.quantiles.p90).toBeCloseTo(guessed.estimate!.goldG.quantiles.p90, 6);
  });

  it('names what would narrow it most, once each and best first', () => {
    const { narrowing } = of(aLine(), aLine({ id: secondId, label: '', classCode: 'expansion-cards', pieces: 900 }));
    const gains = narrowing.map(({ lessG }) => lessG);
    expect(gains.length).toBeGreaterThan(0);
    expect(gains).toEqual(gains.toSorted((a, b) => b - a));
    expect(new Set(narrowing.map(({ question }) => question)).size).toBe(narrowing.length);
  });

  it('names lines as the seller does, also when an empty line stands before them', () => {
    const { warnings } = of(
      aLine({ id: secondId, classCode: null }),
      aLine({ label: 'Mixed', plating: { kind: 'xrf', thicknessUm: 50 } }),
    );
    expect(warnings.map(({ message }) => message).join()).toContain('on Mixed is thicker');
  });
});
