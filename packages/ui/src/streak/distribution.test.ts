import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { distributionOf } from './distribution.ts';
import { lognormalEstimate } from './streak-fixtures.ts';
import { outlineOf } from './streak-types.ts';

const lots = (mostSigma: number) =>
  fc.record({
    median: fc.double({ min: 0.05, max: 4000, noNaN: true }),
    sigma: fc.double({ min: 0.05, max: mostSigma, noNaN: true }),
  });
const anyLot = lots(1.2);

describe('the distribution read from a stored estimate', () => {
  // A wider lot's lower tail has less than one stored bin between two quantiles, so its shape there is only known in steps.
  it.each([
    { mostSigma: 0.5, within: 0.02 },
    { mostSigma: 1.2, within: 0.1 },
  ])(
    'follows a lognormal of sigma up to $mostSigma within $within of its mode, tails included',
    ({ mostSigma, within }) => {
      fc.assert(
        fc.property(lots(mostSigma), fc.double({ min: -2.8, max: 2.8, noNaN: true }), ({ median, sigma }, z) => {
          const { logDensityAt } = distributionOf(outlineOf(lognormalEstimate(median, sigma)));
          const mode = 1 / (sigma * Math.sqrt(2 * Math.PI));
          const wanted = mode * Math.exp((-z * z) / 2);
          expect(Math.abs(logDensityAt(median * Math.exp(sigma * z)) - wanted) / mode).toBeLessThan(within);
        }),
      );
    },
  );

  it('draws in proportion to the stored quantiles', () => {
    fc.assert(
      fc.property(anyLot, ({ median, sigma }) => {
        const one = lognormalEstimate(median, sigma);
        const { quantileAt } = distributionOf(outlineOf(one));
        const inDrawnPart = (probability: number) => (probability - 0.0015) / 0.997;
        expect(quantileAt(inDrawnPart(0.1)) / one.goldG.quantiles.p10).toBeCloseTo(1, 6);
        expect(quantileAt(inDrawnPart(0.9)) / one.goldG.quantiles.p90).toBeCloseTo(1, 6);
      }),
    );
  });

  it('is flat zero without spread', () => {
    const one = lognormalEstimate(10, 1e-15);
    expect(distributionOf(outlineOf(one)).logDensityAt(10)).toBe(0);
  });
});
