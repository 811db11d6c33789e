import type { ReactNode } from 'react';

export interface Fact {
  name: ReactNode;
  value: ReactNode;
}

/** Names and values, ruled. */
export function FactList({ facts }: { facts: readonly Fact[] }) {
  return (
    <dl className="fact-list">
      {facts.map(({ name, value }, i) => (
        <div key={i} className="contents">
          <dt>{name}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}

interface PagerProps {
  from: number;
  to: number;
  total: number;
  noun: string;
  /** Links to the neighbouring pages, null at the ends. */
  previous?: ReactNode;
  next?: ReactNode;
  /** What stands at the right, such as the time of the last refresh. */
  end?: ReactNode;
}

/** Which part of a list is shown, and the way to the next. */
export function Pager({ from, to, total, noun, previous, next, end }: PagerProps) {
  return (
    <nav className="pager" aria-label={`Pages of ${noun}`}>
      <span>
        {total === 0
          ? `No ${noun}`
          : from === 1 && to === total
            ? `All ${total} ${noun}`
            : `${from} to ${to} of ${total} ${noun}`}
      </span>
      <span className="flex gap-3">
        {previous}
        {next}
      </span>
      {end}
    </nav>
  );
}
