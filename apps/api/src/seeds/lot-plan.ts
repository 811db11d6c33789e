import { randomUUID } from 'node:crypto';
import type { LineDraft, LotDraft, PhotoSlot } from '@lydite/contracts';
import type { PhotoFile } from './album.ts';
import type { ScalePicture, Weighing } from './scale-reading.ts';

/** What a photo shows; the picture of a scale also what was on it. */
export type Picture = { file: Exclude<PhotoFile, ScalePicture> } | { file: ScalePicture; weighing: Weighing };

export type PhotoPlan = Picture & { slot: PhotoSlot; description: string };

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

interface OnScale {
  netKg: number;
  tareKg: number;
  resolutionG: number;
}

/** A picture of a scale on which so much lies. */
export const onScale = (file: ScalePicture, { netKg, tareKg, resolutionG }: OnScale): Picture => ({
  file,
  weighing: { netG: Math.round(netKg * 1000), tareG: Math.round(tareKg * 1000), resolutionG },
});
export const sackOnScale = (on: OnScale, description: string): PhotoPlan => ({
  ...onScale('sack-floor-scale', on),
  slot: 'on-scale',
  description,
});
/** Memory in the one kind of crate that it is kept in. */
export const memoryOnScale = (netKg: number): PhotoPlan => ({
  ...onScale('memory-crate-scale', { netKg, tareKg: 1.24, resolutionG: 10 }),
  slot: 'on-scale',
  description: 'The crate on the scale',
});

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
