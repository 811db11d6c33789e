import { useMarket, useTitle, useWords } from '@lydite/client';
import type { LotRow, MyBidRow } from '@lydite/contracts';
import { buttonClass, EmptyState, Page, PageHead, Reading, StreakInline } from '@lydite/ui';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { groupOf, type BidGroup } from '../features/bids/bid-groups.ts';
import { myBidsQuery } from '../features/bids/bids.queries.ts';
import { BidRows } from '../features/bids/components/BidRows.tsx';
import { lotsQuery } from '../features/lots/lots.queries.ts';
import { termsQuery } from '../features/terms/terms.queries.ts';
import { rowMarks } from '../lib/worth/row-marks.ts';

const groups: readonly { key: BidGroup; title: string; note: string }[] = [
  { key: 'answer', title: 'Answer needed', note: 'Awards to pay into the hold, and lots offered to you.' },
  { key: 'highest', title: 'Highest', note: 'You lead here. The market bids on for you up to your most.' },
  { key: 'outbid', title: 'Outbid', note: 'Another buyer leads; you can bid again until the close.' },
  { key: 'over', title: 'Over', note: 'Closed lots you had bid on.' },
];

/** Own bids: what waits for an answer, what leads, what was outbid, and what all of it binds. */
export function Component() {
  useTitle('My bids');
  const { data: bids } = useSuspenseQuery(myBidsQuery);
  const { money } = useWords();
  const stoneOf = useStones();
  return (
    <Page>
      <PageHead title="My bids" />
      <div className="bench">
        <Reading name="If every lot you lead were won" value={money(bids.ifAllWonMinor)}>
          at the prices of now, before freight and fee
        </Reading>
        <Reading name="Room for further bids" value={money(bids.roomMinor)}>
          of your limit of {money(bids.limitMinor)}; your most on lots you lead and unpaid awards take their part
        </Reading>
      </div>
      {bids.rows.length === 0 ? (
        <div className="mt-8">
          <EmptyState
            title="You have not bid yet"
            action={
              <Link className={buttonClass('primary')} to="/">
                Look at the lots
              </Link>
            }
          >
            Lots you bid on will be here: what waits for your answer, where you lead, and where you were outbid.
          </EmptyState>
        </div>
      ) : (
        groups.map(({ key, title, note }) => {
          const rows = bids.rows.filter((row) => groupOf(row) === key);
          const isShown = rows.length > 0 || key !== 'over';
          return isShown && <BidRows key={key} title={title} note={note} rows={rows} stoneOf={stoneOf} />;
        })
      )}
    </Page>
  );
}

/** Small stones of lots still on the market, with the own notch; closed lots are not on the list of the market. */
function useStones() {
  const { price, buyerFeeBp } = useMarket();
  const { data: terms } = useSuspenseQuery(termsQuery);
  const { data: market } = useQuery(lotsQuery({ mine: 'bid' }));
  return useMemo(() => {
    const lots = new Map<string, LotRow>(market?.rows.map((row) => [row.code, row]));
    const marksOf = rowMarks(price && { terms, buyerFeeBp, pricePerGMinor: price.perGramMinor });
    return ({ lotCode }: MyBidRow) => {
      const lot = lots.get(lotCode);
      return lot ? <StreakInline estimate={lot.estimate} size="row" {...marksOf(lot)} /> : null;
    };
  }, [market, price, terms, buyerFeeBp]);
}
