import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { deskColumns } from './desk-table-features.ts';
import { DeskTable } from './DeskTable.tsx';

interface Row {
  code: string;
  amountMinor: number;
}

const h = deskColumns<Row>();
const columns = h.columns([
  h.accessor('code', { header: 'Lot', sortFn: 'alphanumeric' }),
  h.accessor('amountMinor', { header: 'Price', sortFn: 'basic', sortDescFirst: true, meta: { align: 'right' } }),
  h.display({ id: 'act', header: 'Do', cell: () => 'Open' }),
]);
const rows: Row[] = [
  { code: 'L-10', amountMinor: 500 },
  { code: 'L-9', amountMinor: 90_000 },
  { code: 'L-11', amountMinor: 7_000 },
];

afterEach(cleanup);
const codes = () => screen.getAllByText(/^L-\d+$/).map((cell) => cell.textContent);
const show = () => render(<DeskTable caption="Lots" columns={columns} rows={rows} rowId={({ code }) => code} />);

describe('a table of the desk', () => {
  it('stands in the order of the server', () => {
    show();
    expect(codes()).toEqual(['L-10', 'L-9', 'L-11']);
    expect(screen.getAllByRole('columnheader').map((head) => head.getAttribute('aria-sort'))).toEqual([
      null,
      null,
      null,
    ]);
  });
  it('is sorted by a press on a head, the other way by the next, and stands as before by the third', async () => {
    const user = userEvent.setup();
    show();
    const price = screen.getByRole('button', { name: /Price/ });
    await user.click(price);
    expect(codes()).toEqual(['L-9', 'L-11', 'L-10']);
    expect(screen.getByRole('columnheader', { name: /Price/ }).getAttribute('aria-sort')).toBe('descending');
    await user.click(price);
    expect(codes()).toEqual(['L-10', 'L-11', 'L-9']);
    await user.click(price);
    expect(codes()).toEqual(['L-10', 'L-9', 'L-11']);
  });
  it('sorts codes by their numbers', async () => {
    show();
    await userEvent.setup().click(screen.getByRole('button', { name: /Lot/ }));
    expect(codes()).toEqual(['L-9', 'L-10', 'L-11']);
  });
  it('cannot be sorted by a column of links', () => {
    show();
    expect(screen.queryByRole('button', { name: /Do/ })).toBeNull();
  });
});
