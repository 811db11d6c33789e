import { EN_DASH, NBSP } from './characters.ts';
import { formatNumber, formatSignificant } from './format-number.ts';

/** Grams in one troy ounce, exact by definition. */
export const GRAMS_PER_OZT = 31.1034768;

/** A mass that came off a scale, in the unit one would weigh it in: g below 1 kg, kg to the gram up to 10 t, else t. */
export function formatMassG(massG: number): string {
  const size = Math.abs(massG);
  if (size < 1000) return `${formatNumber(massG, { maximumFractionDigits: size < 10 ? 2 : 1 })}${NBSP}g`;
  if (size < 10_000_000) return `${formatNumber(massG / 1000, { maximumFractionDigits: 3 })}${NBSP}kg`;
  return `${formatNumber(massG / 1_000_000, { maximumFractionDigits: 2 })}${NBSP}t`;
}

/** Estimated gold, two significant digits and the unit: "64 g", "0.46 g". A laboratory's figure is printed as certified instead. */
export function formatGoldG(goldG: number): string {
  return `${formatSignificant(goldG, 2)}${NBSP}g`;
}

/** Fine grams of a settled or priced amount, to the hundredth: "47.62 g". */
export function formatFineG(goldG: number): string {
  return `${formatNumber(goldG, { minimumFractionDigits: 2, maximumFractionDigits: 2 })}${NBSP}g`;
}

/** A break-even content, one place more than the estimate's so that steps of a bid show: "53.1 g". */
export function formatBreakEvenG(goldG: number): string {
  const digits = Math.abs(goldG) >= 100 ? 4 : 3;
  return `${formatSignificant(goldG, digits)}${NBSP}g`;
}

/** Both ends of an estimated range: "50–83 g", or in a sentence "50 to 83 g". */
export function formatRange(range: readonly [number, number], unit = 'g', joint: 'dash' | 'words' = 'dash'): string {
  const [least, most] = range.map((value) => formatSignificant(value, 2));
  if (least === most) return `${least}${NBSP}${unit}`;
  return `${least}${joint === 'dash' ? EN_DASH : ' to '}${most}${NBSP}${unit}`;
}

/** Grade in grams of gold per tonne: "741 g/t" with three significant digits. */
export function formatGrade(gradeGPerT: number): string {
  return `${formatSignificant(gradeGPerT, 3)}${NBSP}g/t`;
}

/** A share of one as per cent: 0.064 is "6.4 %". */
export function formatShare(share: number, maximumFractionDigits = 1): string {
  return `${formatNumber(share * 100, { maximumFractionDigits })}${NBSP}%`;
}
