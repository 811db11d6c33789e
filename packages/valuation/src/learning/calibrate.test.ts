import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { calibrate, type Outcome } from './calibrate.ts';
import { invert } from './invert.ts';
import { keptShare, shrink } from './shrink.ts';

const outcome = (classCode: string, sellerId: string, logRatio: number, sd = 0.2): Outcome => ({
  classCode,
  sellerId,
  logRatio,
  sd,
});

describe('a measurement and a prior', () => {
  test('meet in proportion to their precision', () => {
    expect(shrink({ mean: 0, sd: 1 }, { mean: 1, sd: 1 })).toEqual({ mean: 0.5, sd: Math.SQRT1_2 });
  });

  test('give a mean between the two and a spread below both', () => {
    const belief = fc.record({
      mean: fc.double({ min: -5, max: 5, noNaN: true }),
      sd: fc.double({ min: 0.01, max: 5, noNaN: true }),
    });
    fc.assert(
      fc.property(belief, belief, (prior, measured) => {
        const { mean, sd } = shrink(prior, measured);
        expect(mean).toBeGreaterThanOrEqual(Math.min(prior.mean, measured.mean) - 1e-9);
        expect(mean).toBeLessThanOrEqual(Math.max(prior.mean, measured.mean) + 1e-9);
        expect(sd).toBeLessThan(Math.min(prior.sd, measured.sd));
      }),
    );
  });

  test('averages no more apart than chance keep nothing of their distance', () => {
    expect(keptShare([0.1, 0.1, 0.1, 0.1], 1)).toBe(0);
    expect(keptShare([-1, 1, -1, 1, -1], 1)).toBeCloseTo(1 - 2 / 4.8, 12);
    expect(() => keptShare([1, 2, 3], 1)).toThrow('averages.length');
  });
});

describe('the inverse of a matrix', () => {
  test('times the matrix is the identity', () => {
    const entry = fc.double({ min: -1, max: 1, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(fc.array(entry, { minLength: 4, maxLength: 4 }), { minLength: 4, maxLength: 4 }),
        (roots) => {
          // AᵀA plus the identity is positive definite.
          const matrix = roots.map((_, i) =>
            Float64Array.from(roots, (__, j) => roots.reduce((sum, row) => sum + row[i]! * row[j]!, i === j ? 1 : 0)),
          );
          const inverse = invert(matrix);
          matrix.forEach((row, i) => {
            inverse.forEach((_, j) => {
              const product = row.reduce((sum, value, k) => sum + value * inverse[k]![j]!, 0);
              expect(product).toBeCloseTo(i === j ? 1 : 0, 9);
            });
          });
        },
      ),
    );
  });

  test('is refused where there is none', () => {
    expect(() => invert([Float64Array.of(0)])).toThrow('positive definite');
  });
});

describe('calibration', () => {
  test('of one outcome splits it between class and seller by their priors', () => {
    const { classes, sellers } = calibrate([outcome('a', 'x', 0.4, 0.2)], { classSd: 0.3, sellerSd: 0.15 });
    const total = 0.3 ** 2 + 0.15 ** 2 + 0.2 ** 2;
    expect(classes[0]?.logCorrection).toBeCloseTo((0.4 * 0.3 ** 2) / total, 12);
    expect(sellers[0]?.logCorrection).toBeCloseTo((0.4 * 0.15 ** 2) / total, 12);
    expect(classes[0]?.standardError).toBeCloseTo(0.3 * Math.sqrt(1 - 0.3 ** 2 / total), 12);
    expect(classes[0]?.factor).toBeCloseTo(Math.exp((0.4 * 0.09) / total), 12);
  });

  test('without a seller’s part is the normal–normal pair', () => {
    const ratios = [0.1, 0.3, 0.25, -0.05];
    const { classes } = calibrate(
      ratios.map((ratio, i) => outcome('a', `${i}`, ratio)),
      { classSd: 0.3, sellerSd: 1e-6 },
    );
    const { mean, sd } = shrink({ mean: 0, sd: 0.3 }, { mean: 0.15, sd: 0.1 });
    expect(classes[0]?.logCorrection).toBeCloseTo(mean, 9);
    expect(classes[0]?.standardError).toBeCloseTo(sd, 9);
    expect(classes[0]?.outcomes).toBe(4);
  });

  test('does not blame a class for one careless seller', () => {
    const others = ['b', 'c', 'd', 'e'].map((seller) => outcome('pins', seller, 0));
    const careless = [1, 2, 3, 4].map(() => outcome('pins', 'a', -0.6));
    const elsewhere = [1, 2, 3].map(() => outcome('boards', 'a', -0.6));
    const { classes, sellers } = calibrate([...others, ...careless, ...elsewhere]);
    const alone = calibrate([...others, ...careless].map((each, i) => ({ ...each, sellerId: `${i}` })));
    expect(Math.abs(classes[0]!.logCorrection)).toBeLessThan(Math.abs(alone.classes[0]!.logCorrection));
    expect(sellers.find(({ id }) => id === 'a')?.logCorrection).toBeLessThan(-0.2);
  });

  test('knows nothing from nothing, and refuses what is no outcome', () => {
    expect(calibrate([])).toEqual({ classes: [], sellers: [] });
    expect(() => calibrate([outcome('a', 'x', 0, 0)])).toThrow('outcomes[0].sd');
    expect(() => calibrate([outcome('a', 'x', Number.NaN)])).toThrow('outcomes[0].logRatio');
  });
});
