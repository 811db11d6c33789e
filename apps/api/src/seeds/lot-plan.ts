import { randomUUID } from 'node:crypto';
import type { LineDraft, LotDraft, PhotoSlot } from '@lydite/contracts';
import type { PhotoFile } from './album.ts';

export interface PhotoPlan {
  file: PhotoFile;
  slot: PhotoSlot;
  description: string;
}

/** A lot as its seller describes it. The place is the seller's. */
export interface LotPlan {
  title: string;
  description: string;
  lines: LineDraft[];
  photos: PhotoPlan[];
  sale: LotDraft['sale'];
  delivery: Omit<LotDraft['delivery'], 'place'>;
  declarations?: Partial<LotDraft['declarations']>;
}

type Facts = Partial<Omit<LineDraft, 'id' | 'label' | 'classCode'>>;

/** A line; what is not said is not known. */
export const line = (classCode: string, label: string, ...facts: Facts[]): LineDraft =>
  Object.assign<LineDraft, Facts>(
    {
      id: randomUUID(),
      label,
      classCode,
      identityEvidence: 'photographed',
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
    },
    Object.assign({}, ...facts) as Facts,
  );

const mass = (kg: number): Facts => ({ massG: Math.round(kg * 1_000_000) / 1000, massText: String(kg) });

export const statedKg = (kg: number): Facts => ({ ...mass(kg), massEvidence: 'stated' });
export const weighedKg = (kg: number, scaleResolutionG: number): Facts => ({
  ...mass(kg),
  massEvidence: 'weighed',
  scaleResolutionG,
});
export const counted = (pieces: number): Facts => ({ pieces, countEvidence: 'counted' });
export const countedOnPhoto = (pieces: number): Facts => ({ pieces, countEvidence: 'counted-on-photo' });
export const about = (pieces: number): Facts => ({ pieces, countEvidence: 'stated' });
export const inspected: Facts = { identityEvidence: 'inspected' };

const minor = (dollars: number): number => Math.round(dollars * 100);

/** Open bids for so many days, in dollars. */
export const bidsFrom = (start: number, { days, reserve }: { days: number; reserve?: number }): LotDraft['sale'] => ({
  form: 'open-bids',
  startMinor: minor(start),
  reserveMinor: reserve === undefined ? null : minor(reserve),
  askingMinor: null,
  days,
});
export const asking = (price: number, { days }: { days: number }): LotDraft['sale'] => ({
  form: 'asking-price',
  startMinor: null,
  reserveMinor: null,
  askingMinor: minor(price),
  days,
});

export const sentFor = (freight: number): LotPlan['delivery'] => ({
  way: 'seller-sends',
  freightMinor: minor(freight),
  hours: '',
});
export const collected = (hours: string): LotPlan['delivery'] => ({ way: 'collection', freightMinor: null, hours });

/** What the plan says as the market's draft. */
export const toDraft = (plan: LotPlan, place: string): LotDraft => ({
  title: plan.title,
  description: plan.description,
  lines: plan.lines,
  sale: plan.sale,
  delivery: { ...plan.delivery, place },
  declarations: {
    rightToSell: true,
    batteries: 'removed',
    batteriesNote: '',
    mercuryOrBeryllium: 'none',
    hazardNote: '',
    country: 'AT',
    ...plan.declarations,
  },
});
