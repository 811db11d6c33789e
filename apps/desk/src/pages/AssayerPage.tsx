import { useMember, useTitle } from '@lydite/client';
import { EmptyState, FactList, Page } from '@lydite/ui';
import { Link } from 'react-router-dom';

export function AssayerPage() {
  const member = useMember();
  useTitle('Requests');
  if (!member) return null;
  return (
    <Page shape="narrow">
      <h1>Requests</h1>
      <div className="mt-5">
        <EmptyState title="No requests for you">Nobody has asked you for an assay.</EmptyState>
      </div>
      <h2 className="mt-10">Your laboratory</h2>
      <FactList
        facts={[
          { name: 'Name', value: member.name },
          { name: 'Town', value: member.place },
          { name: 'E-mail', value: member.email },
        ]}
      />
      <p className="mt-4">
        <Link to="/account">Account</Link>
      </p>
    </Page>
  );
}
