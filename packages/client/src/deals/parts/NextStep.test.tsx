import type { DealView } from '@lydite/contracts';
import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { createQueryClient } from '../../query-client.ts';
import { someDeal } from '../deal.fixture.ts';
import { NextStep } from './NextStep.tsx';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = (deal: DealView) =>
  render(
    <QueryClientProvider client={createQueryClient()}>
      <MemoryRouter>
        <NextStep deal={deal} />
      </MemoryRouter>
    </QueryClientProvider>,
  );
const links = () => screen.queryAllByRole('link').map((link) => [link.textContent, link.getAttribute('href')]);

describe('what happens next in a deal', () => {
  it('leads to the page of each step that is offered, and says what happens if it is missed', () => {
    show(someDeal({ actions: ['accept', 'claim_mass'] }));
    expect(links()).toEqual([
      ['Check and accept', '/deals/D-1/accept'],
      ['Claim the mass short', '/deals/D-1/claim'],
    ]);
    expect(screen.getByText('If that is missed: the award lapses.')).toBeTruthy();
  });
  it('offers no second payment while the bank processes the first', () => {
    show(someDeal({ actions: ['pay'], due: null, payment: { state: 'processing', message: '' } }));
    expect(links()).toEqual([]);
    expect(screen.getByText(/bank processes the payment/)).toBeTruthy();
  });
  it('gives the seller the packing slip with the dispatch', () => {
    show(someDeal({ side: 'seller', state: 'held', actions: ['dispatch'] }));
    expect(links()).toEqual([
      ['Enter the dispatch', '/deals/D-1/dispatch'],
      ['Packing slip', '/api/deals/D-1/packing-slip.pdf'],
    ]);
  });
  it('tells each side its own when dispatch is late and no clock runs', () => {
    show(someDeal({ side: 'seller', state: 'held', due: null }));
    expect(screen.getByText(/You are late: hand the lot over now/)).toBeTruthy();
  });
  it('says nothing has to be done while the deal is frozen', () => {
    show(someDeal({ frozen: true }));
    expect(screen.getByText(/Nothing has to be done until it is released/)).toBeTruthy();
  });
  it('records the receipt once, however often it is pressed', async () => {
    const user = userEvent.setup();
    const posts: string[] = [];
    let answer: (response: Response) => void = () => {};
    vi.stubGlobal('fetch', (url: string) => {
      posts.push(url);
      return new Promise<Response>((resolve) => (answer = resolve));
    });
    show(someDeal({ state: 'dispatched', actions: ['receive'] }));
    await user.click(screen.getByRole('button', { name: 'Record the receipt' }));
    await user.click(await screen.findByRole('button', { name: 'Recording' }));
    expect(posts).toEqual(['/api/deals/D-1/receive']);
    answer(
      Response.json(
        {
          type: '',
          title: '',
          status: 409,
          code: 'deal.wrong_state',
          detail: 'This cannot be done now.',
          requestId: '',
          fields: [],
        },
        { status: 409 },
      ),
    );
    expect((await screen.findByRole('alert')).textContent).toBe('This cannot be done now.');
  });
});
