import { catalogueQuery } from '@lydite/client';
import type { LotView } from '@lydite/contracts';
import { bidAt, Notice, Streak, streakAxisMaxG } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { useLocation, useSearchParams } from 'react-router-dom';
import { BidBench } from '../features/bids/components/BidBench.tsx';
import { SaleResult } from '../features/bids/components/SaleResult.tsx';
import { TakeBench } from '../features/bids/components/TakeBench.tsx';
import { termsQuery } from '../features/terms/terms.queries.ts';
import { bidStepMinor } from '../lib/bid-step.ts';
import { mostParam, readMost } from '../lib/most-param.ts';
import { useLotWorth } from '../lib/worth/use-lot-worth.ts';

const keepMs = 400;

/** The stone for a buyer: the own break-even as a notch that moves with the amount, and the bench that weighs it. */
export function BuyerStreak({ lot, isOver }: { lot: LotView; isOver: boolean }) {
  const { data: terms } = useSuspenseQuery(termsQuery);
  const { data: catalogue } = useSuspenseQuery(catalogueQuery(lot.estimate.catalogueVersion));
  const worth = useLotWorth({ lot, catalogue, terms });
  const leads = lot.you?.standing === 'highest';
  const [tried, setTried] = useTriedAmount(leads ? (lot.you?.ceilingMinor ?? null) : lot.leastNextMinor);
  const bids = lot.form === 'open-bids' && !isOver;
  const amountMinor = bids ? tried : lot.priceMinor;
  const reading = worth && amountMinor !== null ? worth.read(amountMinor) : null;
  const leastMinor = lot.leastNextMinor ?? 0;
  return (
    <div className="mt-9">
      <Streak
        subject={`lot ${lot.code}`}
        heading="How much gold this lot may hold"
        estimate={lot.estimate}
        money={worth?.money}
        bid={reading?.bid}
        bidLabel={isOver ? 'Closed at' : bids ? 'Your bid' : 'Asking'}
        closed={isOver}
        leadBreakEvenG={worth && bids && !leads && lot.priceMinor !== null ? worth.breakEvenG(lot.priceMinor) : null}
        pricePerGMinor={lot.price.perGramMinor}
        move={
          worth && bids
            ? {
                stepMinor: bidStepMinor(Math.max(leastMinor, amountMinor ?? 0)),
                leastMinor,
                mostMinor: Math.max(leastMinor, Math.floor(bidAt(streakAxisMaxG(lot.estimate), worth.money))),
                onMove: setTried,
              }
            : undefined
        }
      />
      {isOver ? (
        <SaleResult lot={lot} />
      ) : !worth ? (
        <NothingLeft />
      ) : bids ? (
        <BidBench {...{ lot, worth, terms, reading, amountMinor }} leastNextMinor={leastMinor} onAmount={setTried} />
      ) : (
        reading && <TakeBench {...{ lot, worth, terms, reading }} askingMinor={lot.priceMinor ?? 0} />
      )}
    </div>
  );
}

const NothingLeft = () => (
  <div className="mt-5">
    <Notice tone="warn" title="Your terms leave nothing of a gram of gold.">
      Check the yield and the refiner’s share in My terms; without them there is no bid to weigh.
    </Notice>
  </div>
);

/** The amount being tried out; until the buyer touches it, the least that makes sense. The address follows, so that nothing is lost. */
function useTriedAmount(startMinor: number | null) {
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const [own, setOwn] = useState<number | null | 'untouched'>(() => readMost(search) ?? 'untouched');
  useEffect(() => {
    const timer = setTimeout(() => keepInAddress(pathname, typeof own === 'number' ? own : null), keepMs);
    return () => clearTimeout(timer);
  }, [own, pathname]);
  return [own === 'untouched' ? startMinor : own, setOwn] as const;
}

/** Past the router on purpose: a navigation of its would call off the next page while that is on its way. */
function keepInAddress(pathname: string, amountMinor: number | null): void {
  if (window.location.pathname !== pathname) return;
  const search = amountMinor === null ? '' : `?${mostParam(amountMinor)}`;
  if (search !== window.location.search) window.history.replaceState(window.history.state, '', pathname + search);
}
