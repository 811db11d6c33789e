import { catalogueQuery, isApiError, useTitle, useWords } from '@lydite/client';
import type { LotView } from '@lydite/contracts';
import { buttonClass, FactList, Notice, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { bidProblem, boundsOf } from '../features/bids/bid-problem.ts';
import { usePlaceBid } from '../features/bids/bids.queries.ts';
import { BidOutcomeView } from '../features/bids/components/BidOutcomeView.tsx';
import { BindingForm } from '../features/bids/components/BindingForm.tsx';
import { useAttempt } from '../features/bids/use-attempt.ts';
import { lotQuery } from '../features/lots/lots.queries.ts';
import { termsQuery } from '../features/terms/terms.queries.ts';
import { ClosingIn } from '../lib/Closing.tsx';
import { HoldWords } from '../lib/HoldWords.tsx';
import { LotLine } from '../lib/LotLine.tsx';
import { mostParam, readMost } from '../lib/most-param.ts';
import { ReadingWords } from '../lib/worth/ReadingWords.tsx';
import { useLotWorth } from '../lib/worth/use-lot-worth.ts';

const title = 'Check this bid';

/** A bid on a page of its own: what it may cost and when it binds, before it does. */
export function Component() {
  const { lotCode = '' } = useParams();
  const [search] = useSearchParams();
  const { data: lot } = useSuspenseQuery(lotQuery(lotCode));
  const place = usePlaceBid(lotCode);
  if (place.data)
    return (
      <Page shape="narrow">
        <BidOutcomeView lotCode={lotCode} outcome={place.data} />
      </Page>
    );
  return (
    <Page shape="narrow">
      <h1>{title}</h1>
      <LotLine lot={lot} />
      <BidCheck lot={lot} amountMinor={readMost(search)} place={place} />
    </Page>
  );
}

interface BidCheckProps {
  lot: LotView;
  amountMinor: number | null;
  place: ReturnType<typeof usePlaceBid>;
}

function BidCheck({ lot, amountMinor, place }: BidCheckProps) {
  const { money } = useWords();
  const attempt = useAttempt();
  const back = `/lots/${lot.code}`;
  if (lot.leastNextMinor === null && !place.isPending)
    return <NoBid problem="This lot takes no bids now." back={back} way="Back to the lot" />;
  const problem = bidProblem({ ...boundsOf(lot), amountMinor, leastNextMinor: lot.leastNextMinor ?? 0, money });
  // A refusal says more than the check that it makes fail, and keeps its own way on.
  if (amountMinor === null || (problem && !place.isPending && !place.error))
    return (
      <NoBid
        problem={`${problem}.`}
        back={`${back}${lot.leastNextMinor ? `?${mostParam(lot.leastNextMinor)}` : ''}`}
        way="Weigh another bid"
      />
    );
  const send = () =>
    place.mutate(
      { ceilingMinor: amountMinor, attempt: attempt.id() },
      { onSettled: (_, error) => attempt.settle(error) },
    );
  return (
    <>
      <BidFacts lot={lot} amountMinor={amountMinor} />
      <BindingForm
        title={title}
        button="Make it binding"
        isSending={place.isPending}
        refusal={place.error && <BidRefusal error={place.error} lotCode={lot.code} />}
        onSend={send}
      >
        <Link className={buttonClass('quiet')} to={`${back}?${mostParam(amountMinor)}`}>
          Change the amount
        </Link>
      </BindingForm>
    </>
  );
}

function BidFacts({ lot, amountMinor }: { lot: LotView; amountMinor: number }) {
  const { money, moment } = useWords();
  const { data: terms } = useSuspenseQuery(termsQuery);
  const { data: catalogue } = useSuspenseQuery(catalogueQuery(lot.estimate.catalogueVersion));
  const reading = useLotWorth({ lot, catalogue, terms })?.read(amountMinor);
  return (
    <div className="ruled-head mt-6">
      <FactList
        facts={[
          {
            name: 'Most you would pay',
            value: (
              <>
                <b className="num">{money(amountMinor)}</b>. The market bids the least that leads and stops there; no
                one else sees this amount
              </>
            ),
          },
          {
            name: 'Into the hold, if you win',
            value: (
              <>
                At most <HoldWords priceMinor={amountMinor} freightMinor={lot.delivery.freightMinor} />. Within 2 days
                of the award
              </>
            ),
          },
          {
            name: 'When it binds',
            value: (
              <>
                With the button below: a bid is not withdrawn. The lot closes {moment(lot.closesAt)},{' '}
                <ClosingIn closesAt={lot.closesAt} />
              </>
            ),
          },
          ...(reading ? [{ name: 'At this amount', value: <ReadingWords reading={reading} /> }] : []),
        ]}
      />
    </div>
  );
}

function NoBid({ problem, back, way }: { problem: string; back: string; way: string }) {
  useTitle(title);
  return (
    <div className="mt-6">
      <Notice tone="warn">{problem}</Notice>
      <p className="actions">
        <Link className={buttonClass('primary')} to={back}>
          {way}
        </Link>
      </p>
    </div>
  );
}

function BidRefusal({ error, lotCode }: { error: Error; lotCode: string }) {
  const { money } = useWords();
  const { leastNextMinor } = isApiError(error, 'bid.below_least') ? error.context : {};
  const { roomMinor } = isApiError(error, 'bid.over_limit') ? error.context : {};
  const next = leastNextMinor ?? roomMinor;
  return (
    <Notice tone="danger" live>
      {error.message}{' '}
      {typeof next === 'number' && next > 0 && (
        <Link to={`/lots/${lotCode}?${mostParam(next)}`}>Weigh a bid of {money(next)}</Link>
      )}
    </Notice>
  );
}
