import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { findClass } from '../catalogue/find-class.ts';
import { quantileOf } from '../quantity/quantile.ts';
import type { Estimate, LineInput } from '../types.ts';
import { identityQuantity, massQuantity, thicknessQuantity } from './evidence.ts';
import { estimateLot } from './estimate-lot.ts';
import { line } from './line.fixture.ts';
import { simulateLot } from './simulate-lot.ts';
import { summariseLot } from './summarise-lot.ts';

const estimate = (lines: Partial<LineInput>[], options = { seed: 1, draws: 1021 }): Estimate =>
  estimateLot({ lines: lines.map((given, i) => line({ id: `${i}`, ...given })) }, catalogue20261, options);

const anyClass = fc.constantFrom(...catalogue20261.classes.map(({ code }) => code));
const withPlating = fc.constantFrom('edge-contacts', 'memory-modules', 'expansion-cards', 'pins-full', 'connectors');
const anyMass = fc.double({ min: 1, max: 1e6, noNaN: true });
const spreadOf = ({ goldG: { quantiles } }: Estimate) => quantiles.p90 / quantiles.p10;

describe('the same input', () => {
  test('and seed give the same numbers, another seed others', () => {
    const lines = [{ massG: 5000 }, { classCode: 'phone-boards', massG: 800 }];
    expect(estimate(lines)).toEqual(estimate(lines));
    expect(estimate(lines, { seed: 2, draws: 1021 }).goldG.mean).not.toBe(estimate(lines).goldG.mean);
  });

  test('gives these digits on every machine', () => {
    const { goldG } = estimate([{ massG: 5000 }, { classCode: 'package-tops', massG: 750 }], {
      seed: 42,
      draws: 10_000,
    });
    const digits = [goldG.mean, goldG.sd, goldG.quantiles.p10, goldG.quantiles.p50, goldG.quantiles.p90];
    expect(digits.map((value) => value.toPrecision(9))).toEqual([
      '9.93958572',
      '3.54998340',
      '6.07683362',
      '9.32485851',
      '14.5276964',
    ]);
  });

  test('agrees between seeds to a third of a per cent in the middle', () => {
    const lines = [
      { massG: 50_000 },
      { classCode: 'package-tops', massG: 750 },
      { classCode: 'phone-boards', massG: 9000 },
    ];
    const middles = [1, 2, 3, 4, 5, 6].map((seed) => estimate(lines, { seed, draws: 10_007 }).goldG.quantiles.p50);
    const reference = estimate(lines, { seed: 7, draws: 500_009 }).goldG.quantiles.p50;
    for (const middle of middles) expect(Math.abs(middle / reference - 1)).toBeLessThan(0.0033);
  });
});

