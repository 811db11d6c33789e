import { bondWireGold, catalogue20261, fromGrams, gradedGold, platedGold, toMicrometres } from '@lydite/valuation';
import { expect, test } from 'vitest';

const pure = { densityGPerCm3: 19.32, goldFraction: 1, wear: 0 };
const plated = (areaMm2: number, thicknessUin: number) =>
  platedGold({ ...pure, areaCm2: areaMm2 / 100, thicknessUm: toMicrometres(thicknessUin, 'uin') });

// Areas: KiCad footprint library, Connector_PCBEdge (lands of the PCIe CEM specification); gold at 19.32 g/cm³ recomputed.
test('the PCIe x16 edge: 162 lands of 0.7 × 4.3 mm and 2 of 0.7 × 3.2 mm are 492.10 mm²', () => {
  expect(162 * 0.7 * 4.3 + 2 * 0.7 * 3.2).toBeCloseTo(492.1, 10);
});

test.each([
  [492.1, 30, 7.245],
  [492.1, 2, 0.483],
])('%s mm² at %s µin hold %s mg', (areaMm2, thicknessUin, goldMg) => {
  expect(plated(areaMm2, thicknessUin) * 1000).toBeCloseTo(goldMg, 3);
});

test('a thousand PCIe x16 cards at 30 µin hold 7.245 g, 0.2329 ozt', () => {
  expect(1000 * plated(492.1, 30)).toBeCloseTo(7.245, 3);
  expect(fromGrams(1000 * plated(492.1, 30), 'ozt')).toBeCloseTo(0.2329, 4);
});

// ASTM B488: mass per area is thickness times density; at 19.32 g/cm³ recomputed.
test.each([
  [1 / 0.0254, 1.932],
  [30, 1.472_184],
  [50, 2.453_64],
])('%s µin of gold weigh %s mg/cm²', (thicknessUin, mgPerCm2) => {
  expect(plated(100, thicknessUin) * 1000).toBeCloseTo(mgPerCm2, 6);
});

// Volume of a cylinder at 19.32 g/cm³, recomputed.
test.each([
  [25.4, 9.79],
  [25, 9.484],
])('bond wire of %s µm holds %s µg per mm', (diameterUm, microgramsPerMm) => {
  const goldG = bondWireGold({ wires: 1, lengthMm: 1, diameterUm, densityGPerCm3: 19.32 });
  expect(goldG * 1e6).toBeCloseTo(microgramsPerMm, 3);
});

// Maker's material declaration, TSSOP20 with gold wire (NXP S9S08SL16F1CTJ): 0.399988 mg in 78.450028 mg.
test('the TSSOP20: 20 wires of 25.4 µm and 2.04 mm hold its 0.399988 mg of gold to 0.2 %', () => {
  const goldG = bondWireGold({ wires: 20, lengthMm: 2.04, diameterUm: 25.4, densityGPerCm3: 19.32 });
  expect(Math.abs((goldG * 1000) / 0.399_988 - 1)).toBeLessThan(0.002);
});

test('the TSSOP20: 0.399988 mg in 78.450028 mg are 5 098.6 g/t', () => {
  expect(gradedGold({ massG: 0.078_450_028, gradeGPerT: 5098.6 }) * 1000).toBeCloseTo(0.399_988, 5);
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
