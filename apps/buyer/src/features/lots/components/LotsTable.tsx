import { useMarket } from '@lydite/client';
import type { LotQuery, LotRow } from '@lydite/contracts';
import { formatDateTime, NBSP, StreakAxisHead } from '@lydite/ui';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { lotSearch } from '../lot-search.ts';
import { LotsRow, type RowMarks } from './LotsRow.tsx';

interface LotsTableProps {
  query: LotQuery;
  rows: readonly LotRow[];
  landmarks: readonly { name: string; gradeGPerT: number }[];
  /** Where own and leading bids break even on a row's stone; needs the buyer's terms. */
  marksOf: (row: LotRow) => RowMarks;
}

/** The open lots down one stone: richness and sureness compare by eye along the common grade axis. */
export function LotsTable({ query, rows, landmarks, marksOf }: LotsTableProps) {
  const { currency, now, zone } = useMarket();
  const zoneName = formatDateTime(now, zone).split(' ').at(-1);
  return (
    <table className="table rack">
      <caption className="sr-only">Lots that can be bid on or taken; amounts in {currency}</caption>
      <thead>
        <tr>
          <th scope="col">Lot</th>
          <SortHead {...{ query }} sort="-grade" className="cell-axis" label="Grade, grams of gold per tonne">
            {(name) => <StreakAxisHead marks={landmarks} marksNote="Marks: middle of the kind" label={name} />}
          </SortHead>
          <SortHead {...{ query }} sort="-gold" className="r" label={`Gold in lot, 8${NBSP}in${NBSP}10`} />
          <SortHead {...{ query }} sort="price" className="r" label="Highest bid or price" />
          <SortHead {...{ query }} sort="closes" label={`Closes, ${zoneName}`} />
          <th scope="col">You</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <LotsRow key={row.code} row={row} marks={marksOf(row)} />
        ))}
      </tbody>
    </table>
  );
}

interface SortHeadProps {
  query: LotQuery;
  sort: LotQuery['sort'];
  label: string;
  className?: string;
  /** Puts the name into more than a line of text. */
  children?: (name: ReactNode) => ReactNode;
}

/** A column's head that orders the list by it. */
function SortHead({ query, sort, label, className, children = (name) => name }: SortHeadProps) {
  const isSorted = query.sort === sort;
  const isDescending = sort.startsWith('-');
  const name = (
    <>
      <Link className="sort-button" to={{ search: lotSearch(query, { sort }) }} preventScrollReset>
        {label}
      </Link>
      {isSorted && <span aria-hidden="true"> {isDescending ? '↓' : '↑'}</span>}
    </>
  );
  const order = isDescending ? 'descending' : 'ascending';
  return (
    <th scope="col" className={className} aria-sort={isSorted ? order : undefined}>
      {children(name)}
    </th>
  );
}
