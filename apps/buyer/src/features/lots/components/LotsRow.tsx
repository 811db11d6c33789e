import { useMarket, useWords } from '@lydite/client';
import type { LotRow } from '@lydite/contracts';
import { formatDateTime, formatMassG, formatNumber, formatRange, NBSP, Standing, StreakCell } from '@lydite/ui';
import { memo } from 'react';
import { Link } from 'react-router-dom';
import { ClosingIn } from '../../../lib/Closing.tsx';
import { moveBetweenRows } from '../row-keys.ts';
import { photoSrc } from '../../../lib/photo-src.ts';

export interface RowMarks {
  breakEvenG: number | null;
  leadBreakEvenG: number | null;
}

const counted = (count: number, noun: string): string => `${formatNumber(count)} ${noun}${count === 1 ? '' : 's'}`;

/** Drawn again only when its own figures change, not with every price of the list. */
const Stone = memo(StreakCell);

/** One lot of the list. */
export function LotsRow({ row, marks }: { row: LotRow; marks: RowMarks }) {
  const { zone } = useMarket();
  const { p10, p90 } = row.estimate.goldG;
  return (
    <tr>
      <th scope="row" className="rack-lot">
        <LotCell row={row} />
      </th>
      <td className="cell-stone">
        <Stone subject={`lot ${row.code}`} estimate={row.estimate} {...marks} />
      </td>
      <td className="r rack-gold">
        {formatRange([p10, p90], '').trim()}
        <span className="unit">
          {NBSP}g<span className="phone-only"> of gold, 8 in 10</span>
        </span>
      </td>
      <td className="r rack-price">
        <Price row={row} />
      </td>
      <td className="rack-closes">
        <b className="nowrap">{formatDateTime(row.closesAt, zone, { zone: false })}</b>
        <small>
          <ClosingIn closesAt={row.closesAt} />
        </small>
      </td>
      <td className="rack-you">
        <OwnStanding row={row} />
      </td>
    </tr>
  );
}

function LotCell({ row }: { row: LotRow }) {
  return (
    <div className="lot-cell">
      {row.coverPhotoId ? (
        <img src={photoSrc(row.coverPhotoId, 'list')} alt="" width="56" height="56" loading="lazy" />
      ) : (
        <span className="rack-no-photo" aria-hidden="true" />
      )}
      <div>
        <Link to={`/lots/${row.code}`} data-lot-link onKeyDown={moveBetweenRows}>
          {row.title}
        </Link>
        <p>
          <span className="mono mr-2">{row.code}</span> {formatMassG(row.massG)}
          {row.pieces !== null && `, ${formatNumber(row.pieces)} pieces`}
        </p>
      </div>
    </div>
  );
}

function Price({ row: { form, priceMinor, startMinor, bidders } }: { row: LotRow }) {
  const { money } = useWords();
  if (form === 'asking-price')
    return (
      <>
        {priceMinor !== null && money(priceMinor)}
        <small>asking price</small>
      </>
    );
  if (priceMinor === null)
    return (
      <>
        <span className="unit">No bids</span>
        {startMinor !== null && <small>from {money(startMinor)}</small>}
      </>
    );
  return (
    <>
      {money(priceMinor)}
      <small>{counted(bidders, 'buyer')}</small>
    </>
  );
}

function OwnStanding({ row: { you, code } }: { row: LotRow }) {
  const { money } = useWords();
  if (!you) return null;
  const isHighest = you.standing === 'highest';
  return (
    <>
      <Standing isHighest={isHighest} />
      <small>yours {money(you.ceilingMinor)}</small>
      {!isHighest && (
        <Link className="rack-again" to={`/lots/${code}`}>
          Bid again
        </Link>
      )}
    </>
  );
}
