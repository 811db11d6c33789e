import { useWords, type Words } from '@lydite/client';
import type { DeskLot } from '@lydite/contracts';
import { formatGoldG, formatRange } from '@lydite/ui';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { deskColumns } from '../../lib/desk-table-features.ts';
import { DeskTable } from '../../lib/DeskTable.tsx';

const h = deskColumns<DeskLot>();

const formWords: Record<string, string> = { 'open-bids': 'open bids', 'asking-price': 'asking price' };
/** Lots that have a page for everybody. */
const publicStates = new Set(['open', 'awarded', 'offered', 'unsold']);

const columnsFor = ({ money, shortMoment }: Words) =>
  h.columns([
    h.accessor('code', {
      header: 'Lot',
      sortFn: 'alphanumeric',
      cell: ({ row: { original: lot } }) =>
        publicStates.has(lot.state) ? (
          <a className="link-row mono" href={`/lots/${lot.code}`}>
            {lot.code}
          </a>
        ) : (
          <span className="mono">{lot.code}</span>
        ),
    }),
    h.accessor('title', { header: 'Title', sortFn: 'alphanumeric' }),
    h.accessor('seller', { header: 'Seller', sortFn: 'alphanumeric' }),
    h.accessor('state', {
      header: 'State',
      sortFn: 'alphanumeric',
      cell: ({ getValue }) => getValue().replace('_', ' '),
    }),
    h.accessor('form', {
      header: 'Sold by',
      sortFn: 'alphanumeric',
      cell: ({ getValue }) => formWords[getValue()] ?? getValue(),
    }),
    h.accessor(({ goldG }) => goldG?.p50 ?? -1, {
      id: 'gold',
      header: 'Gold, 8 in 10',
      sortFn: 'basic',
      sortDescFirst: true,
      meta: { align: 'right' },
      cell: ({ row: { original: lot } }) =>
        lot.goldG && (
          <>
            {formatRange([lot.goldG.p10, lot.goldG.p90])}
            <small>middle {formatGoldG(lot.goldG.p50)}</small>
          </>
        ),
    }),
    h.accessor(({ priceMinor }) => priceMinor ?? -1, {
      id: 'price',
      header: 'Price',
      sortFn: 'basic',
      sortDescFirst: true,
      meta: { align: 'right' },
      cell: ({ row: { original: lot } }) => lot.priceMinor !== null && money(lot.priceMinor),
    }),
    h.accessor('bidders', { header: 'Bidders', sortFn: 'basic', sortDescFirst: true, meta: { align: 'right' } }),
    h.accessor(({ closesAt }) => closesAt ?? '', {
      id: 'closes',
      header: 'Closes',
      sortFn: 'basic',
      cell: ({ row: { original: lot } }) => lot.closesAt && shortMoment(lot.closesAt),
    }),
    h.accessor(({ dealCode }) => dealCode ?? '', {
      id: 'deal',
      header: 'Deal',
      sortFn: 'alphanumeric',
      cell: ({ row: { original: lot } }) =>
        lot.dealCode && (
          <Link className="link-row mono" to={`/?deal=${lot.dealCode}`}>
            {lot.dealCode}
          </Link>
        ),
    }),
  ]);

export function LotsTable({ lots }: { lots: DeskLot[] }) {
  const words = useWords();
  const columns = useMemo(() => columnsFor(words), [words]);
  return <DeskTable caption="Lots" columns={columns} rows={lots} rowId={({ code }) => code} />;
}
