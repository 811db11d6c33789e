import { exact, lognormal, normal, uniform, within } from '../quantity/quantity.ts';
import type { IdentityEvidence, LineInput, PlatingEvidence, Quantity } from '../types.ts';

/** Spread of "is it really this class" around 1, by how it is known. Assumed; to be set anew from settled assays. */
const identityGsd: Record<IdentityEvidence, number> = { stated: 1.25, photographed: 1.12, inspected: 1.05 };

/** Uniform half-widths. Assumed. */
const statedShare = 0.05;
const photoCountShare = 0.01;
/** Stands in for a resolution nobody gave: the market's weighing tolerance. */
const scaleShare = 0.005;

/** A coating made to a standard's minimum is at most this much thicker. Assumed. */
const mostAboveMinimum = 1.6;
/** Relative sd of an XRF thickness reading: method uncertainty below 10 %, taken as two sd. */
const xrfRelativeSd = 0.05;

/** Factor on the whole line's gold for the doubt about its class. A count makes it as sure as an inspection does. */
export function identityQuantity(line: LineInput): Quantity {
  const counted = line.pieces !== null && line.countEvidence === 'counted';
  return lognormal(1, counted ? identityGsd.inspected : identityGsd[line.identityEvidence]);
}

/** Net mass in grams: a scale's reading is uniform over its resolution, a stated one within 5 %. */
export function massQuantity(massG: number, line: Pick<LineInput, 'massEvidence' | 'scaleResolutionG'>): Quantity {
  if (line.massEvidence === 'stated') return within(massG, statedShare);
  if (line.scaleResolutionG === null) return within(massG, scaleShare);
  const half = line.scaleResolutionG / 2;
  return half === 0 ? exact(massG) : uniform(Math.max(0, massG - half), massG + half);
}

/** Number of pieces: counted is exact, counted on the photo within 1 %, stated within 5 %. */
export function countQuantity(pieces: number, { countEvidence }: Pick<LineInput, 'countEvidence'>): Quantity {
  if (countEvidence === 'counted') return exact(pieces);
  return within(pieces, countEvidence === 'counted-on-photo' ? photoCountShare : statedShare);
}

/** Thickness in µm that replaces the class's own. */
export function thicknessQuantity(plating: PlatingEvidence): Quantity {
  switch (plating.kind) {
    case 'standard':
      return uniform(plating.minimumUm, plating.minimumUm * mostAboveMinimum);
    case 'range':
      return uniform(plating.leastUm, plating.mostUm);
    case 'xrf':
      return normal(plating.thicknessUm, plating.thicknessUm * xrfRelativeSd);
  }
}

/** Grade in g/t around a laboratory's result; the relative sd is that of the lognormal itself. */
export function assayQuantity({ gradeGPerT, relativeSd }: NonNullable<LineInput['assay']>): Quantity {
  if (gradeGPerT === 0 || relativeSd === 0) return exact(gradeGPerT);
  return lognormal(gradeGPerT, Math.exp(Math.sqrt(Math.log(1 + relativeSd ** 2))));
}
