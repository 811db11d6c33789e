import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen } from '@testing-library/react';
import { createMemoryRouter, RouterProvider, useLocation } from 'react-router-dom';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createQueryClient } from '../query-client.ts';
import { ErrorPage } from './ErrorPage.tsx';
import { RequireRole } from './RequireRole.tsx';

function Where() {
  const { pathname, search } = useLocation();
  return <p>{pathname + search}</p>;
}

function open(answer: () => Promise<Response>) {
  vi.stubGlobal('fetch', answer);
  const cache = createQueryClient();
  cache.setDefaultOptions({ queries: { retry: false } });
  const router = createMemoryRouter(
    [
      {
        element: <RequireRole roles={['seller']} />,
        errorElement: <ErrorPage />,
        children: [{ path: '/payments', element: <p>the page</p> }],
      },
      { path: '/sign-in', Component: Where },
    ],
    { initialEntries: ['/payments?from=mail'] },
  );
  render(
    <QueryClientProvider client={cache}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
}

const session = (roles: string[] | null) => () =>
  Promise.resolve(Response.json({ member: roles && { roles }, freshUntil: null, unreadNotices: 0 }));

beforeEach(() => localStorage.clear());
afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
});

describe('a page for members with a role', () => {
  it('shows itself to them', async () => {
    open(session(['seller', 'buyer']));
    expect(await screen.findByText('the page')).toBeTruthy();
  });
  it('sends visitors to sign in and back', async () => {
    open(session(null));
    expect(await screen.findByText('/sign-in?next=%2Fpayments%3Ffrom%3Dmail')).toBeTruthy();
  });
  it('tells other members which role it needs and where to add it', async () => {
    open(session(['buyer']));
    expect(await screen.findByRole('heading', { name: 'This page is for selling' })).toBeTruthy();
    expect(screen.getByRole('link', { name: 'add it in your account' }).getAttribute('href')).toBe('/account');
    expect(screen.queryByText('the page')).toBeNull();
  });
  it('says so when the market cannot be reached', async () => {
    // React reports what an error page catches.
    vi.spyOn(console, 'error').mockReturnValue();
    open(() => Promise.reject(new TypeError('failed to fetch')));
    expect(await screen.findByRole('heading', { name: 'The market cannot be reached' })).toBeTruthy();
  });
});
