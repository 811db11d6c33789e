import { tickStep, ticks } from 'd3-array';
import { scaleLinear, scaleLog } from 'd3-scale';
import type { StreakGeometry } from './geometry.ts';
import { outlineOf, type MoneyScale, type StreakEstimate, type StreakOutline } from './streak-types.ts';

/** Ends of the list's common axis, grams of gold per tonne. */
export const GRADE_AXIS: readonly [number, number] = [10, 20_000];
/** Wanted number of ticks on the wide stone. */
const TICKS = 12;
const GRADE_TICKS = [20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000];
/** Those that keep their figure on a narrow stone, where all would run into one another. */
const SPARSE_TICKS = new Set([20, 100, 500, 2000, 10_000]);

export interface StreakAxis {
  /** Position in px of an amount of gold in grams. */
  x: (goldG: number) => number;
  /** Positions of the grid lines in px. */
  grid: number[];
}

/** End of the gram axis: 1.1 times the 99.5th percentile, carried on to the next tick so that the axis ends on a figure. */
export function streakAxisMaxG(estimate: StreakEstimate | StreakOutline): number {
  const wanted = outlineOf(estimate).goldG.p99_5 * 1.1;
  // A lot without gold still has a stone to draw it on.
  if (!(wanted > 0)) return 1;
  const roundUp = (step: number) => Math.ceil(wanted / step - 1e-9) * step;
  // Rounding up can push the axis over to the next coarser tick; the second pass then ends on that one.
  const rounded = roundUp(tickStep(0, wanted, TICKS));
  return roundUp(tickStep(0, rounded, TICKS));
}

/** Ticks in grams from 0 to the end of the axis. */
export function goldTicks(axisMaxG: number, count: number): number[] {
  return ticks(0, axisMaxG, count);
}

/** Grid of the small stones, whose axis carries no figures of its own. */
const QUARTERS = [0.25, 0.5, 0.75];

/** The linear gram axis of a single lot. */
export function linearAxis({ width, gridLines }: StreakGeometry, axisMaxG: number): StreakAxis {
  const scale = scaleLinear([0, axisMaxG], [0, width]);
  if (gridLines === 'none') return { x: scale, grid: [] };
  if (gridLines === 'quarters') return { x: scale, grid: QUARTERS.map((share) => share * width) };
  return {
    x: scale,
    grid: goldTicks(axisMaxG, gridLines)
      .filter((goldG) => goldG > 0 && goldG < axisMaxG)
      .map(scale),
  };
}

/** The list's axis: grade on a log scale, so that lots of any mass compare. `massG` turns gold into grade. */
export function gradeAxis(geometry: StreakGeometry, massG: number): StreakAxis {
  const scale = scaleLog(GRADE_AXIS, [0, geometry.width]).clamp(true);
  const x = (goldG: number) => scale(Math.max((goldG / massG) * 1e6, GRADE_AXIS[0] / 10));
  return { x, grid: GRADE_TICKS.map(scale) };
}

/** Ticks of the list's axis as shares of its width, for the head of the column. */
export function gradeTicks(): { gradeGPerT: number; share: number; isSparse: boolean }[] {
  return GRADE_TICKS.map((gradeGPerT) => ({
    gradeGPerT,
    share: gradeShare(gradeGPerT),
    isSparse: SPARSE_TICKS.has(gradeGPerT),
  }));
}

/** Where a grade stands on the list's axis, 0 … 1. */
export function gradeShare(gradeGPerT: number): number {
  return scaleLog(GRADE_AXIS, [0, 1]).clamp(true)(gradeGPerT);
}

/** The bid in minor units that breaks even at an amount of gold, not below 0. */
export function bidAt(goldG: number, money: MoneyScale): number {
  return Math.max(0, money.atZeroMinor + money.perGMinor * goldG);
}

/** The gold in grams at which a bid breaks even. */
export function goldAt(amountMinor: number, money: MoneyScale): number {
  return (amountMinor - money.atZeroMinor) / money.perGMinor;
}

/** Round bids for the upper edge, each with the gold it needs. */
export function moneyTicks(
  axisMaxG: number,
  money: MoneyScale,
  count: number,
): { amountMinor: number; goldG: number }[] {
  const fromMinor = Math.max(0, money.atZeroMinor);
  return ticks(fromMinor / 100, bidAt(axisMaxG, money) / 100, count).map((amount) => {
    const amountMinor = Math.round(amount * 100);
    return { amountMinor, goldG: goldAt(amountMinor, money) };
  });
}