describe('gold', () => {
  test('is linear in the mass of every class', () => {
    fc.assert(
      fc.property(anyClass, anyMass, (classCode, massG) => {
        const [once, thrice] = [estimate([{ classCode, massG }]), estimate([{ classCode, massG: 3 * massG }])];
        expect(thrice.goldG.quantiles.p50 / once.goldG.quantiles.p50).toBeCloseTo(3, 9);
        expect(thrice.gradeGPerT.p90 / once.gradeGPerT.p90).toBeCloseTo(1, 9);
      }),
      { numRuns: 40 },
    );
  });

  test('is linear in the count where only pieces are given', () => {
    const codes = catalogue20261.classes.filter(({ pieceMassG }) => pieceMassG).map(({ code }) => code);
    fc.assert(
      fc.property(fc.constantFrom(...codes), fc.integer({ min: 1, max: 10_000 }), (classCode, pieces) => {
        const [once, twice] = [1, 2].map((by) => estimate([{ classCode, massG: null, pieces: by * pieces }])) as [
          Estimate,
          Estimate,
        ];
        expect(twice.goldG.mean / once.goldG.mean).toBeCloseTo(2, 9);
      }),
      { numRuns: 40 },
    );
  });

  test('rises with the thickness', () => {
    fc.assert(
      fc.property(withPlating, fc.double({ min: 0.01, max: 3, noNaN: true }), (classCode, thicknessUm) => {
        const at = (um: number) => estimate([{ classCode, plating: { kind: 'xrf', thicknessUm: um } }]).goldG;
        const [thin, thick] = [at(thicknessUm), at(thicknessUm * 1.1)];
        expect(thick.mean).toBeGreaterThan(thin.mean);
        expect(thick.quantiles.p10).toBeGreaterThan(thin.quantiles.p10);
      }),
      { numRuns: 40 },
    );
  });

  test('of a tinned edge is nothing', () => {
    const { goldG, gradeGPerT } = estimate([{ classCode: 'edge-contacts', plating: { kind: 'xrf', thicknessUm: 0 } }]);
    expect([goldG.mean, goldG.quantiles.p99_85, gradeGPerT.p50]).toEqual([0, 0, 0]);
  });

  test('of the lines adds up to the lot’s, and their shares of its variance to one', () => {
    const { goldG, lines, massG } = estimate([
      { massG: 5000 },
      { massG: 800 },
      { classCode: 'phone-boards', massG: 900 },
    ]);
    const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);
    expect(sum(lines.map((each) => each.goldG.mean)) / goldG.mean).toBeCloseTo(1, 12);
    expect(sum(lines.map((each) => each.varianceShare))).toBeCloseTo(1, 12);
    expect(sum(lines[0]!.components.map((each) => each.goldG.mean)) / lines[0]!.goldG.mean).toBeCloseTo(1, 12);
    expect(massG).toBe(6700);
  });

  test('of two lines of one class moves together, of two classes apart', () => {
    const relativeSd = ({ goldG }: Estimate) => goldG.sd / goldG.mean;
    const one = relativeSd(estimate([{ classCode: 'phone-boards' }]));
    const same = relativeSd(estimate([{ classCode: 'phone-boards' }, { classCode: 'phone-boards' }]));
    const other = relativeSd(estimate([{ classCode: 'drive-boards' }, { classCode: 'player-boards' }]));
    expect(same / one).toBeCloseTo(1, 1);
    expect(other).toBeLessThan(0.8 * relativeSd(estimate([{ classCode: 'player-boards' }])));
  });
});

describe('evidence', () => {
  test('whose reading is the middle of what it replaces never widens the range', () => {
    const improved: Partial<LineInput>[] = [
      { massEvidence: 'weighed' },
      { identityEvidence: 'inspected' },
      { identityEvidence: 'photographed' },
      { plating: { kind: 'xrf', thicknessUm: 0.45 } },
      { pieces: 455, countEvidence: 'counted' },
    ];
    const before: Partial<LineInput> = { massG: 10_000, massEvidence: 'stated', identityEvidence: 'stated' };
    for (const better of improved) {
      expect(spreadOf(estimate([{ ...before, ...better }]))).toBeLessThanOrEqual(spreadOf(estimate([before])) * 1.002);
    }
  });

  test('an assay at the middle narrows every class', () => {
    for (const { code } of catalogue20261.classes) {
      const before = estimate([{ classCode: code }]);
      const after = estimate([{ classCode: code, assay: { gradeGPerT: before.gradeGPerT.p50, relativeSd: 0.05 } }]);
      expect(spreadOf(after)).toBeLessThan(spreadOf(before));
      expect(after.goldG.quantiles.p50 / before.goldG.quantiles.p50).toBeCloseTo(1, 2);
      expect(after.lines[0]!.components.map(({ name }) => name)).toEqual(['as assayed']);
    }
  });

  test('a reading never has a wider relative range than its own figure had', () => {
    const ratio = (quantity: Parameters<typeof quantileOf>[0]) => quantileOf(quantity, 0.9) / quantileOf(quantity, 0.1);
    for (const { components } of catalogue20261.classes) {
      for (const component of components) {
        if (component.kind !== 'plating' && component.kind !== 'finish') continue;
        const prior = ratio(component.parameters.thicknessUm.quantity);
        expect(ratio(thicknessQuantity({ kind: 'xrf', thicknessUm: 0.7 }))).toBeLessThan(prior);
        expect(ratio(thicknessQuantity({ kind: 'standard', minimumUm: 0.75 }))).toBeLessThan(prior);
      }
    }
    const stated = line({ massEvidence: 'stated', identityEvidence: 'stated' });
    expect(ratio(massQuantity(1000, line({ scaleResolutionG: 10 })))).toBeLessThan(ratio(massQuantity(1000, stated)));
    expect(ratio(identityQuantity(line()))).toBeLessThan(ratio(identityQuantity(stated)));
  });
});

