import type { LotView, MarketView, OwnMember } from '@lydite/contracts';
import { catalogue20261, estimateLot, type LineInput } from '@lydite/valuation';

/** Hours from now, as the API writes moments. */
export const inHours = (hours: number): string => new Date(Date.now() + hours * 3_600_000).toISOString();

export const market: MarketView = {
  currency: 'USD',
  zone: 'Europe/Berlin',
  now: new Date().toISOString(),
  buyerFeeBp: 200,
  sellerFeeBp: 400,
  price: { perGramMinor: 13_020, at: inHours(-1), source: 'demo series', stale: false },
  demo: null,
};

export const buyer: OwnMember = {
  id: '00000000-0000-4000-8000-000000000001',
  email: 'buying@sallowby.example',
  name: 'Sallowby Recovery',
  place: 'Sallowby',
  roles: ['buyer'],
  emailConfirmed: true,
  verified: true,
  limitMinor: 5_000_000,
};

export const terms = {
  recoveryYield: 0.93,
  accountableShare: 0.97,
  processingPerKgMinor: 250,
  batchCostMinor: 12_000,
  wantedChance: 0.8,
  marginShare: 0.08,
  rivals: 3,
  curseOn: true,
};

const line: LineInput = {
  id: '00000000-0000-4000-8000-0000000000aa',
  classCode: 'memory-modules',
  identityEvidence: 'inspected',
  massG: 86_400,
  massEvidence: 'weighed',
  scaleResolutionG: 20,
  pieces: 3120,
  countEvidence: 'counted',
  plating: null,
  contactsPerPiece: null,
  padAreaMm2: null,
  areaCm2PerPiece: null,
  pieceMassG: null,
  wear: null,
  assay: null,
};

const estimate = estimateLot({ lines: [line] }, catalogue20261, { seed: 4711 });

/** An open lot with bids, as a buyer who was outbid sees it. */
export const openLot = (changes: Partial<LotView> = {}): LotView => ({
  code: 'L-2481',
  state: 'open',
  title: 'Server memory',
  description: '',
  form: 'open-bids',
  basis: 'outright',
  place: 'Harrowmere',
  country: 'AT',
  delivery: { way: 'seller-sends', freightMinor: 6000, hours: '' },
  massG: 86_400,
  pieces: 3120,
  lines: [{ ...line, label: 'DDR3 and DDR4', className: 'Memory modules, gold contacts', hazards: '' }],
  photos: [],
  estimate,
  price: market.price!,
  listedAt: inHours(-100),
  closesAt: inHours(50),
  latestClosesAt: inHours(52),
  priceMinor: 240_000,
  startMinor: 100_000,
  leastNextMinor: 242_000,
  bidders: 3,
  bids: [],
  reserve: 'none',
  sellerRecord: { deliveredLots: 0, medianMassDifference: null },
  chain: [],
  you: { seller: false, standing: 'outbid', ceilingMinor: 200_000, roomMinor: 4_000_000, dealCode: null },
  ...changes,
});
