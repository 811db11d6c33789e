import type { DealView } from '@lydite/contracts';
import { ChainRail, ChainSteps, FactList, formatMassG, formatNumber, Page, PageHead } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { Link, useParams } from 'react-router-dom';
import { useWords } from '../../market/use-words.ts';
import { announce } from '../../shell/announce.ts';
import { useTitle } from '../../shell/use-title.ts';
import { dealQuery } from '../deals.queries.ts';
import { railSteps } from '../parts/deal-chain.ts';
import { dealHeadline } from '../parts/deal-headline.ts';
import { moneyRows } from '../parts/deal-money.ts';
import { MoneyTable } from '../parts/MoneyTable.tsx';
import { NextStep } from '../parts/NextStep.tsx';
import { PaymentNotice } from '../parts/PaymentNotice.tsx';
import { SettlementSection } from '../parts/SettlementSection.tsx';
import { Timeline } from '../parts/Timeline.tsx';
import { WeighInSection } from '../parts/WeighInSection.tsx';

/** A deal from the award to the payout; both sides see the same page, each with its own next step. */
export function Component() {
  const { dealCode = '' } = useParams();
  const { data: deal } = useSuspenseQuery(dealQuery(dealCode));
  const words = useWords();
  const headline = dealHeadline(deal, words);
  useTitle(`${headline}, ${deal.code}`);
  useAnnounceChange(headline);
  const steps = railSteps(deal.chain, words);
  return (
    <Page shape="rail">
      <ChainRail code={deal.lotCode} steps={steps} />
      <div>
        <ChainSteps code={deal.lotCode} steps={steps} />
        <PageHead
          title={headline}
          facts={[
            <Link key="lot" to={`/lots/${deal.lotCode}`}>
              {deal.title}
            </Link>,
            <>
              <b>{formatMassG(deal.massG)}</b> net, declared
            </>,
            ...(deal.pieces === null ? [] : [`${formatNumber(deal.pieces)} pieces`]),
            <>
              Deal <span className="mono">{deal.code}</span>
            </>,
          ]}
          end={
            deal.due && (
              <>
                <b>By {words.moment(deal.due.at)}</b>
                {words.relative(deal.due.at)}
              </>
            )
          }
        />
        <div className="mt-7 grid grid-cols-1 gap-x-12 lg:grid-cols-[minmax(0,1fr)_21rem] lg:grid-rows-[auto_1fr]">
          <div>
            <div className="grid gap-4">
              <PaymentNotice deal={deal} />
              <NextStep deal={deal} />
            </div>
            {deal.settlement && <SettlementSection deal={deal} settlement={deal.settlement} />}
            {deal.weighIn && <WeighInSection deal={deal} weighIn={deal.weighIn} />}
          </div>
          <aside className="mt-10 lg:row-span-2 lg:mt-0">
            <Terms deal={deal} />
          </aside>
          <Timeline events={deal.events} />
        </div>
      </div>
    </Page>
  );
}

function Terms({ deal }: { deal: DealView }) {
  const { delivery, counterparty, side } = deal;
  const other = side === 'buyer' ? 'Seller' : 'Buyer';
  return (
    <>
      <section aria-labelledby="money-title">
        <h2 id="money-title">Money</h2>
        <MoneyTable caption="Money" rows={moneyRows(deal)} />
      </section>
      <section aria-labelledby="delivery-title" className="mt-8">
        <h2 id="delivery-title">Delivery</h2>
        <FactList
          facts={[
            { name: 'Way', value: delivery.way === 'collection' ? 'Collection by the buyer' : 'The seller sends' },
            { name: 'From', value: delivery.place },
            ...(delivery.way === 'collection' && delivery.hours ? [{ name: 'Hours', value: delivery.hours }] : []),
            ...(delivery.carrier
              ? [
                  { name: 'Carrier', value: delivery.carrier },
                  { name: 'Tracking code', value: <span className="mono break-all">{delivery.trackingCode}</span> },
                ]
              : []),
            {
              name: other,
              value: counterparty ? `${counterparty.name}, ${counterparty.place}` : 'Named once the hold is paid',
            },
          ]}
        />
      </section>
      <p className="tiny mute mt-6">
        Boards and chips can carry lead, beryllium oxide, mercury and brominated flame retardants. Local law, permits
        and licensed practice decide how they are handled.
      </p>
    </>
  );
}

/** Tells a reader who waits on the page that the deal has moved. */
function useAnnounceChange(headline: string): void {
  const last = useRef(headline);
  useEffect(() => {
    if (last.current !== headline) announce(headline);
    last.current = headline;
  }, [headline]);
}
