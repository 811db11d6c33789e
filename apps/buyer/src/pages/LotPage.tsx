import {
  announce,
  catalogueQuery,
  hasRole,
  railSteps,
  sessionQuery,
  useMarket,
  useNow,
  useTitle,
  useWords,
} from '@lydite/client';
import type { LotView } from '@lydite/contracts';
import {
  ChainRail,
  ChainSteps,
  countryName,
  formatMassG,
  formatNumber,
  formatShare,
  Page,
  PageHead,
  Streak,
} from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { useParams } from 'react-router-dom';
import { BystanderBench } from '../features/bids/components/BystanderBench.tsx';
import { SaleResult } from '../features/bids/components/SaleResult.tsx';
import { BidsTable } from '../features/lots/components/BidsTable.tsx';
import { ClassSources } from '../features/lots/components/ClassSources.tsx';
import { EstimateParts } from '../features/lots/components/EstimateParts.tsx';
import { FromSeller } from '../features/lots/components/FromSeller.tsx';
import { LotPhotos } from '../features/lots/components/LotPhotos.tsx';
import { massEvidenceOf } from '../features/lots/line-words.ts';
import { lotQuery } from '../features/lots/lots.queries.ts';
import { ClosingIn } from '../lib/Closing.tsx';
import { RefreshLine } from '../lib/RefreshLine.tsx';
import { useRefresh } from '../lib/use-refresh.ts';
import { BuyerStreak } from './BuyerStreak.tsx';

/** One lot: how much gold it may hold, what that is worth to the reader, and what the estimate rests on. */
export function Component() {
  const { lotCode = '' } = useParams();
  const { aheadMs } = useMarket();
  const { paused, toggle } = useRefresh();
  const { data: lot, dataUpdatedAt } = useSuspenseQuery(lotQuery(lotCode, { paused, aheadMs }));
  const { data: catalogue } = useSuspenseQuery(catalogueQuery(lot.estimate.catalogueVersion));
  const words = useWords();
  useTitle(`${lot.title}, ${lot.code}`);
  useBidNews(lot);
  const steps = railSteps(lot.chain, words);
  const refresh = <RefreshLine atMs={dataUpdatedAt} paused={paused} onToggle={toggle} />;
  return (
    <Page shape="rail">
      <ChainRail code={lot.code} steps={steps} />
      <div>
        <ChainSteps code={lot.code} steps={steps} aside={`Closes ${words.shortMoment(lot.closesAt)}`} />
        <LotHead lot={lot} />
        <Appraisal lot={lot} />
        <div className="two">
          <div>
            <h2>Photos</h2>
            <LotPhotos photos={lot.photos} />
            <FromSeller lot={lot} />
          </div>
          <div>
            <h2>What the estimate rests on</h2>
            <EstimateParts lot={lot} />
            <ClassSources lines={lot.lines} catalogue={catalogue} />
            {lot.form === 'open-bids' ? (
              <div className="mt-8">
                <BidsTable lot={lot}>{lot.state === 'open' && refresh}</BidsTable>
              </div>
            ) : (
              <p className="mt-8">{lot.state === 'open' && refresh}</p>
            )}
          </div>
        </div>
      </div>
    </Page>
  );
}

function LotHead({ lot }: { lot: LotView }) {
  const { moment } = useWords();
  const { deliveredLots, medianMassDifference } = lot.sellerRecord;
  const record =
    deliveredLots === 0
      ? 'The seller’s first lot here'
      : `Seller has delivered ${formatNumber(deliveredLots)} ${deliveredLots === 1 ? 'lot' : 'lots'}${
          medianMassDifference === null
            ? ''
            : `, ${deliveredLots === 1 ? '' : 'half '}within ${formatShare(medianMassDifference)} of the stated mass`
        }`;
  const facts = [
    <>
      <b>{formatMassG(lot.massG)}</b> net, {massEvidenceOf(lot.lines)}
    </>,
    lot.pieces !== null && (
      <>
        <b>{formatNumber(lot.pieces)}</b> pieces
      </>
    ),
    [lot.place, countryName(lot.country)].filter(Boolean).join(', '),
    record,
  ].filter(Boolean);
  const isOver = useIsOver(lot);
  return (
    <PageHead
      title={lot.title}
      facts={facts}
      end={
        <>
          <b>
            {isOver ? 'Closed' : 'Closes'} {moment(lot.closesAt)}
          </b>
          <ClosingIn closesAt={lot.closesAt} />
          {!isOver && lot.form === 'open-bids' && (
            <>
              <br />A bid in the last 5 minutes moves the close to 5 minutes after it
            </>
          )}
        </>
      }
    />
  );
}

/** The market's clock decides, not whether the closing job has run. */
function useIsOver({ state, closesAt }: LotView): boolean {
  const now = useNow(10_000);
  return state !== 'open' || now.getTime() >= Date.parse(closesAt);
}

/** The stone with what the reader may do about it. */
function Appraisal({ lot }: { lot: LotView }) {
  const { member } = useSuspenseQuery(sessionQuery).data;
  const isOver = useIsOver(lot);
  if (hasRole(member, 'buyer') && !lot.you?.seller) return <BuyerStreak lot={lot} isOver={isOver} />;
  const reader = member === null ? 'visitor' : lot.you?.seller ? 'seller' : 'no-buyer';
  return (
    <div className="mt-9">
      <Streak
        subject={`lot ${lot.code}`}
        heading="How much gold this lot may hold"
        estimate={lot.estimate}
        pricePerGMinor={lot.price.perGramMinor}
        closed={isOver}
        reader="other"
      />
      {isOver ? <SaleResult lot={lot} /> : <BystanderBench lot={lot} reader={reader} />}
    </div>
  );
}

/** Says what changed in the bidding while the page is open. */
function useBidNews({ priceMinor, you, state }: LotView): void {
  const { money } = useWords();
  const standing = you?.standing ?? null;
  const seen = useRef({ priceMinor, standing, state });
  useEffect(() => {
    const before = seen.current;
    seen.current = { priceMinor, standing, state };
    if (before.state !== state) announce('The bidding on this lot is over.');
    else if (before.standing === 'highest' && standing === 'outbid')
      announce(`Outbid. The highest bid is ${money(priceMinor ?? 0)}.`);
    else if (before.priceMinor !== priceMinor && priceMinor !== null)
      announce(`The highest bid is now ${money(priceMinor)}.`);
  }, [priceMinor, standing, state, money]);
}
