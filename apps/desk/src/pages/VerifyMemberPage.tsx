import { useTitle, useWords } from '@lydite/client';
import { EmptyState, FactList, Page } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { membersQuery } from '../features/members/members.queries.ts';
import { VerifyForm } from '../features/members/VerifyForm.tsx';

/** The papers of one member, on a page of its own: entering them raises what the member may bind. */
export function Component() {
  const { memberId } = useParams();
  const email = useSearchParams()[0].get('email') ?? '';
  const navigate = useNavigate();
  const { money, moment } = useWords();
  const { data: found } = useSuspenseQuery(membersQuery({ page: 1, q: email.slice(0, 80) }));
  const member = found.rows.find(({ id }) => id === memberId);
  useTitle('Papers of a member');
  if (!member)
    return (
      <Page shape="narrow">
        <EmptyState title="There is no such member" action={<Link to="/members">All members</Link>} />
      </Page>
    );
  return (
    <Page shape="narrow">
      <p className="small">
        <Link to="/members">Members</Link>
      </p>
      <h1 className="mt-2">Papers of {member.name}</h1>
      <div className="mt-4">
        <FactList
          facts={[
            { name: 'E-mail', value: `${member.email}${member.emailConfirmed ? '' : ', not confirmed'}` },
            { name: 'Town', value: member.place },
            { name: 'Roles', value: member.roles.join(', ') },
            { name: 'Papers seen', value: member.verifiedAt ? moment(member.verifiedAt) : 'Not yet' },
            { name: 'Buying limit', value: money(member.limitMinor) },
            { name: 'Payout account', value: member.payoutAccount },
          ]}
        />
      </div>
      <ul className="notes">
        <li>
          Identity and licence papers must be seen before a first payout. Payouts that wait for them go out at once.
        </li>
        <li>Nobody sees to their own papers.</li>
      </ul>
      <VerifyForm member={member} onDone={() => void navigate('/members')} />
    </Page>
  );
}
