import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import { accountRoutes } from '../account/account-routes.ts';
import { createQueryClient } from '../query-client.ts';
import type { ClientApp } from './client-app.ts';
import { ErrorPage, NotFoundPage } from './ErrorPage.tsx';
import { Shell } from './Shell.tsx';
import { applyTheme, readTheme } from './theme.ts';

/** Starts one of the clients in the page's `#root`. */
export function mountApp({ app, roleWord, basename, nav, routes }: ClientApp): void {
  applyTheme(readTheme());
  document.documentElement.dataset.app = app;
  const router = createBrowserRouter(
    [
      {
        element: <Shell app={app} roleWord={roleWord} nav={nav} />,
        HydrateFallback: () => null,
        children: [
          {
            errorElement: <ErrorPage />,
            children: [...routes, ...accountRoutes, { path: '*', Component: NotFoundPage }],
          },
        ],
      },
    ],
    { basename },
  );
  createRoot(document.getElementById('root')!).render(
    <StrictMode>
      <QueryClientProvider client={createQueryClient()}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </StrictMode>,
  );
}
