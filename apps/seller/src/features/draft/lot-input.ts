import type { LineDraft, LotDraft } from '@lydite/contracts';
import type { Catalogue, LineInput, LotInput } from '@lydite/valuation';

type KnownLine = LineDraft & { classCode: string };

/** The lines of a draft that say enough to be estimated: a kind the catalogue has, and how much of it. */
const estimable = (draft: Pick<LotDraft, 'lines'>, catalogue: Catalogue): KnownLine[] =>
  draft.lines.filter(
    (line): line is KnownLine =>
      catalogue.classes.some(({ code }) => code === line.classCode) && (line.massG !== null || line.pieces !== null),
  );

function toLineInput({ label: _label, massText: _text, massUnit: _unit, plating, ...line }: KnownLine): LineInput {
  const isUpsideDown = plating?.kind === 'range' && plating.leastUm > plating.mostUm;
  return { ...line, plating: isUpsideDown ? null : plating };
}

/** What the valuation reads of a draft while it is written; lines that say too little yet are left out. */
export const toLotInput = (draft: Pick<LotDraft, 'lines'>, catalogue: Catalogue): LotInput => ({
  lines: estimable(draft, catalogue).map(toLineInput),
});

/** The same lot as if the seller had measured nothing: every figure stated, the kind's own guess for the rest. */
export const withNothingMeasured = ({ lines }: LotInput): LotInput => ({
  lines: lines.map(({ id, classCode, massG, pieces }) => ({
    id,
    classCode,
    massG,
    pieces,
    identityEvidence: 'stated',
    massEvidence: 'stated',
    scaleResolutionG: null,
    countEvidence: 'stated',
    plating: null,
    contactsPerPiece: null,
    padAreaMm2: null,
    areaCm2PerPiece: null,
    pieceMassG: null,
    wear: null,
    assay: null,
  })),
});
