import { useId, type ReactNode } from 'react';
import { formatNumber } from '../text/format-number.ts';
import { NotchMark } from './NotchMark.tsx';
import { gradeShare, gradeTicks } from './streak-axis.ts';
import { outlineOf, type StreakEstimate, type StreakOutline } from './streak-types.ts';
import { StreakStone } from './StreakStone.tsx';

interface StreakCellProps {
  /** Names the lot for assistive technology. */
  subject: string;
  estimate: StreakEstimate | StreakOutline;
  breakEvenG?: number | null;
  leadBreakEvenG?: number | null;
}

/** One lot on the list's common stone: grade on a log axis, so that lots of any mass compare down the column. */
export function StreakCell({ subject, estimate, breakEvenG, leadBreakEvenG }: StreakCellProps) {
  const grade = (goldG: number) => formatNumber((goldG / estimate.massG) * 1e6, { maximumSignificantDigits: 2 });
  const { p10, p90 } = outlineOf(estimate).goldG;
  const marks = [
    breakEvenG == null ? '' : ` Your bid breaks even at ${grade(breakEvenG)}.`,
    leadBreakEvenG == null ? '' : ` The highest bid of another buyer breaks even at ${grade(leadBreakEvenG)}.`,
  ];
  return (
    <StreakStone
      id={useId()}
      size="cell"
      estimate={estimate}
      breakEvenG={breakEvenG}
      leadBreakEvenG={leadBreakEvenG}
      title={`Grade of ${subject}`}
      description={`${grade(p10)} to ${grade(p90)} grams of gold per tonne in 8 results of 10.${marks.join('')}`}
    />
  );
}

interface StreakAxisHeadProps {
  /** Medians of settled assays by kind, as landmarks on the axis. */
  marks?: readonly { name: string; gradeGPerT: number }[];
  /** What the landmarks are. */
  marksNote?: string;
  /** The column's name, where a page makes it a link that sorts. */
  label?: ReactNode;
}

/** Head of the list's streak column: the common axis and its landmarks. Stands in a `th` with its own label. */
export function StreakAxisHead({
  marks = [],
  marksNote = 'Marks: settled assays, by kind',
  label = 'Grade, grams of gold per tonne',
}: StreakAxisHeadProps) {
  const left = (share: number) => ({ left: `${(share * 100).toFixed(2)}%` });
  return (
    <>
      <div className="axis-head-names">
        <span>{label}</span>
        {marks.length > 0 && <span>{marksNote}</span>}
      </div>
      <div className="axis-head" aria-hidden="true">
        {marks.map(({ name, gradeGPerT }) => (
          <span key={name} className="mark-name" style={left(gradeShare(gradeGPerT))}>
            {name}
          </span>
        ))}
        {marks.map(({ name, gradeGPerT }) => (
          <i key={name} style={left(gradeShare(gradeGPerT))} />
        ))}
        {gradeTicks().map(({ gradeGPerT, share, isSparse }) => (
          <span key={gradeGPerT} className={isSparse ? 'tick' : 'tick tick-dense'} style={left(share)}>
            {formatNumber(gradeGPerT)}
          </span>
        ))}
      </div>
    </>
  );
}

/** A bidder's standing in words, with the notch's own sign: solid leads, open is another's. */
export function Standing({ isHighest }: { isHighest: boolean }) {
  return (
    <b className="nowrap">
      <NotchMark isOwn={isHighest} />
      {isHighest ? 'Highest' : 'Outbid'}
    </b>
  );
}
