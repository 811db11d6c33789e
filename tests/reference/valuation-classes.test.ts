import { catalogue20261, estimateLot, quantileOf, toMicrometres, type LineInput } from '@lydite/valuation';
import { expect, test } from 'vitest';

const kilogram = (classCode: string): LineInput => ({
  id: classCode,
  classCode,
  identityEvidence: 'inspected',
  massG: 1000,
  massEvidence: 'weighed',
  scaleResolutionG: 1,
  pieces: null,
  countEvidence: 'stated',
  plating: null,
  contactsPerPiece: null,
  padAreaMm2: null,
  areaCm2PerPiece: null,
  pieceMassG: null,
  wear: null,
  assay: null,
});

/** A published figure lies inside a class when it is between p01 and p99 of what the model says. */
function insideGrade(classCode: string, gradeGPerT: number): boolean {
  const { p01, p99 } = estimateLot({ lines: [kilogram(classCode)] }, catalogue20261, { seed: 1 }).gradeGPerT;
  return p01 < gradeGPerT && gradeGPerT < p99;
}

function insideThickness(classCode: string, thicknessUm: number): boolean {
  const plating = catalogue20261.classes
    .find(({ code }) => code === classCode)
    ?.components.find(({ kind }) => kind === 'plating');
  if (plating?.kind !== 'plating') throw new Error(`${classCode} is not plated`);
  const { quantity } = plating.parameters.thicknessUm;
  return quantileOf(quantity, 0.01) < thicknessUm && thicknessUm < quantileOf(quantity, 0.99);
}

test.each([
  [
    'network-boards',
    199,
    'Holgersson et al. 2018, Resour. Conserv. Recycl. 133:300–308: router, modem, hub boards, n = 10',
  ],
  ['phone-boards', 1051, 'Holgersson et al. 2018: feature-phone boards, n = 30'],
  ['phone-boards', 1083, 'Holgersson et al. 2018: smartphone boards, n = 30'],
  ['phone-boards', 475, 'Laubertová et al., Metall. Mater. Eng.: mobile-phone boards'],
  ['phone-boards', 90, 'Vats & Singh 2015, Waste Management 45:280–288: mobile-phone boards, least'],
  ['phone-boards', 170, 'Vats & Singh 2015: mobile-phone boards, most'],
  ['plastic-chips', 5098.6, 'Maker’s material declaration of a TSSOP20 with gold wire (NXP S9S08SL16F1CTJ)'],
  ['package-tops', 8000, 'common practice, no source: 8 g of gold a kilogram'],
  ['package-tops', (0.6 / 75) * 1e6, 'common practice, no source: 0.6 g from 75 g'],
])('%s: %s g/t lies inside the class (%s)', (classCode, gradeGPerT) => {
  expect(insideGrade(classCode, gradeGPerT)).toBe(true);
});

test('the check can fail: copper-wired chips at 1 g/t (maker’s declaration) lie outside the class of gold-wired ones', () => {
  expect(insideGrade('plastic-chips', 1)).toBe(false);
});

// Common practice, no source: older contacts carry 50–60 µin.
test.each([
  ['memory-modules', 50],
  ['memory-modules', 60],
  ['expansion-cards', 50],
  ['expansion-cards', 60],
])('%s: %s µin lies inside the thickness of the class', (classCode, thicknessUin) => {
  expect(insideThickness(classCode, toMicrometres(thicknessUin, 'uin'))).toBe(true);
});

test('high-grade boards begin at 100 g/t (Chancerel 2010): low-grade boards lie below, named kinds above', () => {
  const middle = (classCode: string) =>
    estimateLot({ lines: [kilogram(classCode)] }, catalogue20261, { seed: 1 }).gradeGPerT.p50;
  expect(middle('low-grade-boards')).toBeLessThan(100);
  for (const code of ['desktop-boards', 'notebook-boards', 'network-boards', 'phone-boards', 'drive-boards']) {
    expect(middle(code)).toBeGreaterThan(100);
  }
});
