import { describe, expect, test } from 'vitest';
import { drawPlan } from '../lot/draw-plan.ts';
import { line } from '../lot/line.fixture.ts';
import { planLot } from '../lot/plan-lot.ts';
import { createQuantileFinder } from '../lot/quantile-finder.ts';
import { requireQuantity } from '../quantity/quantity.ts';
import { catalogue20261 } from './catalogue-2026-1.ts';
import type { Parameter } from './catalogue.types.ts';
import { findClass } from './find-class.ts';

/** p10, p50 and p90 in g/t as the catalogue's table states them. */
const table: Record<string, [number, number, number]> = {
  'edge-contacts': [1050, 2510, 5960],
  'memory-modules': [425, 728, 1270],
  'expansion-cards': [81, 153, 294],
  'desktop-boards': [112, 220, 435],
  'notebook-boards': [122, 260, 554],
  'server-boards': [131, 280, 598],
  'network-boards': [94, 200, 424],
  'telecom-boards': [127, 350, 965],
  'phone-boards': [179, 550, 1690],
  'drive-boards': [177, 350, 690],
  'player-boards': [71, 150, 320],
  'console-boards': [101, 200, 395],
  'low-grade-boards': [7, 20, 55],
  'ceramic-processors': [1490, 2770, 5300],
  'fibre-processors-pinned': [275, 526, 1010],
  'fibre-processors-land': [95, 199, 426],
  'wire-bonded-packages': [2180, 4060, 7550],
  'package-tops': [3800, 7030, 13_010],
  'plastic-chips': [377, 1030, 2790],
  'pins-full': [2250, 5130, 11_680],
  'pins-selective': [517, 1250, 3000],
  connectors: [91, 240, 623],
  'card-modules': [2250, 3980, 7740],
  'mixed-boards': [34, 100, 291],
};

/** The class alone: mass exact, no count, and no doubt about the identity. */
function gradesOf(classCode: string): [number, number, number] {
  const plan = planLot({ lines: [line({ classCode, massG: 1e6 })] }, catalogue20261);
  for (const { gold } of plan.lines) {
    for (const term of gold) term.factors = term.factors.filter(({ parameter }) => parameter !== 'identity');
  }
  const draws = 200_000;
  const { goldG } = drawPlan(plan, { seed: 1, draws });
  return createQuantileFinder(draws)(goldG, [0.1, 0.5, 0.9]) as [number, number, number];
}

test.each(Object.entries(table))('%s has the grades its row states', (classCode, row) => {
  const [p10, p50, p90] = gradesOf(classCode);
  // A row printed as 7 stands for anything from 6.5 to 7.5.
  const tolerance = (stated: number, share: number) => Math.max(stated * share, 0.5);
  expect(Math.abs(p50 - row[1])).toBeLessThanOrEqual(tolerance(row[1], 0.03));
  expect(Math.abs(p10 - row[0])).toBeLessThanOrEqual(tolerance(row[0], 0.06));
  expect(Math.abs(p90 - row[2])).toBeLessThanOrEqual(tolerance(row[2], 0.06));
});

describe('every class', () => {
  test('is in the table, and every row has a class', () => {
    expect(catalogue20261.classes.map(({ code }) => code).toSorted()).toEqual(Object.keys(table).toSorted());
  });

  test.each(catalogue20261.classes)('$code has a sound figure and a source for each parameter', (materialClass) => {
    const parameters: Parameter[] = materialClass.components.flatMap((each) => Object.values(each.parameters));
    if (materialClass.pieceMassG) parameters.push(materialClass.pieceMassG);
    for (const { quantity, source } of parameters) {
      expect(() => requireQuantity(materialClass.code, quantity)).not.toThrow();
      expect(source.length).toBeGreaterThan(6);
    }
    expect(materialClass.hazards).toMatch(/\.$/);
    expect(new Set(materialClass.components.map(({ id }) => id)).size).toBe(materialClass.components.length);
  });

  test('survives storage as JSON', () => {
    expect(JSON.parse(JSON.stringify(catalogue20261))).toEqual(catalogue20261);
  });
});

test('an unknown class is refused with its code and the version', () => {
  expect(() => findClass(catalogue20261, 'moon-rock')).toThrow('classCode "moon-rock" is not in catalogue 2026.1');
});
