import type { ProblemBody } from '@lydite/contracts';
import { catalogue20261 } from '@lydite/valuation';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import { Suspense, type ComponentType } from 'react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { vi } from 'vitest';
import { buyer, market, terms } from './market.ts';

/** Answers of the API by route; a function sees the body. Throwing a `Refusal` answers with its problem, any other error is a lost connection. */
export type Answers = Record<string, unknown>;

export class Refusal extends Error {
  readonly problem: ProblemBody;

  constructor(problem: Pick<ProblemBody, 'code' | 'status' | 'detail' | 'context'>) {
    super(problem.detail);
    this.problem = { type: '', title: '', requestId: 'test', fields: [], ...problem };
  }
}

const standing: Answers = {
  'GET /session': { member: buyer, freshUntil: null, unreadNotices: 0 },
  'GET /market': market,
  'GET /catalogue': catalogue20261,
  'GET /catalogue/2026.1': catalogue20261,
  'GET /my/terms': terms,
};

const json = (body: unknown, status = 200) =>
  new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/json' } });

/** Shows a page at an address against the given answers; every call nobody planned is a 404. Returns the calls made, for counting. */
export function renderPage(page: { Component: ComponentType; path: string; at: string }, answers: Answers) {
  const calls: { route: string; body: unknown }[] = [];
  const known = { ...standing, ...answers };
  vi.stubGlobal('fetch', async (url: string, init: RequestInit = {}) => {
    const route = `${init.method ?? 'GET'} ${url.replace(/^\/api/, '').replace(/\?.*$/, '')}`;
    const body: unknown = typeof init.body === 'string' ? JSON.parse(init.body) : undefined;
    calls.push({ route, body });
    if (!(route in known)) return json({ code: 'route.not_found', status: 404, detail: route, fields: [] }, 404);
    const answer = known[route];
    try {
      return json(typeof answer === 'function' ? await answer(body) : answer);
    } catch (error) {
      if (error instanceof Refusal) return json(error.problem, error.problem.status);
      throw error;
    }
  });
  const router = createMemoryRouter(
    [
      { path: page.path, Component: page.Component },
      { path: '*', element: <p>Elsewhere</p> },
    ],
    { initialEntries: [page.at] },
  );
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  render(
    <QueryClientProvider client={client}>
      <Suspense fallback={<p>Loading</p>}>
        <RouterProvider router={router} />
      </Suspense>
    </QueryClientProvider>,
  );
  return { calls, router };
}
