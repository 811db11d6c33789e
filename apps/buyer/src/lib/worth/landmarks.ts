import { simulateLot, type Catalogue, type LineInput } from '@lydite/valuation';

/** Kinds far enough apart on the grade axis for their names to stand side by side. */
const shown: readonly [classCode: string, name: string][] = [
  ['mixed-boards', 'Mixed boards'],
  ['phone-boards', 'Phone boards'],
  ['edge-contacts', 'Edge contacts'],
];

const oneKilogram = (classCode: string): LineInput => ({
  id: classCode,
  classCode,
  identityEvidence: 'inspected',
  massG: 1000,
  massEvidence: 'weighed',
  scaleResolutionG: 0,
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

function middleGrade(classCode: string, catalogue: Catalogue): number {
  const { goldG } = simulateLot({ lines: [oneKilogram(classCode)] }, catalogue, { seed: 1, draws: 1021 });
  return goldG.toSorted()[goldG.length >> 1]! * 1000;
}

/** Middle grades of well-known kinds, as the catalogue has them: landmarks on the list's axis. */
export const gradeLandmarks = (catalogue: Catalogue): { name: string; gradeGPerT: number }[] =>
  shown
    .filter(([code]) => catalogue.classes.some((one) => one.code === code))
    .map(([code, name]) => ({ name, gradeGPerT: middleGrade(code, catalogue) }));
