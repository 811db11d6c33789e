import { useTitle } from '@lydite/client';
import { Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { membersQuery } from '../features/members/members.queries.ts';
import { MembersTable } from '../features/members/MembersTable.tsx';
import { DeskPager } from '../lib/DeskPager.tsx';
import { Nothing } from '../lib/Nothing.tsx';
import { SearchForm } from '../lib/SearchForm.tsx';
import { useDeskSearch } from '../lib/use-desk-search.ts';

export function Component() {
  const { data: members } = useSuspenseQuery(membersQuery(useDeskSearch()));
  useTitle('Members');
  return (
    <Page>
      <h1>Members</h1>
      <p className="lead">Those whose papers are still to be seen come first.</p>
      <SearchForm hint="name, e-mail or town" />
      {members.rows.length === 0 ? (
        <Nothing noun="members">Whoever registers stands here.</Nothing>
      ) : (
        <>
          <MembersTable members={members.rows} />
          <DeskPager page={members} noun="members" />
        </>
      )}
    </Page>
  );
}