describe('a range of plating given by the seller', () => {
  test('never widens the estimate, unless it is wider than the class has anyway, and then a warning says so', () => {
    const um = fc.double({ min: 0.05, max: 4, noNaN: true });
    fc.assert(
      fc.property(withPlating, um, um, (classCode, a, b) => {
        const plating = { kind: 'range', leastUm: Math.min(a, b), mostUm: Math.max(a, b) } as const;
        const given = thicknessQuantity(plating);
        const wider = estimate([{ classCode, plating }]).warnings.some(({ code }) => code === 'range-wider-than-class');
        const component = findClass(catalogue20261, classCode).components.find(({ kind }) => kind === 'plating');
        if (component?.kind !== 'plating') throw new Error(`${classCode} is not plated`);
        const ratio = (of: typeof given) => quantileOf(of, 0.9) / quantileOf(of, 0.1);
        expect(wider).toBe(ratio(given) > ratio(component.parameters.thicknessUm.quantity));
      }),
      { numRuns: 60 },
    );
  });
});

describe('the summary', () => {
  test('has its quantiles, beads and density in order', () => {
    fc.assert(
      fc.property(anyClass, anyMass, (classCode, massG) => {
        const { goldG, gradeGPerT, beadsG, density } = estimate([{ classCode, massG }]);
        for (const values of [Object.values(goldG.quantiles), Object.values(gradeGPerT), beadsG]) {
          expect(values).toEqual(values.toSorted((a, b) => a - b));
        }
        expect(beadsG).toHaveLength(50);
        expect(density.perG).toHaveLength(96);
        expect(density.fromG).toBe(goldG.quantiles.p0_15);
        expect(density.toG).toBe(goldG.quantiles.p99_85);
      }),
      { numRuns: 20 },
    );
  });

  test('is plain JSON that names what it was made of', () => {
    const made = estimate([{ pieces: 40 }]);
    expect(JSON.parse(JSON.stringify(made))).toEqual(made);
    expect(made).toMatchObject({ catalogueVersion: '2026.1', seed: 1, draws: 1021 });
    expect(made.lines[0]).toMatchObject({ id: '0', classCode: 'memory-modules', pieces: 40, massG: 1000 });
  });

  test('of a lot with no lines, or with a line of unknown amount, is nothing and says so', () => {
    expect(estimate([])).toMatchObject({ massG: 0, lines: [], drivers: [], warnings: [], goldG: { mean: 0, sd: 0 } });
    const unknown = estimate([{ massG: null }]);
    expect(unknown.goldG.mean).toBe(0);
    expect(unknown.warnings.map(({ code }) => code)).toEqual(['nothing-given']);
  });

  test('of simulated draws is the estimate', () => {
    const input = { lines: [line()] };
    const options = { seed: 5, draws: 500 };
    expect(summariseLot(simulateLot(input, catalogue20261, options))).toEqual(
      estimateLot(input, catalogue20261, options),
    );
  });
});

test.each([
  [{ seed: -1 }, /^seed/],
  [{ seed: 1.5 }, /^seed must be a whole/],
  [{ seed: 1, draws: 99 }, /^draws/],
  [{ seed: 1, draws: 1e7 }, /^draws/],
])('options out of range are refused by name: %o', (options, name) => {
  expect(() => estimateLot({ lines: [] }, catalogue20261, options)).toThrow(name);
});
