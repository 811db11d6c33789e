import { cleanup, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { openLot } from '../../test/market.ts';
import { Refusal, renderPage, type Answers } from '../../test/render-page.tsx';
import { Component } from './TakeLotPage.tsx';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const route = 'POST /lots/L-2481/take';
const asking = openLot({ form: 'asking-price', priceMinor: 110_000, leastNextMinor: null });
const show = (answers: Answers = {}) =>
  renderPage(
    { Component, path: '/lots/:lotCode/take', at: '/lots/L-2481/take' },
    { 'GET /lots/L-2481': asking, [route]: { dealCode: 'D-1043' }, ...answers },
  );
const take = async (name = 'Take it at $1,100') => {
  await userEvent.click(await screen.findByRole('checkbox'));
  await userEvent.click(screen.getByRole('button', { name }));
};

describe('taking a lot at its price', () => {
  it('sends the price that was seen and goes on to the deal', async () => {
    const { calls, router } = show();
    await take();
    await waitFor(() => expect(router.state.location.pathname).toBe('/deals/D-1043'));
    const taken = calls.filter((one) => one.route === route);
    expect(taken.map(({ body }) => body)).toMatchObject([{ priceMinor: 110_000 }]);
  });

  it('says that the price changed, and asks again at the new one', async () => {
    let priceMinor = 110_000;
    show({
      'GET /lots/L-2481': () => ({ ...asking, priceMinor }),
      [route]: () => {
        priceMinor = 120_000;
        throw new Refusal({
          code: 'lot.price_changed',
          status: 409,
          detail: 'The asking price is another one now. Nothing was taken.',
          context: { priceMinor },
        });
      },
    });
    await take();
    expect((await screen.findByRole('alert')).textContent).toContain('It is $1,200 now');
    expect(await screen.findByRole('button', { name: 'Take it at $1,200' })).toBeDefined();
  });

  it('has no button for a lot that another buyer took first', async () => {
    let state = 'open';
    show({
      'GET /lots/L-2481': () => ({ ...asking, state }),
      [route]: () => {
        state = 'awarded';
        throw new Refusal({ code: 'lot.closed', status: 409, detail: 'This lot is closed. Your bid was not placed.' });
      },
    });
    await take();
    expect(await screen.findByText(/This lot is closed/)).toBeDefined();
    await waitFor(() => expect(screen.queryByRole('checkbox')).toBeNull());
  });
});
