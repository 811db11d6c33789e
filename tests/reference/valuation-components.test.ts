import { catalogue20261 } from '@lydite/valuation';
import { expect, test } from 'vitest';

// Areas: KiCad footprint library, Connector_PCBEdge (lands of the PCIe CEM specification).
test('the PCIe x16 edge: 162 lands of 0.7 × 4.3 mm and 2 of 0.7 × 3.2 mm are 492.10 mm²', () => {
  expect(162 * 0.7 * 4.3 + 2 * 0.7 * 3.2).toBeCloseTo(492.1, 10);
});

test('gold is about 19 times as dense as water (common practice, no source)', () => {
  const waterGPerCm3 = 1;
  const pureDensities = catalogue20261.classes
    .flatMap(({ components }) => components)
    .flatMap(({ parameters }) => ('densityGPerCm3' in parameters ? [parameters.densityGPerCm3.quantity] : []))
    .filter(({ kind }) => kind === 'exact');
  expect(pureDensities.length).toBeGreaterThan(5);
  for (const density of pureDensities) {
    if (density.kind === 'exact') expect(Math.round(density.value / waterGPerCm3)).toBe(19);
  }
});

test('hard gold is less dense than gold, about 17.0 to 17.5 g/cm³ at least (ASTM B488; the figure from memory)', () => {
  const edge = catalogue20261.classes.find(({ code }) => code === 'edge-contacts')?.components[0];
  if (edge?.kind !== 'plating') throw new Error('edge contacts are plated');
  expect(edge.parameters.densityGPerCm3.quantity).toEqual({ kind: 'uniform', lo: 17, hi: 18 });
});
