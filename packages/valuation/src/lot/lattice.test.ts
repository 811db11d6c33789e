import fc from 'fast-check';
import { expect, test } from 'vitest';
import { createLattice, hash, shortestDualSquared } from './lattice.ts';

test.each([100, 1021, 10_000])('each of 40 coordinates takes every one of %i values once', (draws) => {
  const coordinate = createLattice(7, draws);
  for (let index = 0; index < 40; index += 1) {
    const { generator, shift } = coordinate(index);
    const seen = new Set<number>();
    for (let i = 0; i < draws; i += 1) seen.add((i * generator + shift) % draws);
    expect(seen.size).toBe(draws);
  }
});

test('any two of 60 coordinates are well spread against each other', () => {
  const draws = 10_000;
  const coordinate = createLattice(1, draws);
  const generators = Array.from({ length: 60 }, (_, index) => coordinate(index).generator);
  for (let a = 0; a < generators.length; a += 1) {
    for (let b = 0; b < a; b += 1) {
      expect(shortestDualSquared(generators[a] as number, generators[b] as number, draws)).toBeGreaterThanOrEqual(100);
    }
  }
});

test('the shortest dual vector is the one a full search finds', () => {
  const prime = 101;
  const generator = fc.integer({ min: 1, max: prime - 1 });
  fc.assert(
    fc.property(generator, generator, (a, b) => {
      let shortest = Infinity;
      for (let h = -12; h <= 12; h += 1) {
        for (let k = -12; k <= 12; k += 1) {
          if ((h !== 0 || k !== 0) && (h * a + k * b) % prime === 0) shortest = Math.min(shortest, h * h + k * k);
        }
      }
      expect(shortestDualSquared(a, b, prime)).toBe(shortest);
    }),
  );
});

test('another seed moves the shifts and keeps the generators', () => {
  const [one, two] = [createLattice(1, 10_000)(3), createLattice(2, 10_000)(3)];
  expect(two.generator).toBe(one.generator);
  expect(two.shift).not.toBe(one.shift);
});

test('the random bits of a seed are the same for ever', () => {
  expect([hash(0, 0), hash(1, 0), hash(1, 1)]).toEqual([33350994, 2988215890, 2105998277]);
  expect(new Set(Array.from({ length: 1000 }, (_, i) => hash(1, i))).size).toBe(1000);
});
