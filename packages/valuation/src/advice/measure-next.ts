import type { Driver } from '../types.ts';

/** One measurement worth making, with all that it would answer. */
export interface NextMeasurement {
  question: string;
  /** The line it is about; null when lines of one class share what it answers. */
  lineId: string | null;
  classCode: string;
  /** Figures it would replace. */
  parameters: string[];
  /** Share of the variance that comes from them, 0 … 1, to first order. */
  share: number;
  nowG: [number, number];
  afterG: [number, number];
  /** By how many grams the range from p10 to p90 is expected to shrink. */
  narrowerG: number;
}

const widthOf = ([low, high]: readonly [number, number]) => high - low;

/**
 * What to measure next: the drivers with those that one measurement answers merged, what narrows the range most first; what
 * would not narrow it is left out.
 * @param leastShare of the present width that a measurement must take off, 0 … 1; 2 % by default
 */
export function measureNext(drivers: readonly Driver[], leastShare = 0.02): NextMeasurement[] {
  const byQuestion = new Map<string, NextMeasurement>();
  for (const { question, lineId, classCode, parameter, share, nowG, afterG } of drivers) {
    const known = byQuestion.get(question);
    if (known) {
      known.parameters.push(parameter);
      known.share += share;
      continue;
    }
    const narrowerG = widthOf(nowG) - widthOf(afterG);
    byQuestion.set(question, { question, lineId, classCode, parameters: [parameter], share, nowG, afterG, narrowerG });
  }
  return [...byQuestion.values()]
    .filter(({ nowG, narrowerG }) => narrowerG > 0 && narrowerG >= leastShare * widthOf(nowG))
    .sort((a, b) => b.narrowerG - a.narrowerG);
}
