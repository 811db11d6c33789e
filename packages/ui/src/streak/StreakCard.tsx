import { useId } from 'react';
import { NBSP } from '../text/characters.ts';
import { formatRange } from '../text/format-mass.ts';
import { formatSignificant } from '../text/format-number.ts';
import { streakAxisMaxG } from './streak-axis.ts';
import { outlineOf, type StreakEstimate, type StreakOutline, type StreakSize } from './streak-types.ts';
import { StreakStone } from './StreakStone.tsx';

interface StreakCardProps {
  estimate: StreakEstimate | StreakOutline | null;
  /** Where the estimate stood before the seller said more, and how to name that: "With photos alone". */
  before?: { estimate: StreakEstimate | StreakOutline; label: string } | null;
  axisMaxG?: number | null;
}

/** The seller's side of the stone: what buyers would see, and how far the last answer narrowed it. */
export function StreakCard({ estimate, before, axisMaxG }: StreakCardProps) {
  const ownMax = estimate ? streakAxisMaxG(estimate) : 0;
  const maxG = axisMaxG ?? Math.max(ownMax, before ? streakAxisMaxG(before.estimate) : 0);
  const range = (of: StreakEstimate | StreakOutline) =>
    formatRange([outlineOf(of).goldG.p10, outlineOf(of).goldG.p90], 'g', 'words');
  return (
    <div className="streak-card">
      <StreakStone id={useId()} size="card" estimate={estimate} before={before?.estimate} axisMaxG={maxG || null} />
      {estimate ? (
        <>
          <div className="axis" aria-hidden="true">
            <span>0</span>
            <span>{formatSignificant(maxG / 2, 3)}</span>
            <span>
              {formatSignificant(maxG, 3)}
              {NBSP}g
            </span>
          </div>
          <p className="say">
            <b>{range(estimate)}</b> of gold, 8 results in 10
          </p>
        </>
      ) : (
        <p className="say">Say what is in the lot, and its streak appears here.</p>
      )}
      {before && (
        <p className="key">
          <i aria-hidden="true" />
          {before.label}: {range(before.estimate)}
        </p>
      )}
    </div>
  );
}

interface StreakInlineProps {
  estimate: StreakEstimate | StreakOutline | null;
  size?: Extract<StreakSize, 'row' | 'inline' | 'medium'>;
  axisMaxG?: number | null;
  breakEvenG?: number | null;
  leadBreakEvenG?: number | null;
  closed?: boolean;
}

/** A small stone beside its range in text; without the text it would be a mere ornament. */
export function StreakInline({ estimate, size = 'inline', ...marks }: StreakInlineProps) {
  const id = useId();
  if (!estimate) return <span className="mute">Not yet estimated</span>;
  const { p10, p90 } = outlineOf(estimate).goldG;
  return (
    <span className="inline-flex flex-wrap items-center gap-2">
      <StreakStone id={id} size={size} estimate={estimate} {...marks} />
      <span className="nowrap">{formatRange([p10, p90])}</span>
    </span>
  );
}
