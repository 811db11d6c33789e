import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { someDeal } from '../deals/deal.fixture.ts';
import { createQueryClient } from '../query-client.ts';
import { Component as WeighInPage } from './WeighInPage.tsx';

const photoId = '8f0e7b1e-4a0a-4a57-9a7a-0d1d7f3e6a01';
const photo = { id: photoId, slot: 'on-scale', description: '', width: 4, height: 3, colour: '#000000' };
const posts: { url: string; body: unknown }[] = [];

beforeEach(() => {
  posts.length = 0;
  localStorage.clear();
  vi.stubGlobal('fetch', (url: string, { method, body }: { method?: string; body?: string } = {}) => {
    const deal = someDeal({ state: 'received', actions: ['weigh_in'] });
    if (method === 'POST') posts.push({ url, body: JSON.parse(body ?? 'null') });
    return Promise.resolve(Response.json(method === 'POST' ? { ...deal, state: 'weighed_in', actions: [] } : deal));
  });
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

async function open() {
  const router = createMemoryRouter(
    [
      { path: '/deals/:dealCode/weigh-in', Component: WeighInPage, HydrateFallback: () => null },
      { path: '/deals/:dealCode', element: <p>the deal</p> },
    ],
    { initialEntries: ['/deals/D-1/weigh-in'] },
  );
  render(
    <QueryClientProvider client={createQueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  await screen.findByRole('heading', { name: 'Weigh-in' });
  return router;
}

const enterMasses = async (gross: string, tare: string) => {
  const user = userEvent.setup();
  await user.type(screen.getByLabelText('Gross'), gross);
  await user.type(screen.getByLabelText('Tare'), tare);
  await user.type(screen.getByLabelText('The scale reads to'), '10');
};

describe('the weigh-in', () => {
  it('shows net by arithmetic and the shortage against the tolerance', async () => {
    await open();
    await enterMasses('10.8', '1');
    expect(screen.getByText('9.8 kg')).toBeTruthy();
    expect(screen.getByText(/200 g short, beyond the tolerance of 50 g/)).toBeTruthy();
  });
  it('names everything that is missing, and sends nothing', async () => {
    await open();
    await userEvent.setup().click(screen.getByRole('button', { name: 'Enter the weigh-in' }));
    expect(screen.getAllByRole('link').map((link) => link.textContent)).toEqual(
      expect.arrayContaining([
        'Enter the gross mass, as the scale showed it.',
        'Enter the smallest step the scale shows.',
        'Add a photo of the scale or the ticket.',
      ]),
    );
    expect(posts).toEqual([]);
  });
  it('loses nothing when the page is left and opened again', async () => {
    await open();
    await enterMasses('10.95', '1');
    cleanup();
    await open();
    expect(screen.getByLabelText<HTMLInputElement>('Gross').value).toBe('10.95');
    expect(screen.getByText('9.95 kg')).toBeTruthy();
  });
  it('sends grams, forgets the draft and offers the scale again next time', async () => {
    const blank = { text: '', unit: 'kg', value: null };
    const scale = { text: '10', unit: 'g', value: 10 };
    localStorage.setItem(
      'lydite.weigh-in.D-1',
      JSON.stringify({ gross: blank, tare: blank, resolution: scale, scaleSerial: '4711', note: '', photos: [photo] }),
    );
    const router = await open();
    const user = userEvent.setup();
    await user.type(screen.getByLabelText('Gross'), '10.95');
    await user.type(screen.getByLabelText('Tare'), '1');
    await user.click(screen.getByRole('button', { name: 'Enter the weigh-in' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/deals/D-1'));
    expect(posts).toEqual([
      {
        url: '/api/deals/D-1/weigh-in',
        body: {
          grossG: 10_950,
          tareG: 1_000,
          scaleResolutionG: 10,
          scaleSerial: '4711',
          note: '',
          photoIds: [photoId],
        },
      },
    ]);
    expect(localStorage.getItem('lydite.weigh-in.D-1')).toBeNull();
    expect(JSON.parse(localStorage.getItem('lydite.scale') ?? '')).toEqual({ resolution: scale, scaleSerial: '4711' });
  });
});
