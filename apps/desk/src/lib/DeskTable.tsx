import { useTable, type RowData, type SortingState } from '@tanstack/react-table';
import { useState } from 'react';
import { deskTableFeatures, type DeskColumns } from './desk-table-features.ts';

interface DeskTableProps<Row extends RowData> {
  /** Names the table and the region it scrolls in. */
  caption: string;
  columns: DeskColumns<Row>;
  rows: Row[];
  rowId: (row: Row) => string;
}

const ariaSort = { asc: 'ascending', desc: 'descending' } as const;
const marks = { asc: ' ↑', desc: ' ↓' } as const;

/** A dense table in the server's order; a press on a column's head sorts what is shown, the third press gives the order back. */
export function DeskTable<Row extends RowData>({ caption, columns, rows, rowId }: DeskTableProps<Row>) {
  const [sorting, setSorting] = useState<SortingState>([]);
  const table = useTable({
    features: deskTableFeatures,
    columns,
    data: rows,
    getRowId: rowId,
    state: { sorting },
    onSortingChange: setSorting,
  });
  return (
    <div className="table-scroll relative" role="region" aria-label={`${caption}, table`} tabIndex={0}>
      <table className="table table-dense">
        <caption className="sr-only">{caption}</caption>
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id}>
              {group.headers.map((header) => {
                const sorted = header.column.getIsSorted();
                return (
                  <th
                    key={header.id}
                    scope="col"
                    className={header.column.columnDef.meta?.align === 'right' ? 'r' : undefined}
                    aria-sort={sorted ? ariaSort[sorted] : undefined}
                  >
                    {header.column.getCanSort() ? (
                      <button type="button" className="sort-button" onClick={header.column.getToggleSortingHandler()}>
                        <table.FlexRender header={header} />
                        {sorted && <span aria-hidden="true">{marks[sorted]}</span>}
                      </button>
                    ) : (
                      <table.FlexRender header={header} />
                    )}
                  </th>
                );
              })}
            </tr>
          ))}
        </thead>
        <tbody>
          {table.getRowModel().rows.map((row) => (
            <tr key={row.id}>
              {row.getAllCells().map((cell) => {
                const content = <table.FlexRender cell={cell} />;
                return (
                  <td key={cell.id} className={cell.column.columnDef.meta?.align === 'right' ? 'r' : undefined}>
                    {content}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
