import { useTitle } from '@lydite/client';
import { Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { lotsQuery } from '../features/lots/lots.queries.ts';
import { LotsTable } from '../features/lots/LotsTable.tsx';
import { DeskPager } from '../lib/DeskPager.tsx';
import { Nothing } from '../lib/Nothing.tsx';
import { SearchForm } from '../lib/SearchForm.tsx';
import { useDeskSearch } from '../lib/use-desk-search.ts';

export function Component() {
  const { data: lots } = useSuspenseQuery(lotsQuery(useDeskSearch()));
  useTitle('Lots');
  return (
    <Page>
      <h1>Lots</h1>
      <p className="lead">
        Open lots by their close, then ended ones, then drafts. Lowest prices and bid ceilings are not shown to the
        desk.
      </p>
      <SearchForm hint="lot, title or seller" />
      {lots.rows.length === 0 ? (
        <Nothing noun="lots">Drafts stand here as soon as a seller begins one.</Nothing>
      ) : (
        <>
          <LotsTable lots={lots.rows} />
          <DeskPager page={lots} noun="lots" />
        </>
      )}
    </Page>
  );
}
