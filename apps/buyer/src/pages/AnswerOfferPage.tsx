import { useTitle, useWords } from '@lydite/client';
import type { LotView, MyBidRow } from '@lydite/contracts';
import { Button, buttonClass, FactList, Notice, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { myBidsQuery, useAnswerOffer } from '../features/bids/bids.queries.ts';
import { BindingForm } from '../features/bids/components/BindingForm.tsx';
import { lotQuery } from '../features/lots/lots.queries.ts';
import { HoldWords } from '../lib/HoldWords.tsx';
import { LotLine } from '../lib/LotLine.tsx';

const title = 'This lot is offered to you';

/** The under-bidder's answer when the winner of a lot did not pay. */
export function Component() {
  const { lotCode = '' } = useParams();
  const { data: lot } = useSuspenseQuery(lotQuery(lotCode));
  const { data: bids } = useSuspenseQuery(myBidsQuery);
  const offer = bids.rows.find((row) => row.lotCode === lotCode)?.offer ?? null;
  const answer = useAnswerOffer(lotCode);
  useTitle(title);
  if (answer.data?.dealCode === null) return <Refused />;
  return (
    <Page shape="narrow">
      <h1>{title}</h1>
      <LotLine lot={lot} />
      {offer || answer.isPending || answer.isSuccess ? (
        offer && <OfferCheck lot={lot} offer={offer} answer={answer} />
      ) : (
        <div className="mt-6">
          <Notice tone="warn">{answer.error?.message ?? 'Nothing is offered to you on this lot now.'}</Notice>
          <p className="actions">
            <Link className={buttonClass()} to="/bids">
              My bids
            </Link>
          </p>
        </div>
      )}
    </Page>
  );
}

interface OfferCheckProps {
  lot: LotView;
  offer: NonNullable<MyBidRow['offer']>;
  answer: ReturnType<typeof useAnswerOffer>;
}

function OfferCheck({ lot, offer, answer }: OfferCheckProps) {
  const { money, moment, relative } = useWords();
  const navigate = useNavigate();
  const accept = () =>
    answer.mutate(true, {
      onSuccess: ({ dealCode }) => dealCode && void navigate(`/deals/${dealCode}`, { replace: true }),
    });
  return (
    <>
      <p className="say mt-4">
        The winner did not pay. Counted again without them, the lot is yours at <b>{money(offer.priceMinor)}</b>, if you
        want it.
      </p>
      <div className="ruled-head mt-6">
        <FactList
          facts={[
            {
              name: 'Stands until',
              value: (
                <>
                  <b>{moment(offer.answerBy)}</b>, {relative(offer.answerBy)}. Without an answer it ends
                </>
              ),
            },
            {
              name: 'Into the hold',
              value: (
                <>
                  <HoldWords priceMinor={offer.priceMinor} freightMinor={lot.delivery.freightMinor} />. Within 2 days of
                  your yes
                </>
              ),
            },
          ]}
        />
      </div>
      <BindingForm
        title={title}
        button={`Accept at ${money(offer.priceMinor)}`}
        isSending={answer.isPending}
        refusal={answer.error?.message}
        onSend={accept}
      >
        <Button busy={answer.isPending && 'Sending'} onClick={() => answer.mutate(false)}>
          Refuse
        </Button>
      </BindingForm>
    </>
  );
}

const Refused = () => (
  <Page shape="narrow">
    <h1>Refused</h1>
    <p className="say mt-4">The lot goes back unsold. Nothing of yours is bound by it.</p>
    <p className="actions">
      <Link className={buttonClass('primary')} to="/bids">
        My bids
      </Link>
    </p>
  </Page>
);
