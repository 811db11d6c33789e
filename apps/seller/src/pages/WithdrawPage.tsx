import { Refusal, useTitle } from '@lydite/client';
import type { MyLotView } from '@lydite/contracts';
import { Button, buttonClass, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { myLotQuery, useWithdrawLot } from '../features/lots/lots.queries.ts';

/** Taking a lot off the market before anybody has bid: what that means, then the button. */
export function Component() {
  const { lotCode = '' } = useParams();
  const { data: lot } = useSuspenseQuery(myLotQuery(lotCode));
  const withdraw = useWithdrawLot(lotCode);
  const navigate = useNavigate();
  const title = `Withdraw lot ${lotCode}`;
  const isPossible = lot.state === 'open' && lot.bidders === 0;
  useTitle(title);
  return (
    <Page shape="narrow">
      <h1>{title}</h1>
      <p className="lead">{lot.draft.title}</p>
      <ul className="notes">
        <li>It leaves the market at once and cannot be opened again.</li>
        <li>Its photos and lines stay with you: a copy of it is a new draft that can be listed.</li>
        <li>The moment somebody bids, a lot can be withdrawn only by the desk.</li>
      </ul>
      <div className="mt-6">
        <Refusal>{isPossible ? withdraw.error?.message : reasonAgainst(lot)}</Refusal>
      </div>
      <div className="actions">
        <Button
          look="danger"
          busy={withdraw.isPending && 'Withdrawing'}
          aria-disabled={!isPossible}
          onClick={() =>
            isPossible && withdraw.mutate(undefined, { onSuccess: () => void navigate(`/lots/${lotCode}`) })
          }
        >
          Withdraw it
        </Button>
        <Link to={`/lots/${lotCode}`} className={buttonClass('quiet')}>
          Leave it open
        </Link>
      </div>
    </Page>
  );
}

function reasonAgainst({ state, bidders }: MyLotView): string {
  if (state !== 'open') return 'It is not on the market any more.';
  return bidders === 1
    ? 'It has a bid: only the desk can withdraw it now.'
    : 'It has bids: only the desk can withdraw it now.';
}
