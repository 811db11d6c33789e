import type { LotDraft } from '@lydite/contracts';
import type { Driver, Estimate, Warning } from '@lydite/valuation';

export interface Narrowing {
  /** What to measure, with the seller's own name of the line. */
  question: string;
  /** By how much the range of 8 results in 10 would get shorter, grams. */
  lessG: number;
}

const most = 3;
/** A gain below this share of the range is not worth anybody's time. */
const leastShare = 0.02;

const widthOf = ([low, high]: readonly [number, number]) => high - low;

/** Puts the seller's name of a line where the valuation, which knows none, counts lines. */
function withLineName(text: string, lineId: string | null, { lines }: LotDraft): string {
  const index = lines.findIndex(({ id }) => id === lineId);
  if (index < 0) return text;
  return text.replace(/\bline \d+/, lines[index]?.label || `line ${index + 1}`);
}

/** What would narrow the range most, best first; figures that one measurement answers are named once. */
export function narrowingOf(drivers: readonly Driver[], draft: LotDraft): Narrowing[] {
  const gains = new Map<string, number>();
  for (const { question, lineId, nowG, afterG } of drivers) {
    const lessG = widthOf(nowG) - widthOf(afterG);
    const name = withLineName(question, lineId, draft);
    if (lessG >= leastShare * widthOf(nowG)) gains.set(name, Math.max(lessG, gains.get(name) ?? 0));
  }
  return [...gains]
    .map(([question, lessG]) => ({ question, lessG }))
    .toSorted((a, b) => b.lessG - a.lessG)
    .slice(0, most);
}

/** The estimate's warnings with the seller's names of the lines. */
export const namedWarnings = ({ warnings }: Pick<Estimate, 'warnings'>, draft: LotDraft): Warning[] =>
  warnings.map((warning) => ({ ...warning, message: withLineName(warning.message, warning.lineId, draft) }));
