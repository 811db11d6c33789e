import { useWords, type Words } from '@lydite/client';
import type { LedgerReport } from '@lydite/contracts';
import { useMemo } from 'react';
import { deskColumns } from '../../lib/desk-table-features.ts';
import { DeskTable } from '../../lib/DeskTable.tsx';

type Account = LedgerReport['accounts'][number];
const h = deskColumns<Account>();

const columnsFor = ({ exactMoney }: Words) =>
  h.columns([
    h.accessor('code', {
      header: 'Account',
      sortFn: 'alphanumeric',
      cell: ({ getValue }) => <span className="mono">{getValue()}</span>,
    }),
    h.accessor('side', { header: 'Side', sortFn: 'alphanumeric' }),
    h.accessor('balanceMinor', {
      header: 'Balance',
      sortFn: 'basic',
      sortDescFirst: true,
      meta: { align: 'right' },
      cell: ({ getValue }) => exactMoney(getValue()),
    }),
  ]);

export function AccountsTable({ accounts }: { accounts: Account[] }) {
  const words = useWords();
  const columns = useMemo(() => columnsFor(words), [words]);
  return <DeskTable caption="Accounts" columns={columns} rows={accounts} rowId={({ code }) => code} />;
}
