import { catalogueQuery, isApiError, useTitle, useWords } from '@lydite/client';
import type { LotView } from '@lydite/contracts';
import { buttonClass, FactList, Notice, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { useTakeLot } from '../features/bids/bids.queries.ts';
import { BindingForm } from '../features/bids/components/BindingForm.tsx';
import { useAttempt } from '../features/bids/use-attempt.ts';
import { lotQuery } from '../features/lots/lots.queries.ts';
import { termsQuery } from '../features/terms/terms.queries.ts';
import { HoldWords } from '../lib/HoldWords.tsx';
import { LotLine } from '../lib/LotLine.tsx';
import { ReadingWords } from '../lib/worth/ReadingWords.tsx';
import { useLotWorth } from '../lib/worth/use-lot-worth.ts';

const title = 'Check before you take it';

/** Taking a lot at its asking price, on a page of its own. */
export function Component() {
  const { lotCode = '' } = useParams();
  const { data: lot } = useSuspenseQuery(lotQuery(lotCode));
  return (
    <Page shape="narrow">
      <h1>{title}</h1>
      <LotLine lot={lot} />
      <TakeCheck lot={lot} />
    </Page>
  );
}

function TakeCheck({ lot }: { lot: LotView }) {
  const { money } = useWords();
  const navigate = useNavigate();
  const attempt = useAttempt();
  const take = useTakeLot(lot.code);
  const { priceMinor } = lot;
  const dealCode = lot.you?.dealCode;
  useTitle(title);
  const isOpen = lot.state === 'open' && lot.form === 'asking-price' && priceMinor !== null;
  const back = (
    <Link className={buttonClass('quiet')} to={`/lots/${lot.code}`}>
      Back to the lot
    </Link>
  );
  if (!isOpen && !take.isPending && !take.data)
    return (
      <div className="mt-6">
        <Notice tone="warn">
          {take.error?.message ?? (dealCode ? 'You have this lot already.' : 'This lot can’t be taken at a price now.')}
        </Notice>
        <p className="actions">
          {dealCode && (
            <Link className={buttonClass('primary')} to={`/deals/${dealCode}`}>
              Open deal {dealCode}
            </Link>
          )}
          {back}
        </p>
      </div>
    );
  const send = () =>
    take.mutate(
      { priceMinor: priceMinor ?? 0, attempt: attempt.id() },
      {
        onSuccess: ({ dealCode }) => void navigate(`/deals/${dealCode}`, { replace: true }),
        onSettled: (_, error) => attempt.settle(error),
      },
    );
  return (
    <>
      <TakeFacts lot={lot} priceMinor={priceMinor ?? 0} />
      <BindingForm
        title={title}
        button={`Take it at ${money(priceMinor ?? 0)}`}
        isSending={take.isPending || take.isSuccess}
        refusal={take.error && <TakeRefusal error={take.error} />}
        onSend={send}
      >
        {back}
      </BindingForm>
    </>
  );
}

function TakeFacts({ lot, priceMinor }: { lot: LotView; priceMinor: number }) {
  const { data: terms } = useSuspenseQuery(termsQuery);
  const { data: catalogue } = useSuspenseQuery(catalogueQuery(lot.estimate.catalogueVersion));
  const reading = useLotWorth({ lot, catalogue, terms })?.read(priceMinor);
  const facts = [
    {
      name: 'Into the hold',
      value: (
        <>
          <HoldWords priceMinor={priceMinor} freightMinor={lot.delivery.freightMinor} />. Within 2 days from now
        </>
      ),
    },
    {
      name: 'When it binds',
      value: 'With the button below: the lot is yours and you owe its price. It is not taken back',
    },
    ...(reading ? [{ name: 'At this price', value: <ReadingWords reading={reading} /> }] : []),
  ];
  return (
    <div className="ruled-head mt-6">
      <FactList facts={facts} />
    </div>
  );
}

function TakeRefusal({ error }: { error: Error }) {
  const { money } = useWords();
  const { priceMinor } = isApiError(error, 'lot.price_changed') ? error.context : {};
  return (
    <Notice tone="danger" live>
      {error.message} {typeof priceMinor === 'number' && `It is ${money(priceMinor)} now; check it above.`}
    </Notice>
  );
}
