import type { WeighInRequest } from '@lydite/contracts';
import { massDifference, type MassDifference } from '@lydite/valuation';
import type { MeasureEntry } from '@lydite/ui';

/** What the form holds while it is filled in: figures with the text and unit they were entered in. */
export interface WeighInEntries {
  gross: MeasureEntry;
  tare: MeasureEntry;
  resolution: MeasureEntry;
  scaleSerial: string;
  note: string;
}

/** Grams to the milligram, the finest the market keeps; takes off what converting pounds and adding in binary leaves. */
const toMilligram = (massG: number): number => Math.round(massG * 1000) / 1000;

/** Net mass in grams by arithmetic, gross less tare; null until both are there. May be negative when they are swapped. */
export const netOf = ({ gross, tare }: Pick<WeighInEntries, 'gross' | 'tare'>): number | null =>
  gross.value === null || tare.value === null ? null : toMilligram(toMilligram(gross.value) - toMilligram(tare.value));

/** The net mass against the declared one; null until there is a net mass and a resolution to judge it by. */
export function differenceOf(entries: WeighInEntries, declaredG: number): MassDifference | null {
  const netG = netOf(entries);
  const resolutionG = entries.resolution.value;
  if (netG === null || netG <= 0 || resolutionG === null) return null;
  return massDifference(declaredG, netG, { resolutionG });
}

/** The request as it stands; figures that are missing are NaN, so that its schema names them. */
export function toWeighInRequest(entries: WeighInEntries, photoIds: string[]): WeighInRequest {
  const grams = ({ value }: MeasureEntry): number => (value === null ? Number.NaN : toMilligram(value));
  return {
    grossG: grams(entries.gross),
    tareG: grams(entries.tare),
    scaleResolutionG: grams(entries.resolution),
    scaleSerial: entries.scaleSerial.trim(),
    note: entries.note.trim(),
    photoIds,
  };
}
