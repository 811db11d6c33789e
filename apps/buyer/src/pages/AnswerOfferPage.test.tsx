import { cleanup, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { inHours, openLot } from '../../test/market.ts';
import { renderPage } from '../../test/render-page.tsx';
import { Component } from './AnswerOfferPage.tsx';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const route = 'POST /lots/L-2481/offer-answer';
const row = {
  lotCode: 'L-2481',
  title: 'Server memory',
  coverPhotoId: null,
  lotState: 'offered',
  standing: 'outbid',
  ceilingMinor: 200_000,
  priceMinor: 240_000,
  leastNextMinor: null,
  closesAt: inHours(-3),
  dealCode: null,
  dealState: null,
  offer: { priceMinor: 195_000, answerBy: inHours(20) },
};

/** The offer is gone once it is answered, as the market has it. */
function show(dealCode: string | null, offer: typeof row.offer | null = row.offer) {
  let open = offer;
  return renderPage(
    { Component, path: '/lots/:lotCode/offer', at: '/lots/L-2481/offer' },
    {
      'GET /lots/L-2481': openLot({ state: 'offered', leastNextMinor: null, closesAt: inHours(-3) }),
      'GET /my/bids': () => ({ rows: [{ ...row, offer: open }], roomMinor: 1, limitMinor: 1, ifAllWonMinor: 0 }),
      [route]: () => {
        open = null;
        return { dealCode };
      },
    },
  );
}
const answers = ({ calls }: ReturnType<typeof show>) =>
  calls.filter((one) => one.route === route).map(({ body }) => body);

describe('a lot offered to the next bidder', () => {
  it('is accepted at its price, and goes on to the deal', async () => {
    const page = show('D-1043');
    await userEvent.click(await screen.findByRole('checkbox'));
    await userEvent.click(screen.getByRole('button', { name: 'Accept at $1,950' }));
    await waitFor(() => expect(page.router.state.location.pathname).toBe('/deals/D-1043'));
    expect(answers(page)).toEqual([{ accept: true }]);
  });

  it('is refused without a tick', async () => {
    const page = show(null);
    await userEvent.click(await screen.findByRole('button', { name: 'Refuse' }));
    expect(await screen.findByRole('heading', { name: 'Refused' })).toBeDefined();
    expect(answers(page)).toEqual([{ accept: false }]);
  });

  it('says so when nothing is offered any more', async () => {
    show(null, null);
    expect(await screen.findByText(/Nothing is offered to you/)).toBeDefined();
    expect(screen.queryByRole('button')).toBeNull();
  });
});
