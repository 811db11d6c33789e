import { useWords, type Words } from '@lydite/client';
import type { JobRow } from '@lydite/contracts';
import { useMemo } from 'react';
import { deskColumns } from '../../lib/desk-table-features.ts';
import { DeskTable } from '../../lib/DeskTable.tsx';

const h = deskColumns<JobRow>();

const columnsFor = ({ shortMoment }: Words) =>
  h.columns([
    h.accessor('queue', { header: 'Queue', sortFn: 'alphanumeric' }),
    h.accessor('waiting', { header: 'Waiting', sortFn: 'basic', meta: { align: 'right' } }),
    h.accessor('active', { header: 'Running', sortFn: 'basic', meta: { align: 'right' } }),
    h.accessor('failed', {
      header: 'Failed',
      sortFn: 'basic',
      meta: { align: 'right' },
      cell: ({ getValue }) => <span className={getValue() > 0 ? 'bad' : undefined}>{getValue()}</span>,
    }),
    h.accessor(({ oldestWaitingAt }) => oldestWaitingAt ?? '', {
      id: 'oldest',
      header: 'Next due',
      sortFn: 'basic',
      cell: ({ row: { original: row } }) => row.oldestWaitingAt && shortMoment(row.oldestWaitingAt),
    }),
  ]);

export function JobsTable({ jobs }: { jobs: JobRow[] }) {
  const words = useWords();
  const columns = useMemo(() => columnsFor(words), [words]);
  return <DeskTable caption="Job queues" columns={columns} rows={jobs} rowId={({ queue }) => queue} />;
}
