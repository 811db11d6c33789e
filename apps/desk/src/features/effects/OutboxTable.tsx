import { useWords, type Words } from '@lydite/client';
import type { OutboxRow } from '@lydite/contracts';
import { useMemo } from 'react';
import { deskColumns } from '../../lib/desk-table-features.ts';
import { DeskTable } from '../../lib/DeskTable.tsx';

const h = deskColumns<OutboxRow>();

const stateWords: Record<string, string> = { pending: 'to do', done: 'done', dead: 'set aside' };

const columnsFor = ({ shortMoment }: Words) =>
  h.columns([
    h.accessor('kind', { header: 'Effect', sortFn: 'alphanumeric' }),
    h.accessor('key', {
      header: 'Key',
      sortFn: 'alphanumeric',
      cell: ({ getValue }) => <span className="mono tiny break-all">{getValue()}</span>,
    }),
    h.accessor('state', {
      header: 'State',
      sortFn: 'alphanumeric',
      cell: ({ row: { original: row } }) => (
        <>
          <span className={row.state === 'dead' ? 'bad' : undefined}>{stateWords[row.state] ?? row.state}</span>
          {row.lastError && row.state !== 'done' && <small className="max-w-80 break-words">{row.lastError}</small>}
        </>
      ),
    }),
    h.accessor('attempts', { header: 'Tries', sortFn: 'basic', sortDescFirst: true, meta: { align: 'right' } }),
    h.accessor('createdAt', { header: 'Ordered', sortFn: 'basic', cell: ({ getValue }) => shortMoment(getValue()) }),
    h.accessor(({ nextAt, doneAt }) => nextAt ?? doneAt ?? '', {
      id: 'when',
      header: 'Next try, or done',
      sortFn: 'basic',
      cell: ({ row: { original: row } }) =>
        row.doneAt ? shortMoment(row.doneAt) : row.nextAt ? `next ${shortMoment(row.nextAt)}` : '',
    }),
  ]);

export function OutboxTable({ rows }: { rows: OutboxRow[] }) {
  const words = useWords();
  const columns = useMemo(() => columnsFor(words), [words]);
  return <DeskTable caption="Outbox" columns={columns} rows={rows} rowId={({ id }) => id} />;
}
