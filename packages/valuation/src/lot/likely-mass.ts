import type { MaterialClass } from '../catalogue/catalogue.types.ts';

/** A digit too many or too few, or kilograms for grams. */
const slips = [0.1, 10, 0.001, 1000];

/** Whether pieces of this class can well weigh so much each, grams; true where the catalogue can't say. */
export function isUsualPieceMass(eachG: number, { pieceMassG }: Pick<MaterialClass, 'pieceMassG'>): boolean {
  const prior = pieceMassG?.quantity;
  return prior?.kind !== 'lognormal' || Math.abs(Math.log(eachG / prior.median)) <= 3 * Math.log(prior.gsd);
}

/**
 * The mass that was likely meant when the stated one is out of the usual for so many pieces: the same digits with the point
 * or the unit set right, in grams. Null when the stated mass is usual or no such slip explains it.
 */
export function likelyMassG(
  { massG, pieces }: { massG: number; pieces: number },
  materialClass: Pick<MaterialClass, 'pieceMassG'>,
): number | null {
  const isUsual = (wholeG: number) => isUsualPieceMass(wholeG / pieces, materialClass);
  if (isUsual(massG)) return null;
  return slips.map((by) => massG * by).find(isUsual) ?? null;
}
