import type { LineInput } from '../types.ts';

/** A line of a kilogram weighed exactly, of a class inspected; tests state only what matters to them. */
export function line(given: Partial<LineInput> = {}): LineInput {
  return {
    id: 'a',
    classCode: 'memory-modules',
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
    ...given,
  };
}
