/** What servers use of this package too: drawing, words and figures, without React. */
export { beadsAhead } from './streak/beads.ts';
export { streakTable, type StreakRow } from './streak/streak-rows.ts';
export { streakSvg } from './streak/streak-svg.ts';
export { streakText, type StreakText } from './streak/streak-text.ts';
export type { AssayMark, StreakBid, StreakEstimate, StreakInput, StreakOutline } from './streak/streak-types.ts';
export { EN_DASH, MINUS, NBSP } from './text/characters.ts';
export * from './text/format-mass.ts';
export * from './text/format-money.ts';
export * from './text/format-number.ts';
export * from './text/format-time.ts';
