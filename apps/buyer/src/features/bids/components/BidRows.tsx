import { useWords } from '@lydite/client';
import type { MyBidRow } from '@lydite/contracts';
import { buttonClass, Standing } from '@lydite/ui';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { ClosingIn } from '../../../lib/Closing.tsx';
import { photoSrc } from '../../../lib/photo-src.ts';
import { groupOf } from '../bid-groups.ts';

interface BidRowsProps {
  title: string;
  /** Says what the group means, or what will be here. */
  note: string;
  rows: readonly MyBidRow[];
  /** The row's small stone, where the lot is still on the market. */
  stoneOf: (row: MyBidRow) => ReactNode;
}

/** One group of own bids as a ruled list. */
export function BidRows({ title, note, rows, stoneOf }: BidRowsProps) {
  return (
    <section className="mt-8">
      <h2>
        {title} <span className="mute font-normal">{rows.length}</span>
      </h2>
      <p className="small mute mt-1">{note}</p>
      {rows.length > 0 && (
        <ul className="ruled my-bids mt-3">
          {rows.map((row) => (
            <li key={row.lotCode}>
              <BidRow row={row} stone={stoneOf(row)} />
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

function BidRow({ row, stone }: { row: MyBidRow; stone: ReactNode }) {
  const { money, moment } = useWords();
  const isRunning = ['highest', 'outbid'].includes(groupOf(row));
  return (
    <div className="my-bid">
      <div className="lot-cell">
        {row.coverPhotoId && (
          <img src={photoSrc(row.coverPhotoId, 'list')} alt="" width="56" height="56" loading="lazy" />
        )}
        <div>
          <Link to={`/lots/${row.lotCode}`}>{row.title}</Link>
          <p className="mono">{row.lotCode}</p>
        </div>
      </div>
      <div className="my-bid-stone">{stone}</div>
      <dl className="my-bid-money">
        <div>
          <dt>{isRunning ? 'Highest bid' : 'Closed at'}</dt>
          <dd className="num">{row.priceMinor === null ? '–' : money(row.priceMinor)}</dd>
        </div>
        <div>
          <dt>Your most</dt>
          <dd className="num">{money(row.ceilingMinor)}</dd>
        </div>
      </dl>
      <p className="small">
        {isRunning ? 'Closes' : 'Closed'} {moment(row.closesAt)}
        {isRunning && (
          <span className="mute block">
            <ClosingIn closesAt={row.closesAt} />
          </span>
        )}
      </p>
      <div className="my-bid-next">
        <NextStep row={row} />
      </div>
    </div>
  );
}

function NextStep({ row }: { row: MyBidRow }) {
  const { money, moment } = useWords();
  const { lotCode, offer, dealCode, dealState, lotState, standing, leastNextMinor } = row;
  const group = groupOf(row);
  if (offer)
    return (
      <>
        <Link className={buttonClass('primary')} to={`/lots/${lotCode}/offer`}>
          Answer the offer at {money(offer.priceMinor)}
        </Link>
        <span className="mute">Stands until {moment(offer.answerBy)}</span>
      </>
    );
  if (dealState === 'awaiting_payment')
    return (
      <Link className={buttonClass('primary')} to={`/deals/${dealCode}`}>
        Pay into the hold
      </Link>
    );
  if (dealCode) return <Link to={`/deals/${dealCode}`}>Yours, deal {dealCode}</Link>;
  if (group === 'over') return <span className="mute">{overWords(lotState)}</span>;
  return (
    <>
      <Standing isHighest={standing === 'highest'} />
      {standing === 'outbid' && leastNextMinor !== null && (
        <Link to={`/lots/${lotCode}`}>Bid again from {money(leastNextMinor)}</Link>
      )}
    </>
  );
}

function overWords(lotState: MyBidRow['lotState']): string {
  if (lotState === 'unsold') return 'Ended unsold';
  if (lotState === 'withdrawn') return 'Withdrawn, your bid lapsed';
  if (lotState === 'open') return 'The result is being worked out';
  if (lotState === 'offered') return 'Offered to the next bidder';
  return 'Went to another buyer';
}
