import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, describe, expect, it } from 'vitest';
import { DeskPager } from './DeskPager.tsx';
import { SearchForm } from './SearchForm.tsx';
import { useDeskSearch } from './use-desk-search.ts';

function Probe() {
  return <output>{JSON.stringify(useDeskSearch())}</output>;
}

const open = (address: string) =>
  render(
    <MemoryRouter initialEntries={[address]}>
      <SearchForm hint="name" />
      <Probe />
      <DeskPager page={{ page: 2, pageSize: 50, total: 120, rows: Array.from({ length: 50 }) }} noun="members" />
    </MemoryRouter>,
  );
const shown = () => JSON.parse(screen.getByText(/^\{/).textContent ?? '') as unknown;
afterEach(cleanup);

describe('what a list of the desk shows', () => {
  it.each([
    ['/', { page: 1 }],
    ['/?page=3&q=%20sallowby%20', { page: 3, q: 'sallowby' }],
    ['/?page=-1', { page: 1 }],
    ['/?page=2.5', { page: 1 }],
    ['/?page=many', { page: 1 }],
  ])('%s is %o', (address, expected) => {
    open(address);
    expect(shown()).toEqual(expected);
  });
  it('begins at the first page after a search', async () => {
    const user = userEvent.setup();
    open('/?page=3&q=sallowby');
    const box = screen.getByRole('searchbox', { name: 'Search by name' });
    await user.clear(box);
    await user.type(box, 'vennaby{Enter}');
    expect(shown()).toEqual({ page: 1, q: 'vennaby' });
  });
  it('keeps the search text from page to page', () => {
    open('/?page=2&q=sallowby');
    expect(screen.getByRole('link', { name: 'Next' }).getAttribute('href')).toBe('/?q=sallowby&page=3');
    expect(screen.getByText('51 to 100 of 120 members')).toBeTruthy();
  });
});
