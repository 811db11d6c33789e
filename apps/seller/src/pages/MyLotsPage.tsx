import { Refusal, useTitle } from '@lydite/client';
import { Button, EmptyState, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { LotsTable } from '../features/lots/components/LotsTable.tsx';
import { LotViews } from '../features/lots/components/LotViews.tsx';
import { byDuty, isInView, views } from '../features/lots/lot-stage.ts';
import { myLotsQuery, useBeginLot } from '../features/lots/lots.queries.ts';

/** Own lots: what has to be done next and by when stands on top. */
export function Component() {
  useTitle('My lots');
  const { data: lots } = useSuspenseQuery(myLotsQuery);
  const [search] = useSearchParams();
  const view = views.find((one) => one === search.get('view')) ?? 'all';
  const shown = lots.filter((lot) => isInView(lot, view)).toSorted(byDuty);
  return (
    <Page>
      <div className="flex flex-wrap items-start justify-between gap-4">
        <h1>My lots</h1>
        {lots.length > 0 && <NewLot />}
      </div>
      {lots.length === 0 ? (
        <div className="mt-6">
          <EmptyState title="No lots yet" action={<NewLot />}>
            Your lots stand here, from the first photo to the money. A new one takes five short pages: photos, contents,
            weight, price and delivery, and a last check. You see what its gold is worth knowing before anybody else
            does.
          </EmptyState>
        </div>
      ) : (
        <>
          <LotViews lots={lots} current={view} />
          {shown.length > 0 ? <LotsTable lots={shown} /> : <p className="mt-6 mute">No lots in this view now.</p>}
        </>
      )}
    </Page>
  );
}

function NewLot() {
  const begin = useBeginLot();
  const navigate = useNavigate();
  return (
    <div>
      <Button
        look="primary"
        busy={begin.isPending && 'Beginning'}
        onClick={() => begin.mutate(undefined, { onSuccess: ({ code }) => void navigate(`/lots/${code}/photos`) })}
      >
        New lot
      </Button>
      <Refusal>{begin.error?.message}</Refusal>
    </div>
  );
}
