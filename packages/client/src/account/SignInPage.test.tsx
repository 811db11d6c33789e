import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createQueryClient } from '../query-client.ts';
import { safeNext } from './safe-next.ts';
import { Component as SignInPage } from './SignInPage.tsx';

const market = {
  currency: 'USD',
  zone: 'Europe/Vienna',
  now: '2026-12-01T10:00:00Z',
  buyerFeeBp: 200,
  sellerFeeBp: 400,
  price: null,
  demo: { mailUrl: 'http://localhost:4410', signIns: [{ role: 'buyer', email: 'buying@sallowby.example' }] },
};
const problem = (code: string, status: number, detail: string) =>
  Response.json({ type: '', title: '', status, code, detail, requestId: '', fields: [] }, { status });

let signIn: (body: unknown) => Response;

beforeEach(() => {
  localStorage.clear();
  vi.stubGlobal('fetch', (url: string, init: { body?: string } = {}) =>
    Promise.resolve(
      url === '/api/session'
        ? signIn(JSON.parse(init.body ?? 'null'))
        : url === '/api/market'
          ? Response.json(market)
          : Response.json([]),
    ),
  );
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

async function open(address: string) {
  const router = createMemoryRouter(
    [
      { path: '/sign-in', Component: SignInPage, HydrateFallback: () => null },
      { path: '*', element: <p>elsewhere</p> },
    ],
    { initialEntries: [address] },
  );
  render(
    <QueryClientProvider client={createQueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  await screen.findByRole('heading', { name: 'Sign in' });
  return router;
}

describe('signing in', () => {
  it('sends what was typed and goes where the visitor wanted to go', async () => {
    const user = userEvent.setup();
    const bodies: unknown[] = [];
    signIn = (body) => {
      bodies.push(body);
      return Response.json({ member: { roles: ['buyer'] }, freshUntil: null, unreadNotices: 0 });
    };
    const router = await open('/sign-in?next=%2Fdeals%2FD-1');
    await user.type(screen.getByLabelText('E-mail'), ' a@b.example ');
    await user.type(screen.getByLabelText('Password'), 'seven grams of gold');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/deals/D-1'));
    expect(bodies).toEqual([{ email: 'a@b.example', password: 'seven grams of gold' }]);
  });
  it('says why it was refused and keeps what was typed', async () => {
    const user = userEvent.setup();
    signIn = () => problem('session.wrong_credentials', 401, 'The address or the password is not right.');
    await open('/sign-in');
    await user.type(screen.getByLabelText('E-mail'), 'a@b.example');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect((await screen.findByRole('alert')).textContent).toBe('The address or the password is not right.');
    expect(screen.getByLabelText<HTMLInputElement>('E-mail').value).toBe('a@b.example');
    expect(document.title).toBe('Error: Sign in · Lydite');
  });
  it('asks for the code of a second step, keeps what was typed, and sends all of it', async () => {
    const user = userEvent.setup();
    const bodies: unknown[] = [];
    const answers = [
      problem('session.code_required', 401, 'Enter the code of your authenticator app.'),
      problem('session.code_wrong', 401, 'This code is not right.'),
      Response.json({ member: { roles: ['buyer'] }, freshUntil: null, unreadNotices: 0 }),
    ];
    signIn = (body) => {
      bodies.push(body);
      return answers.shift()!;
    };
    const router = await open('/sign-in?next=%2Faccount');
    await user.type(screen.getByLabelText('E-mail'), 'a@b.example');
    await user.type(screen.getByLabelText('Password'), 'seven grams of gold');
    expect(screen.queryByLabelText(/^Code/)).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Sign in' }));

    const code = await screen.findByLabelText<HTMLInputElement>(/^Code/);
    expect(document.activeElement).toBe(code);
    expect([code.autocomplete, code.inputMode]).toEqual(['one-time-code', 'numeric']);
    expect(screen.queryByRole('alert'), 'being asked is no error').toBeNull();
    expect(screen.getByLabelText<HTMLInputElement>('Password').value).toBe('seven grams of gold');

    await user.type(code, '111111{Enter}');
    expect((await screen.findByRole('alert')).textContent).toBe('This code is not right.');
    expect(screen.getByLabelText<HTMLInputElement>('E-mail').value).toBe('a@b.example');
    expect(code.value, 'a code is not sent twice').toBe('');

    await user.click(screen.getByRole('button', { name: 'Use a recovery code' }));
    expect(screen.getByLabelText<HTMLInputElement>('Recovery code').inputMode, 'it has letters').toBe('text');
    await user.type(code, 'abcd-efgh{Enter}');
    await waitFor(() => expect(router.state.location.pathname).toBe('/account'));
    const password = { email: 'a@b.example', password: 'seven grams of gold' };
    expect(bodies).toEqual([password, { ...password, code: '111111' }, { ...password, code: 'abcd-efgh' }]);
  });
  it('says where the demo keeps its mails when the address is not confirmed', async () => {
    const user = userEvent.setup();
    signIn = () => problem('session.email_unconfirmed', 403, 'Confirm your e-mail address first.');
    await open('/sign-in');
    await user.click(screen.getByRole('button', { name: 'Use buying@sallowby.example' }));
    expect(screen.getByLabelText<HTMLInputElement>('E-mail').value).toBe('buying@sallowby.example');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    await screen.findByRole('alert');
    expect(screen.getAllByRole('link', { name: 'the demo’s mailbox' })[0]?.getAttribute('href')).toBe(
      'http://localhost:4410',
    );
  });
});

describe('where signing in leads', () => {
  it.each([
    ['/deals/D-1?paid=1', '/deals/D-1?paid=1'],
    ['//elsewhere.example', '/'],
    ['/\\elsewhere.example', '/'],
    ['https://elsewhere.example', '/'],
    [null, '/'],
  ])('%s leads to %s', (next, expected) => {
    expect(safeNext(next)).toBe(expected);
  });
});
