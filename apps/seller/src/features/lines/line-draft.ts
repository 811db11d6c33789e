import type { LineDraft } from '@lydite/contracts';

/** A line nobody has said anything about yet. */
export const emptyLine = (): LineDraft => ({
  id: crypto.randomUUID(),
  label: '',
  classCode: null,
  identityEvidence: 'stated',
  massG: null,
  massText: null,
  massUnit: 'kg',
  massEvidence: 'stated',
  scaleResolutionG: null,
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

/** A change of one line, or of several of its figures. */
export type LineChange = Partial<Omit<LineDraft, 'id'>>;

/** Steps most scales of a workshop show, grams; the seller says otherwise. */
export const usualScaleG = 20;

/** Saying that a line was weighed needs the scale's steps: those of the lines already weighed, or the usual ones. */
export function weighedLike(lines: readonly LineDraft[]): LineChange {
  const known = lines.find(({ massEvidence, scaleResolutionG }) => massEvidence === 'weighed' && scaleResolutionG);
  return { massEvidence: 'weighed', scaleResolutionG: known?.scaleResolutionG ?? usualScaleG };
}
