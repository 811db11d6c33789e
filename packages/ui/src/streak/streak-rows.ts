import type { Quantiles } from '@lydite/valuation';
import { GRAMS_PER_OZT } from '../text/format-mass.ts';
import type { StreakBid, StreakEstimate } from './streak-types.ts';

export interface StreakRow {
  /** "1 in 20 is below" and so on, with the percentile it stands for. */
  label: string;
  percentile: number;
  goldG: number;
  goldOzt: number;
  /** At the reference price; null without one. */
  valueMinor: number | null;
  /** What the bid leaves at this content; null without a bid. */
  resultMinor: number | null;
}

const rows: [keyof Quantiles, number, string][] = [
  ['p05', 5, '1 in 20 holds less'],
  ['p10', 10, '1 in 10 holds less'],
  ['p25', 25, '1 in 4 holds less'],
  ['p50', 50, 'Middle'],
  ['p75', 75, '1 in 4 holds more'],
  ['p90', 90, '1 in 10 holds more'],
  ['p95', 95, '1 in 20 holds more'],
];

interface StreakTableInput {
  estimate: StreakEstimate;
  /** Minor units per fine gram. */
  pricePerGMinor?: number | null;
  bid?: StreakBid | null;
}

/** The chart as figures: seven percentiles with their gold, value and the result of the bid, minor units rounded. */
export function streakTable({ estimate, pricePerGMinor, bid }: StreakTableInput): StreakRow[] {
  return rows.map(([quantile, percentile, label]) => {
    const goldG = estimate.goldG.quantiles[quantile];
    return {
      label,
      percentile,
      goldG,
      goldOzt: goldG / GRAMS_PER_OZT,
      valueMinor: pricePerGMinor == null ? null : Math.round(goldG * pricePerGMinor),
      resultMinor: bid ? Math.round((goldG - bid.breakEvenG) * bid.resultPerGMinor) : null,
    };
  });
}
