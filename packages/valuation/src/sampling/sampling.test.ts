import fc from 'fast-check';
import { expect, test } from 'vitest';
import { fundamentalSamplingError, leastSampleMass } from './fundamental-sampling-error.ts';
import { leastPieces, pieceSamplingSd } from './piece-sampling.ts';

const material = { d: 0.2, f: 0.5, g: 0.25, c: 180, l: 1, lotMassG: 50_000 };
const positive = fc.double({ min: 0.001, max: 0.9, noNaN: true });

test('the least sample has the error it was asked for', () => {
  fc.assert(
    fc.property(positive, fc.constantFrom(1, 1.5, 3), (relativeSd, exponent) => {
      const sampleMassG = leastSampleMass({ ...material, exponent, relativeSd });
      expect(sampleMassG).toBeLessThan(material.lotMassG);
      expect(fundamentalSamplingError({ ...material, exponent, sampleMassG })).toBeCloseTo(relativeSd, 9);
    }),
  );
});

test('the whole lot has no sampling error, and a finer grind has less', () => {
  expect(fundamentalSamplingError({ ...material, sampleMassG: 50_000 })).toBe(0);
  const sampled = { ...material, sampleMassG: 100 };
  expect(fundamentalSamplingError({ ...sampled, d: 0.1 })).toBeLessThan(fundamentalSamplingError(sampled));
});

test('pieces by hand: 25 of 101 with a spread of 30 %', () => {
  expect(pieceSamplingSd({ cv: 0.3, drawn: 25, of: 101 })).toBeCloseTo(0.06 * Math.sqrt(0.76), 12);
  expect(pieceSamplingSd({ cv: 0.3, drawn: 101, of: 101 })).toBe(0);
  expect(pieceSamplingSd({ cv: 0.3, drawn: 1, of: 1 })).toBe(0);
});

test('the least number of pieces keeps the wanted spread, and one less would not', () => {
  fc.assert(
    fc.property(positive, positive, fc.integer({ min: 2, max: 5000 }), (cv, relativeSd, of) => {
      const drawn = leastPieces({ cv, relativeSd, of });
      expect(pieceSamplingSd({ cv, drawn, of })).toBeLessThanOrEqual(relativeSd * (1 + 1e-6));
      if (drawn > 1) expect(pieceSamplingSd({ cv, drawn: drawn - 1, of })).toBeGreaterThan(relativeSd * (1 - 1e-6));
    }),
  );
});

test.each([
  [() => fundamentalSamplingError({ ...material, sampleMassG: 60_000 }), 'sampleMassG'],
  [() => fundamentalSamplingError({ ...material, l: 2, sampleMassG: 1 }), 'l must be'],
  [() => leastSampleMass({ ...material, relativeSd: 0 }), 'relativeSd'],
  [() => pieceSamplingSd({ cv: 1, drawn: 3, of: 2 }), 'drawn'],
  [() => leastPieces({ cv: 1, relativeSd: 0, of: 2 }), 'relativeSd'],
])('a figure out of range is refused by name: %#', (asked, name) => {
  expect(asked).toThrow(name);
});
