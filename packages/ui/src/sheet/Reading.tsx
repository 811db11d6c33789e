import type { ReactNode } from 'react';
import { formatShare } from '../text/format-mass.ts';

interface ReadingProps {
  name: ReactNode;
  /** The figure itself; a unit or a joining word inside it goes into `i`. */
  value: ReactNode;
  children?: ReactNode;
}

/** One large figure of the bench with its name above and what it rests on below. */
export function Reading({ name, value, children }: ReadingProps) {
  return (
    <dl className="reading">
      <dt>{name}</dt>
      <dd>
        <b className="readout">{value}</b>
        {children}
      </dd>
    </dl>
  );
}

/** A line's share of the estimate's doubt, as a figure and as ticks. */
export function DoubtBar({ share }: { share: number }) {
  return (
    <div className="doubt">
      <small>{formatShare(share, 0)}</small>
      <i aria-hidden="true" style={{ width: `${Math.round(share * 160)}px`, maxWidth: '100%' }} />
    </div>
  );
}
