export { beadsAhead } from './beads.ts';
export { bidAt, goldAt, gradeShare, GRADE_AXIS, streakAxisMaxG } from './streak-axis.ts';
export { streakSvg } from './streak-svg.ts';
export { streakTable, type StreakRow } from './streak-rows.ts';
export { streakText, type StreakText, type StreakTextInput, type TextRun } from './streak-text.ts';
export { Runs, Streak, type StreakProps } from './Streak.tsx';
export { StreakTable } from './StreakTable.tsx';
export type {
  AssayMark,
  MoneyScale,
  StreakBid,
  StreakEstimate,
  StreakInput,
  StreakOutline,
  StreakSize,
  StreakTheme,
} from './streak-types.ts';
export { NotchMark } from './NotchMark.tsx';
export { Standing, StreakAxisHead, StreakCell } from './StreakCell.tsx';
export { StreakCard, StreakInline } from './StreakCard.tsx';
