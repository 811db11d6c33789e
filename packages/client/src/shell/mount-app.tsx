import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import { accountRoutes } from '../account/account-routes.tsx';
import { createQueryClient } from '../query-client.ts';
import { AppProvider } from './app-context.ts';
import type { ClientApp } from './client-app.ts';
import { ErrorPage, NotFoundPage } from './ErrorPage.tsx';
import { Shell } from './Shell.tsx';
import { applyTheme, readTheme } from './theme.ts';
import { keepZodFromEval } from './zod-without-eval.ts';

/** Starts one of the clients in the page's `#root`. */
export function mountApp({ app, roleWord, basename, nav, routes }: ClientApp): void {
  keepZodFromEval();
  applyTheme(readTheme());
  const router = createBrowserRouter(
    [
      {
        element: <Shell app={app} roleWord={roleWord} nav={nav} />,
        errorElement: <ErrorPage />,
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
        <AppProvider value={{ app, basename }}>
          <RouterProvider router={router} />
        </AppProvider>
      </QueryClientProvider>
    </StrictMode>,
  );
}
