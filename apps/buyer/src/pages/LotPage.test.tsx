import type { LotView } from '@lydite/contracts';
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { inHours, openLot } from '../../test/market.ts';
import { renderPage, type Answers } from '../../test/render-page.tsx';
import { Component } from './LotPage.tsx';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = (lot: LotView, answers: Answers = {}, search = '') =>
  renderPage(
    { Component, path: '/lots/:lotCode', at: `/lots/L-2481${search}` },
    { 'GET /lots/L-2481': lot, ...answers },
  );
const field = () => screen.findByRole<HTMLInputElement>('textbox', { name: 'Most you would pay' });
const ahead = () => Number(/(\d+) of 50 equally likely/.exec(document.body.textContent ?? '')?.[1]);

describe('the bench of a lot open for bids', () => {
  it('starts at the next bid and reads each amount at once', async () => {
    show(openLot());
    const most = await field();
    expect(most.value).toBe('2,420');
    const before = ahead();
    await userEvent.clear(most);
    await userEvent.type(most, '4000');
    expect(ahead()).toBeLessThan(before);
    expect(screen.getByRole('slider').getAttribute('aria-valuetext')).toContain(`ahead in ${ahead()} of 50`);
  });

  it('moves the amount with the notch’s arrow keys by one step', async () => {
    show(openLot());
    const most = await field();
    screen.getByRole('slider').focus();
    await userEvent.keyboard('{ArrowRight}');
    expect(most.value).toBe('2,440');
  });

  it('leads to the check with the amount, and finds it again on the way back', async () => {
    const { router } = show(openLot());
    const most = await field();
    await userEvent.clear(most);
    await userEvent.type(most, '3800');
    await userEvent.click(screen.getByRole('button', { name: 'Check this bid' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/lots/L-2481/bid'));
    expect(router.state.location.search).toBe('?most=3800');
    await router.navigate(-1);
    expect((await field()).value).toBe('3,800');
  });

  it('refuses an amount below the next bid beside the field', async () => {
    show(openLot(), {}, '?most=2000');
    await field();
    await userEvent.click(screen.getByRole('button', { name: 'Check this bid' }));
    expect(screen.getByRole('textbox').getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByText('The next bid starts at $2,420')).toBeDefined();
  });

  it('takes over what the buyer’s terms allow', async () => {
    show(openLot());
    const most = await field();
    await userEvent.click(screen.getByRole('button', { name: 'Use it' }));
    const allowed = screen.getByText(/Your terms allow up to/).querySelector('b')?.textContent;
    expect(`$${most.value}`).toBe(allowed);
  });
});

describe('others at the bench', () => {
  it('asks a visitor to sign in, and back here', async () => {
    show(openLot({ you: null }), { 'GET /session': { member: null, freshUntil: null, unreadNotices: 0 } });
    const link = await screen.findByRole('link', { name: 'Sign in to bid' });
    expect(link.getAttribute('href')).toBe('/sign-in?next=%2Flots%2FL-2481');
    expect(screen.queryByRole('textbox')).toBeNull();
  });

  it('offers the asking price to a buyer', async () => {
    show(openLot({ form: 'asking-price', priceMinor: 110_000, leastNextMinor: null }));
    const link = await screen.findByRole('link', { name: 'Take it at $1,100' });
    expect(link.getAttribute('href')).toBe('/lots/L-2481/take');
    expect(screen.queryByRole('heading', { name: 'Bids' })).toBeNull();
  });
});

describe('a closed lot', () => {
  const closed = (you: Partial<NonNullable<LotView['you']>>) =>
    openLot({ state: 'awarded', leastNextMinor: null, closesAt: inHours(-2), you: { ...openLot().you!, ...you } });

  it('leads the winner to the deal', async () => {
    show(closed({ standing: 'highest', dealCode: 'D-1043' }));
    expect((await screen.findByRole('link', { name: 'Open deal D-1043' })).getAttribute('href')).toBe('/deals/D-1043');
    expect(screen.queryByRole('button', { name: 'Check this bid' })).toBeNull();
  });

  it('tells the others that it is gone', async () => {
    show(closed({}));
    expect(await screen.findByText(/It went to another buyer/)).toBeDefined();
  });

  it('takes no bid past its close even while its state says open', async () => {
    show(openLot({ closesAt: inHours(-0.01) }));
    expect(await screen.findByText(/The result is being worked out/)).toBeDefined();
    expect(screen.queryByRole('textbox')).toBeNull();
  });
});

describe('what the estimate rests on', () => {
  it('shows how each line is known and where its kind’s figures come from', async () => {
    show(openLot());
    const lines = within(await screen.findByRole('region', { name: 'Lines of the estimate' }));
    expect(lines.getByText(/Kind inspected, counted, weighed to 20/)).toBeDefined();
    expect(screen.getByText(/modelled: 168 to 288 contacts/)).toBeDefined();
  });
});
