import { exact, lognormal, uniform } from '../../quantity/quantity.ts';
import type { Parameter } from '../catalogue.types.ts';

export const ln = (median: number, gsd: number, source: string): Parameter => ({
  quantity: lognormal(median, gsd),
  source,
});
export const between = (lo: number, hi: number, source: string): Parameter => ({ quantity: uniform(lo, hi), source });
export const fixed = (value: number, source: string): Parameter => ({ quantity: exact(value), source });

/** Pure deposits and bond wire. */
const pureGold = fixed(19.32, 'LBMA figure for gold at room temperature (CRC Handbook: 19.3 g/cm³)');

/** Immersion gold and wire count as all gold. */
export const pureDensity = { densityGPerCm3: pureGold };

/** Soft gold on pins and lids: a pure deposit. */
export const pureDeposit = {
  ...pureDensity,
  goldFraction: fixed(1, 'MIL-DTL-45204D type III: 99.9 % gold, taken as 1'),
};

/** Contacts hardened with cobalt or nickel: less dense than gold alone. */
export const hardDeposit = {
  densityGPerCm3: between(
    17,
    18,
    'ASTM B488: deposits are often less dense than 19.3 g/cm³; about 17.0 to 17.5 for hard gold, assumed',
  ),
  goldFraction: fixed(0.997, 'MIL-DTL-45204D type I: 99.7 % gold'),
};

export const weighedPieces = 'assumed: weights of common pieces of this kind';
export const goldWire = 'common practice, no source: 25 µm gold wire';
