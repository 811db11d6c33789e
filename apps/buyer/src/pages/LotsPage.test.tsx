import type { LotList, LotRow } from '@lydite/contracts';
import { cleanup, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { inHours, openLot } from '../../test/market.ts';
import { renderPage } from '../../test/render-page.tsx';
import { Component } from './LotsPage.tsx';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const { estimate } = openLot();
const row = (code: string, title: string, changes: Partial<LotRow> = {}): LotRow => ({
  code,
  title,
  classCodes: ['memory-modules'],
  massG: 86_400,
  massEvidence: 'weighed',
  pieces: 3120,
  place: 'Harrowmere',
  coverPhotoId: null,
  form: 'open-bids',
  estimate: { ...estimate, goldG: estimate.goldG.quantiles },
  priceMinor: 240_000,
  startMinor: 100_000,
  bidders: 1,
  closesAt: inHours(50),
  you: null,
  ...changes,
});

const list = (rows: LotRow[], changes: Partial<LotList> = {}): LotList => ({
  rows,
  total: rows.length,
  page: 1,
  pageSize: 20,
  countsByView: { all: 3, 'over-10-g': 2, 'closing-today': 0, bid: 1 },
  ...changes,
});
const three = list([
  row('L-1', 'Memory', { you: { standing: 'outbid', ceilingMinor: 200_000 } }),
  row('L-2', 'Phone boards', { priceMinor: null, bidders: 0 }),
  row('L-3', 'Cards', { form: 'asking-price', priceMinor: 110_000 }),
]);

const show = (answer: LotList = three, search = '') =>
  renderPage({ Component, path: '/', at: `/${search}` }, { 'GET /lots': answer });

describe('the rack', () => {
  it('tells bids, prices and the own standing in words', async () => {
    show();
    await screen.findByRole('link', { name: 'Memory' });
    const cells = screen.getAllByRole('row').map(({ textContent }) => textContent);
    expect(cells[1]).toMatch(/\$2,4001 buyer.*Outbid.*yours \$2,000.*Bid again/);
    expect(cells[2]).toMatch(/No bids.*from \$1,000/);
    expect(cells[3]).toMatch(/\$1,100asking price/);
  });

  it('draws own and leading bids on the stone of a lot the buyer has bid on', async () => {
    show();
    await waitFor(() => expect(document.querySelectorAll('.streak-notch')).toHaveLength(1));
    expect(document.querySelectorAll('.streak-lead')).toHaveLength(1);
  });

  it('goes from lot to lot by arrow keys, Home and End', async () => {
    show();
    (await screen.findByRole('link', { name: 'Memory' })).focus();
    const focused = () => document.activeElement?.textContent;
    await userEvent.keyboard('{ArrowDown}');
    expect(focused()).toBe('Phone boards');
    await userEvent.keyboard('{End}');
    expect(focused()).toBe('Cards');
    await userEvent.keyboard('{ArrowDown}{ArrowUp}');
    expect(focused()).toBe('Phone boards');
    await userEvent.keyboard('{Home}');
    expect(focused()).toBe('Memory');
  });

  it('opens the search with a slash, and searches what is typed', async () => {
    const { router } = show();
    await screen.findByRole('link', { name: 'Memory' });
    await userEvent.keyboard('/memory');
    await waitFor(() => expect(router.state.location.search).toBe('?q=memory'));
  });

  it('puts filters and order into the address', async () => {
    const { router } = show();
    await screen.findByRole('link', { name: 'Memory' });
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Expected gold' }), '10');
    await waitFor(() => expect(router.state.location.search).toBe('?goldG=10'));
    await userEvent.click(screen.getByRole('link', { name: /Gold in lot/ }));
    await waitFor(() => expect(router.state.location.search).toBe('?goldG=10&sort=-gold'));
    const sorted = screen.getAllByRole('columnheader').filter((head) => head.hasAttribute('aria-sort'));
    expect(sorted.map((head) => head.getAttribute('aria-sort'))).toEqual(['descending']);
  });

  it('pages through a longer list', async () => {
    show(list(three.rows, { total: 43, page: 2 }), '?page=2&goldG=10');
    expect(await screen.findByText('21 to 23 of 43 lots')).toBeDefined();
    expect(screen.getByRole('link', { name: 'Previous' }).getAttribute('href')).toBe('/?goldG=10');
    expect(screen.getByRole('link', { name: 'Next' }).getAttribute('href')).toBe('/?goldG=10&page=3');
  });

  it('says what will be here when nothing fits', async () => {
    show(list([]), '?goldG=50');
    expect(await screen.findByRole('heading', { name: 'No open lot fits' })).toBeDefined();
    expect(screen.getByRole('link', { name: 'Show all open lots' }).getAttribute('href')).toBe('/');
  });

  it('holds still when asked to', async () => {
    show();
    const pause = await screen.findByRole('button', { name: 'Pause' });
    await userEvent.click(pause);
    expect(screen.getByRole('button', { name: 'Go on' }).getAttribute('aria-pressed')).toBe('true');
  });
});
