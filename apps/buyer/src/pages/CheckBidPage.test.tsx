import { cleanup, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { inHours, openLot } from '../../test/market.ts';
import { Refusal, renderPage, type Answers } from '../../test/render-page.tsx';
import { Component } from './CheckBidPage.tsx';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const route = 'POST /lots/L-2481/bids';
const outcome = {
  standing: 'highest',
  ceilingMinor: 380_000,
  priceMinor: 300_000,
  leastNextMinor: 380_001,
  closesAt: inHours(50),
  bidders: 4,
};

const show = (answers: Answers = {}, most = '3800') =>
  renderPage(
    { Component, path: '/lots/:lotCode/bid', at: `/lots/L-2481/bid?most=${most}` },
    { 'GET /lots/L-2481': openLot(), [route]: outcome, ...answers },
  );
const bidsOf = ({ calls }: ReturnType<typeof show>) =>
  calls.filter((one) => one.route === route).map(({ body }) => body);
const press = async () => userEvent.click(await screen.findByRole('button', { name: 'Make it binding' }));
const tick = async () => userEvent.click(await screen.findByRole('checkbox'));

describe('checking a bid', () => {
  it('says what goes into the hold at most', async () => {
    show();
    expect(await screen.findByText(/price \$3,800, freight \$60, fee \$76 \(2/)).toBeDefined();
    expect(screen.getByText('$3,936')).toBeDefined();
  });

  it('sends nothing before the rules are ticked, and says so', async () => {
    const page = show();
    await press();
    expect(screen.getByRole('checkbox').getAttribute('aria-invalid')).toBe('true');
    expect(document.title).toMatch(/^Error: /);
    expect(bidsOf(page)).toEqual([]);
  });

  it('places one bid for two presses and shows the market’s word', async () => {
    let answer: (value: unknown) => void = () => undefined;
    const page = show({ [route]: () => new Promise((resolve) => (answer = resolve)) });
    await tick();
    await press();
    await userEvent.click(await screen.findByRole('button', { name: 'Sending' }));
    answer(outcome);
    const head = await screen.findByRole('heading', { name: 'Highest' });
    expect(document.activeElement).toBe(head);
    expect(bidsOf(page)).toMatchObject([{ ceilingMinor: 380_000 }]);
  });

  it('offers the next bid when another buyer would pay more', async () => {
    show({ [route]: { ...outcome, standing: 'outbid', priceMinor: 390_000, leastNextMinor: 395_000 } });
    await tick();
    await press();
    await screen.findByRole('heading', { name: 'Outbid' });
    expect(screen.getByRole('link', { name: 'Weigh another bid' }).getAttribute('href')).toBe('/lots/L-2481?most=3950');
  });

  it('sends the same attempt again after a lost answer, so that it is one bid', async () => {
    let times = 0;
    const page = show({
      [route]: () => {
        if (++times === 1) throw new TypeError('Failed to fetch');
        return outcome;
      },
    });
    await tick();
    await press();
    await screen.findByRole('alert');
    await press();
    await screen.findByRole('heading', { name: 'Highest' });
    const [first, second] = bidsOf(page) as { attempt: string }[];
    expect(second?.attempt).toBe(first?.attempt);
  });

  it('keeps the refusal with the way on, and takes the next press as a new act', async () => {
    const refusal = new Refusal({
      code: 'bid.below_least',
      status: 409,
      detail: 'The bidding has gone past this amount. Nothing was placed.',
      context: { leastNextMinor: 405_000 },
    });
    const page = show({ [route]: () => Promise.reject(refusal) });
    await tick();
    await press();
    expect((await screen.findByRole('alert')).textContent).toContain('gone past this amount');
    expect(screen.getByRole('link', { name: 'Weigh a bid of $4,050' }).getAttribute('href')).toBe(
      '/lots/L-2481?most=4050',
    );
    await press();
    await waitFor(() => expect(bidsOf(page)).toHaveLength(2));
    const [first, second] = bidsOf(page) as { attempt: string }[];
    expect(second?.attempt).not.toBe(first?.attempt);
  });

  it.each([
    ['below the next bid', '2400', /next bid starts at \$2,420/],
    ['over the limit', '41000', /limit has room for \$40,000/],
    ['not there', '', /Enter the most you would pay/],
  ])('has no button for an amount %s', async (_, most, words) => {
    show({}, most);
    expect(await screen.findByText(words)).toBeDefined();
    expect(screen.queryByRole('button')).toBeNull();
  });

  it('has no button once the lot takes no bids', async () => {
    show({ 'GET /lots/L-2481': openLot({ state: 'awarded', leastNextMinor: null }) });
    expect(await screen.findByText('This lot takes no bids now.')).toBeDefined();
    expect(screen.queryByRole('button')).toBeNull();
  });
});
