import type { LineInput } from '@lydite/valuation';

/** A kilogram of a class, weighed and inspected: the class alone speaks. */
export const kilogram = (classCode: string): LineInput => ({
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
