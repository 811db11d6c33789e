import { expect, it } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { findClass } from '../catalogue/find-class.ts';
import { likelyMassG } from './likely-mass.ts';

const modules = findClass(catalogue20261, 'memory-modules');

it('sets a point or a unit right, and leaves usual or hopeless masses alone', () => {
  expect(likelyMassG({ massG: 33_000, pieces: 160 }, modules)).toBeCloseTo(3300);
  expect(likelyMassG({ massG: 3.3, pieces: 160 }, modules)).toBeCloseTo(3300);
  expect(likelyMassG({ massG: 3300, pieces: 160 }, modules)).toBeNull();
  expect(likelyMassG({ massG: 33_000, pieces: 20 }, modules)).toBeNull();
  expect(likelyMassG({ massG: 33_000, pieces: 160 }, { pieceMassG: null })).toBeNull();
});
