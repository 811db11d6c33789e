import { dispatchRequest } from '@lydite/contracts';
import { Button, ErrorSummary, Page, TextField } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import type { z } from 'zod';
import { addressOf, call } from '../../call/call.ts';
import { Refusal } from '../../form/Refusal.tsx';
import { useRequestForm } from '../../form/use-request-form.ts';
import { announce } from '../../shell/announce.ts';
import { useTitle } from '../../shell/use-title.ts';
import { dealQuery, useDealStep } from '../deals.queries.ts';
import { NotNow } from '../parts/NotNow.tsx';

export function Component() {
  const { dealCode = '' } = useParams();
  const { data: deal } = useSuspenseQuery(dealQuery(dealCode));
  const navigate = useNavigate();
  const dispatch = useDealStep((body: z.infer<typeof dispatchRequest>) =>
    call('POST /deals/:dealCode/dispatch', { params: { dealCode }, body }),
  );
  useTitle('Send the lot');
  const { field, submit, problems, refusal, isSending } = useRequestForm<z.infer<typeof dispatchRequest>>({
    schema: dispatchRequest,
    start: { carrier: '', trackingCode: '' },
    send: async (body) => {
      await dispatch.mutateAsync(body);
      announce('Marked as dispatched.', { own: true });
      await navigate(`/deals/${dealCode}`, { replace: true });
    },
  });
  if (!deal.actions.includes('dispatch')) return <NotNow deal={deal} />;
  return (
    <Page shape="narrow">
      <p className="small">
        <Link to={`/deals/${deal.code}`}>Deal {deal.code}</Link>
      </p>
      <h1 className="mt-2">Send the lot</h1>
      <ol className="notes">
        <li>
          Print the <a href={addressOf('GET /deals/:dealCode/packing-slip.pdf', { dealCode })}>packing slip</a> and put
          it into the parcel: the buyer finds the lot by its code.
        </li>
        <li>You insure the parcel. The risk passes when the buyer receives it.</li>
        <li>Enter the carrier and the tracking code as soon as it is handed over. The buyer is told at once.</li>
      </ol>
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} noValidate className="fields mt-6 max-w-md">
        <TextField {...field('carrier')} label="Carrier" />
        <TextField {...field('trackingCode')} label="Tracking code" autoComplete="off" spellCheck={false} />
        <Refusal>{refusal}</Refusal>
        <Button look="primary" type="submit" className="justify-self-start" busy={isSending && 'Sending'}>
          Mark as dispatched
        </Button>
      </form>
    </Page>
  );
}
