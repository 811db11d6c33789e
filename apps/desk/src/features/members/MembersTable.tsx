import { useWords, type Words } from '@lydite/client';
import type { DeskMember } from '@lydite/contracts';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { deskColumns } from '../../lib/desk-table-features.ts';
import { DeskTable } from '../../lib/DeskTable.tsx';

const h = deskColumns<DeskMember>();

const columnsFor = ({ money, shortMoment }: Words) =>
  h.columns([
    h.accessor('name', {
      header: 'Name',
      sortFn: 'alphanumeric',
      cell: ({ row: { original: member } }) => (
        <>
          {member.name}
          <small>{member.place}</small>
        </>
      ),
    }),
    h.accessor('email', {
      header: 'E-mail',
      sortFn: 'alphanumeric',
      cell: ({ row: { original: member } }) => (
        <>
          {member.email}
          {!member.emailConfirmed && <small>not confirmed</small>}
        </>
      ),
    }),
    h.accessor(({ roles }) => roles.join(', '), { id: 'roles', header: 'Roles', sortFn: 'alphanumeric' }),
    h.accessor(({ verifiedAt }) => verifiedAt ?? '', {
      id: 'verifiedAt',
      header: 'Papers seen',
      sortFn: 'basic',
      cell: ({ row: { original } }) => (original.verifiedAt ? shortMoment(original.verifiedAt) : 'Not yet'),
    }),
    h.accessor('limitMinor', {
      header: 'Buying limit',
      sortFn: 'basic',
      meta: { align: 'right' },
      cell: ({ getValue }) => money(getValue()),
    }),
    h.accessor('payoutAccount', { header: 'Payout account', sortFn: 'alphanumeric' }),
    h.accessor('createdAt', {
      header: 'Registered',
      sortFn: 'basic',
      cell: ({ getValue }) => shortMoment(getValue()),
    }),
    h.display({
      id: 'act',
      header: () => <span className="sr-only">Do</span>,
      cell: ({ row: { original: member } }) => (
        <Link
          className="link-row"
          to={`/members/${member.id}/verify?${new URLSearchParams({ email: member.email }).toString()}`}
        >
          {member.verifiedAt ? 'Change limit' : 'Enter papers'}
          <span className="sr-only"> of {member.name}</span>
        </Link>
      ),
    }),
  ]);

export function MembersTable({ members }: { members: DeskMember[] }) {
  const words = useWords();
  const columns = useMemo(() => columnsFor(words), [words]);
  return <DeskTable caption="Members" columns={columns} rows={members} rowId={({ id }) => id} />;
}
