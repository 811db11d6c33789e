import type { LineDraft, LotDraft, MyLotView } from '@lydite/contracts';

/** A line of memory modules, counted and weighed; a test states only what matters to it. */
export const aLine = (change: Partial<LineDraft> = {}): LineDraft => ({
  id: '00000000-0000-4000-8000-000000000001',
  label: 'DDR3 registered',
  classCode: 'memory-modules',
  identityEvidence: 'stated',
  massG: 52_100,
  massText: '52.1',
  massUnit: 'kg',
  massEvidence: 'weighed',
  scaleResolutionG: 20,
  pieces: 1940,
  countEvidence: 'counted',
  plating: null,
  contactsPerPiece: null,
  padAreaMm2: null,
  areaCm2PerPiece: null,
  pieceMassG: null,
  wear: null,
  assay: null,
  ...change,
});

export const aDraft = (change: Partial<LotDraft> = {}): LotDraft => ({
  title: 'Server memory, 52 kg',
  description: '',
  lines: [aLine()],
  sale: { form: 'open-bids', startMinor: 150_000, reserveMinor: null, askingMinor: null, days: 7 },
  delivery: { way: 'seller-sends', freightMinor: 8500, place: 'Thrennaby', hours: '' },
  declarations: {
    rightToSell: false,
    batteries: null,
    batteriesNote: '',
    mercuryOrBeryllium: null,
    hazardNote: '',
    country: '',
  },
  ...change,
});

export const aLot = (change: Partial<MyLotView> = {}): MyLotView => ({
  code: 'L-2490',
  state: 'draft',
  version: 3,
  savedAt: '2026-12-01T13:22:00.000Z',
  draft: aDraft(),
  photos: [],
  missing: [],
  listedAt: null,
  closesAt: null,
  priceMinor: null,
  bidders: 0,
  reserveReached: null,
  dealCode: null,
  ...change,
});
