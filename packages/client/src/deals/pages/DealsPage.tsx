import type { DealRow } from '@lydite/contracts';
import { EmptyState, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useId } from 'react';
import { Link } from 'react-router-dom';
import { useWords } from '../../market/use-words.ts';
import { useTitle } from '../../shell/use-title.ts';
import { dealsQuery, type Side } from '../deals.queries.ts';
import { stateWords } from '../parts/deal-headline.ts';
import { LotThumb } from '../parts/LotThumb.tsx';

const finalStates = new Set<DealRow['state']>(['settled', 'cancelled', 'refunded']);

/** Own deals of one side: what waits for the reader first, by its date. */
export function DealsPage({ side }: { side: Side }) {
  const { data: deals } = useSuspenseQuery(dealsQuery(side));
  useTitle('Deals');
  const isOver = ({ state }: DealRow) => finalStates.has(state);
  const own = deals.filter((deal) => deal.duty !== '' && !isOver(deal));
  const others = deals.filter((deal) => deal.duty === '' && !isOver(deal));
  const over = deals.filter(isOver);
  return (
    <Page>
      <h1>Deals</h1>
      {deals.length === 0 && (
        <div className="mt-6">
          <EmptyState
            title="No deals yet"
            action={side === 'buyer' ? <Link to="/">Look at the lots</Link> : <Link to="/">Go to your lots</Link>}
          >
            {side === 'buyer'
              ? 'When you win a lot or take it at its price, paying, the delivery, the weigh-in and the settlement stand here.'
              : 'When a lot of yours is sold, its payment, dispatch, weigh-in and settlement stand here.'}
          </EmptyState>
        </div>
      )}
      <Group title="Your turn" deals={own} />
      <Group title="Waiting for others" deals={others} />
      <Group title="Over" deals={over} />
    </Page>
  );
}

function Group({ title, deals }: { title: string; deals: readonly DealRow[] }) {
  const { moment, relative, money } = useWords();
  const id = useId();
  if (deals.length === 0) return null;
  return (
    <section aria-labelledby={id} className="mt-8">
      <h2 id={id}>{title}</h2>
      <ul className="ruled ruled-head mt-2 pt-0!">
        {deals.map((deal) => (
          <li
            key={deal.code}
            className="grid gap-x-8 gap-y-2 md:grid-cols-[minmax(0,5fr)_minmax(0,4fr)_13rem] md:items-center"
          >
            <div className="lot-cell">
              <LotThumb photoId={deal.coverPhotoId} />
              <div>
                <Link to={`/deals/${deal.code}`} className="py-0.5">
                  {deal.title}
                </Link>
                <p>
                  <span className="mono">{deal.code}</span> for lot <span className="mono">{deal.lotCode}</span>
                </p>
              </div>
            </div>
            <div className="small">
              {deal.duty ? <b>{deal.duty}</b> : stateWords[deal.state]}
              <p className="mute">
                {deal.dutyBy
                  ? `by ${moment(deal.dutyBy)}, ${relative(deal.dutyBy)}`
                  : `${finalStates.has(deal.state) ? 'on' : 'since'} ${moment(deal.updatedAt)}`}
              </p>
            </div>
            <div className="md:text-right">
              <span className="num">{money(deal.priceMinor)}</span>
              <p className="tiny mute">{outcome(deal, money)}</p>
            </div>
          </li>
        ))}
      </ul>
    </section>
  );
}

const payoutWords: Record<string, string> = { waiting: 'waits', queued: 'on its way', sent: 'sent', failed: 'failed' };

function outcome(
  { side, state, sellerGetsMinor, refundMinor, holdMinor, payoutState }: DealRow,
  money: (amountMinor: number) => string,
): string {
  if (side === 'seller' && sellerGetsMinor !== null)
    return `${money(sellerGetsMinor)} to you${payoutState ? `, ${payoutWords[payoutState] ?? payoutState}` : ''}`;
  if (side === 'buyer' && refundMinor) return `${money(refundMinor)} back`;
  return state === 'cancelled' || side === 'seller' ? 'price' : `price; ${money(holdMinor)} into hold`;
}
