import type { EstimateOutline, LineDraft } from '@lydite/contracts';
import { roundSignificant, type Estimate, type LineInput } from '@lydite/valuation';

/** The part of a line that the valuation reads. */
export const toLineInput = (line: LineDraft & { classCode: string }): LineInput => ({
  id: line.id,
  classCode: line.classCode,
  identityEvidence: line.identityEvidence,
  massG: line.massG,
  massEvidence: line.massEvidence,
  scaleResolutionG: line.scaleResolutionG,
  pieces: line.pieces,
  countEvidence: line.countEvidence,
  plating: line.plating,
  contactsPerPiece: line.contactsPerPiece,
  padAreaMm2: line.padAreaMm2,
  areaCm2PerPiece: line.areaCm2PerPiece,
  pieceMassG: line.pieceMassG,
  wear: line.wear,
  assay: line.assay,
});

/** The seed of a lot's estimate, 0 … 2³¹ − 1: from its id, so that nobody can try seeds until one pleases. */
export const seedOf = (lotId: string): number => Number.parseInt(lotId.replaceAll('-', '').slice(0, 8), 16) >>> 1;

/** What of a frozen estimate a row of a list is drawn from. */
export interface OutlineParts {
  massG: number;
  goldG: Estimate['goldG']['quantiles'];
  gradeGPerT: Estimate['gradeGPerT'];
  density: Estimate['density'];
}

/** Five figures are more than a drawing shows, and a list of 25 rows carries 2 400 of these numbers. */
export const toOutline = ({ massG, goldG, gradeGPerT, density }: OutlineParts): EstimateOutline => ({
  massG,
  goldG,
  gradeGPerT,
  density: { ...density, perG: density.perG.map((value) => roundSignificant(value, 5)) },
});
