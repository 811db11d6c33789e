import type { LineInput, LotInput } from '@lydite/valuation';

const stated: LineInput = {
  id: '',
  classCode: '',
  identityEvidence: 'photographed',
  massG: null,
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
};

const line = (classCode: string, given: Partial<LineInput>): LineInput => ({
  ...stated,
  id: classCode,
  classCode,
  ...given,
});

/** A lot as sellers describe them: some lines weighed, some counted, one measured, one only by its pieces. */
export const sixLineLot: LotInput = {
  lines: [
    line('memory-modules', { massG: 12_400, massEvidence: 'weighed', scaleResolutionG: 10, pieces: 560 }),
    line('expansion-cards', { massG: 18_000, identityEvidence: 'stated' }),
    line('package-tops', { massG: 850, massEvidence: 'weighed', scaleResolutionG: 1, identityEvidence: 'inspected' }),
    line('ceramic-processors', { pieces: 140, countEvidence: 'counted-on-photo' }),
    line('phone-boards', { massG: 6_500 }),
    line('edge-contacts', { massG: 2_300, plating: { kind: 'xrf', thicknessUm: 0.55 } }),
  ],
};
