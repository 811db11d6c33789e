import {
  createColumnHelper,
  createSortedRowModel,
  metaHelper,
  rowSortingFeature,
  sortFn_alphanumeric,
  sortFn_basic,
  tableFeatures,
  type ColumnHelper,
  type RowData,
} from '@tanstack/react-table';

interface ColumnMeta {
  /** Figures stand at the right, in the figures' face. */
  align?: 'right';
}

/** What the desk's tables can do; one object for all of them, since a table is rebuilt when it changes. */
export const deskTableFeatures = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { basic: sortFn_basic, alphanumeric: sortFn_alphanumeric },
  columnMeta: metaHelper<ColumnMeta>(),
});

export type DeskColumns<Row extends RowData> = ReturnType<ColumnHelper<typeof deskTableFeatures, Row>['columns']>;

export const deskColumns = <Row extends RowData>() => createColumnHelper<typeof deskTableFeatures, Row>();
