import type { DealView } from '@lydite/contracts';
import { Button, Page } from '@lydite/ui';
import { useMutation, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { Refusal } from '../../form/Refusal.tsx';
import { useWords } from '../../market/use-words.ts';
import { announce } from '../../shell/announce.ts';
import { NotFoundPage } from '../../shell/ErrorPage.tsx';
import { usePageReturn } from '../../shell/use-page-return.ts';
import { useTitle } from '../../shell/use-title.ts';
import { dealQuery, rememberDeal } from '../deals.queries.ts';
import { checkedSteps, type CheckedStep } from '../parts/checked-steps.ts';
import { MoneyTable } from '../parts/MoneyTable.tsx';
import { NotNow } from '../parts/NotNow.tsx';

/** One binding step of a deal: what it costs and does, then the button. */
export function Component() {
  const { dealCode = '', step: name = '' } = useParams();
  const { data: deal } = useSuspenseQuery(dealQuery(dealCode));
  const step = Object.hasOwn(checkedSteps, name) ? checkedSteps[name] : undefined;
  if (!step) return <NotFoundPage />;
  return <CheckStep deal={deal} step={step} />;
}

function CheckStep({ deal, step }: { deal: DealView; step: CheckedStep }) {
  const words = useWords();
  const navigate = useNavigate();
  const cache = useQueryClient();
  const take = useMutation({
    mutationFn: () => step.send(deal.code),
    onSuccess: async (answer) => {
      announce(step.done, { own: true });
      if ('url' in answer) return location.assign(answer.url);
      await navigate(`/deals/${deal.code}`, { replace: true });
      rememberDeal(cache, answer);
    },
  });
  usePageReturn(take.reset);
  useTitle(step.title, { invalid: take.isError });
  const isOffered = deal.actions.includes(step.action);
  if (!isOffered && take.isIdle) return <NotNow deal={deal} />;
  return (
    <Page shape="narrow">
      <p className="small">
        <Link to={`/deals/${deal.code}`}>Deal {deal.code}</Link>
      </p>
      <h1 className="mt-2">{step.title}</h1>
      <p className="facts">
        <span>{deal.title}</span>
        <span>
          Lot <span className="mono">{deal.lotCode}</span>
        </span>
      </p>
      {step.rows && (
        <div className="mt-4">
          <MoneyTable caption={step.title} rows={step.rows(deal)} />
        </div>
      )}
      <ul className="notes">
        {step
          .points(deal, words)
          .filter(Boolean)
          .map((point) => (
            <li key={point}>{point}</li>
          ))}
      </ul>
      <div className="mt-6">
        <Refusal>{take.error?.message}</Refusal>
      </div>
      <div className="actions">
        <Button
          look={step.look ?? 'primary'}
          busy={(take.isPending || take.isSuccess) && step.busy}
          onClick={() => take.mutate()}
        >
          {step.button(deal, words)}
        </Button>
        <Link to={`/deals/${deal.code}`}>Back to the deal</Link>
      </div>
    </Page>
  );
}
