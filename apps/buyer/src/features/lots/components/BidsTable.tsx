import { useMarket, useWords } from '@lydite/client';
import type { LotView } from '@lydite/contracts';
import { formatDateTime } from '@lydite/ui';
import type { ReactNode } from 'react';

interface BidsTableProps {
  lot: Pick<LotView, 'bids' | 'startMinor' | 'reserve' | 'closesAt' | 'state'>;
  /** Stands under the table: when it was read. */
  children?: ReactNode;
}

const reserveSentences: Record<LotView['reserve'], string> = {
  reached: 'The seller’s lowest price is reached.',
  'not-reached': 'The seller’s lowest price is not reached yet.',
  none: 'The seller set no lowest price above the start.',
};

/** The bidding so far, under aliases: what the lot stood at after each bid. What anybody would pay at most is in nobody's view. */
export function BidsTable({ lot, children }: BidsTableProps) {
  const { zone, currency } = useMarket();
  const { shortMoment, money } = useWords();
  const zoneName = formatDateTime(lot.closesAt, zone).split(' ').at(-1);
  return (
    <section>
      <h2>Bids</h2>
      {lot.bids.length === 0 ? (
        <p className="mute mt-3">
          {lot.state === 'open' && lot.startMinor !== null
            ? `No bids yet. The first bid starts at ${money(lot.startMinor)}.`
            : 'Nobody bid.'}
        </p>
      ) : (
        <table className="table">
          <caption className="sr-only">Bids, the newest first</caption>
          <thead>
            <tr>
              <th scope="col">When, {zoneName}</th>
              <th scope="col">Buyer</th>
              <th scope="col" className="r">
                Price after it, {currency}
              </th>
            </tr>
          </thead>
          <tbody>
            {lot.bids.map(({ alias, amountMinor, at }, i) => (
              <tr key={`${at} ${i}`}>
                <td className="num">{shortMoment(at)}</td>
                <td>{alias}</td>
                <td className="r">{money(amountMinor)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
      <p className="small mute mt-3">{reserveSentences[lot.reserve]}</p>
      {children}
    </section>
  );
}
