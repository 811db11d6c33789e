import { randomUUID } from 'node:crypto';
import type { LineDraft, LotDraft } from '@lydite/contracts';

/** A weighed and counted line of memory modules, unless told otherwise. */
export const lineOf = (line: Partial<LineDraft> = {}): LineDraft => ({
  id: randomUUID(),
  label: 'DDR3 registered, double-sided',
  classCode: 'memory-modules',
  identityEvidence: 'photographed',
  massG: 12_400,
  massText: '12.4',
  massUnit: 'kg',
  massEvidence: 'weighed',
  scaleResolutionG: 10,
  pieces: 560,
  countEvidence: 'counted',
  plating: null,
  contactsPerPiece: null,
  padAreaMm2: null,
  areaCm2PerPiece: null,
  pieceMassG: null,
  wear: null,
  assay: null,
  ...line,
});

/** A draft that lacks nothing but a photo: open bids from 400.00, sent by the seller for 18.00. */
export const completeDraft = (draft: Partial<LotDraft> = {}): LotDraft => ({
  title: 'Server memory, DDR3 registered',
  description: 'Pulled from rack servers, dry and clean.',
  lines: [lineOf()],
  sale: { form: 'open-bids', startMinor: 40_000, reserveMinor: null, askingMinor: null, days: 7 },
  delivery: { way: 'seller-sends', freightMinor: 1800, place: 'Harrowmere', hours: '' },
  declarations: {
    rightToSell: true,
    batteries: 'removed',
    batteriesNote: '',
    mercuryOrBeryllium: 'none',
    hazardNote: '',
    country: 'AT',
  },
  ...draft,
});
