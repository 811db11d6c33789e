import { describe, expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import type { Catalogue, MaterialClass } from '../catalogue/catalogue.types.ts';
import { bondWireGold } from '../components/bond-wire-gold.ts';
import { finishGold } from '../components/finish-gold.ts';
import { gradedGold } from '../components/graded-gold.ts';
import { pieceGold } from '../components/piece-gold.ts';
import { platedGold } from '../components/plated-gold.ts';
import { exact } from '../quantity/quantity.ts';
import type { LineInput } from '../types.ts';
import { line } from './line.fixture.ts';
import { planLot } from './plan-lot.ts';

const just = (value: number) => ({ quantity: exact(value), source: 'a test' });

const everything: MaterialClass = {
  code: 'everything',
  name: 'One of each',
  group: 'boards',
  unit: { one: 'piece', many: 'pieces' },
  hazards: 'None.',
  pieceMassG: just(50),
  components: [
    {
      kind: 'plating',
      id: 'plating',
      name: 'plating',
      parameters: {
        contactsPerPiece: just(64),
        padAreaMm2: just(3),
        thicknessUm: just(0.8),
        densityGPerCm3: just(17.5),
        goldFraction: just(0.997),
        share: just(0.5),
      },
    },
    {
      kind: 'finish',
      id: 'finish',
      name: 'finish',
      parameters: {
        areaCm2PerPiece: just(90),
        sides: just(2),
        coveredFraction: just(0.1),
        thicknessUm: just(0.1),
        densityGPerCm3: just(19.32),
      },
    },
    {
      kind: 'bondWire',
      id: 'bondWire',
      name: 'wires',
      parameters: {
        wiresPerPiece: just(400),
        lengthMm: just(3),
        diameterUm: just(25),
        densityGPerCm3: just(19.32),
      },
    },
    { kind: 'grade', id: 'grade', name: 'board', parameters: { gradeGPerT: just(120) } },
    { kind: 'perPiece', id: 'inside', name: 'inside', parameters: { goldGPerPiece: just(0.01) } },
  ],
};
const catalogue: Catalogue = { version: 'test', classes: [everything, ...catalogue20261.classes] };

/** Grams per component at the figures' own values, leaving out the doubt about the class. */
function golds(given: Partial<LineInput>): number[] {
  const [plan] = planLot({ lines: [line({ classCode: 'everything', ...given })] }, catalogue).lines;
  return (plan?.gold ?? []).map(({ constant, factors }) => {
    expect(factors.map(({ parameter }) => parameter)).toEqual(given.assay ? [] : ['identity']);
    return constant;
  });
}

const plating = { areaCm2: 64 * 0.03, thicknessUm: 0.8, densityGPerCm3: 17.5, goldFraction: 0.997, wear: 0 };
const finish = { areaCm2: 90, sides: 2, coveredFraction: 0.1, thicknessUm: 0.1, densityGPerCm3: 19.32 };
const wires = { wires: 400, lengthMm: 3, diameterUm: 25, densityGPerCm3: 19.32 };

describe('a line of exact figures', () => {
  test('holds what the component formulas say', () => {
    const expected = [
      20 * 0.5 * platedGold(plating),
      20 * finishGold(finish),
      20 * bondWireGold(wires),
      gradedGold({ massG: 1000, gradeGPerT: 120 }),
      pieceGold({ pieces: 20, goldGPerPiece: 0.01 }),
    ];
    golds({ massG: 1000 }).forEach((gold, i) => expect(gold).toBeCloseTo(expected[i] as number, 12));
  });

  test('counts pieces for what is per piece and mass for what is per mass', () => {
    const [plated, , , graded] = golds({ massG: 1000, pieces: 8, countEvidence: 'counted' });
    expect(plated).toBeCloseTo(8 * 0.5 * platedGold(plating), 12);
    expect(graded).toBeCloseTo(0.12, 12);
    expect(golds({ massG: null, pieces: 8, countEvidence: 'counted' })[3]).toBeCloseTo(0.4 * 0.12, 12);
  });
});

describe('a figure given on the line replaces the class’s own', () => {
  test('piece mass, contacts and the area of one', () => {
    expect(golds({ pieceMassG: 25 })[4]).toBeCloseTo(0.4, 12);
    expect(golds({ contactsPerPiece: 32 })[0]).toBeCloseTo(10 * 0.5 * platedGold(plating), 12);
    expect(golds({ padAreaMm2: 6 })[0]).toBeCloseTo(40 * 0.5 * platedGold(plating), 12);
  });

  test('a measured area is the gold’s own, on plating and finish alike', () => {
    const [plated, finished] = golds({ areaCm2PerPiece: 2 });
    expect(plated).toBeCloseTo(20 * platedGold({ ...plating, areaCm2: 2 }), 12);
    expect(finished).toBeCloseTo(20 * finishGold({ ...finish, areaCm2: 2, sides: 1, coveredFraction: 1 }), 12);
  });

  test('wear takes its share of plating and finish only', () => {
    const [whole, worn] = [golds({}), golds({ wear: 0.25 })];
    expect(worn[0]).toBeCloseTo(0.75 * (whole[0] as number), 12);
    expect(worn[1]).toBeCloseTo(0.75 * (whole[1] as number), 12);
    expect(worn.slice(2)).toEqual(whole.slice(2));
  });

  test('an assay replaces all components and the doubt about the class', () => {
    const [assayed, ...others] = golds({ assay: { gradeGPerT: 300, relativeSd: 0 } });
    expect(assayed).toBeCloseTo(0.3, 12);
    expect(others).toEqual([]);
  });
});

test('contacts and their area make an area where the class knows only the whole', () => {
  const given = line({ pieces: 10, countEvidence: 'counted', contactsPerPiece: 240, padAreaMm2: 2 });
  const [plan] = planLot({ lines: [given] }, catalogue20261).lines;
  const plated = plan?.gold[0];
  expect(plated?.constant).toBeCloseTo(10 * 4.8 * 1e-4 * 0.997, 12);
  expect(plated?.factors.map(({ parameter }) => parameter)).not.toContain('plating.areaCm2PerPiece');
});

test.each([
  [{ massG: -1 }, 'lines[0].massG'],
  [{ pieces: Number.NaN }, 'lines[0].pieces'],
  [{ pieceMassG: 0 }, 'lines[0].pieceMassG'],
  [{ wear: 1.2 }, 'lines[0].wear'],
  [{ plating: { kind: 'range', leastUm: 2, mostUm: 1 } }, 'lines[0].plating.mostUm'],
  [{ plating: { kind: 'xrf', thicknessUm: -1 } }, 'lines[0].plating.thicknessUm'],
  [{ plating: { kind: 'standard', minimumUm: -1 } }, 'lines[0].plating.minimumUm'],
  [{ assay: { gradeGPerT: 1, relativeSd: 2 } }, 'lines[0].assay.relativeSd'],
] as [Partial<LineInput>, string][])('figures no material has are refused by name: %#', (given, name) => {
  const plan = () => planLot({ lines: [line(given)] }, catalogue20261);
  expect(plan).toThrow(RangeError);
  expect(plan).toThrow(name);
});

test('two lines with one id are refused', () => {
  expect(() => planLot({ lines: [line(), line()] }, catalogue20261)).toThrow('the id "a" is used twice');
});
