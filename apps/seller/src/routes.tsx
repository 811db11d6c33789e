import { dealRoutes, RequireRole } from '@lydite/client';
import { Skeleton } from '@lydite/ui';
import { Suspense } from 'react';
import { Outlet, redirect, type RouteObject } from 'react-router-dom';

/** Each page is a chunk of its own, and waits here for the market and for what it shows. */
export const routes: RouteObject[] = [
  {
    element: (
      <Suspense fallback={<Loading />}>
        <Outlet />
      </Suspense>
    ),
    children: [
      {
        element: <RequireRole roles={['seller']} />,
        children: [
          { path: '/', loader: () => redirect('/lots'), element: null },
          { path: '/lots', lazy: () => import('./pages/MyLotsPage.tsx') },
          { path: '/lots/:lotCode', lazy: () => import('./pages/OwnLotPage.tsx') },
          { path: '/lots/:lotCode/withdraw', lazy: () => import('./pages/WithdrawPage.tsx') },
          {
            path: '/lots/:lotCode',
            lazy: () => import('./pages/draft/DraftPage.tsx'),
            children: [
              { path: 'photos', lazy: () => import('./pages/draft/PhotosPage.tsx') },
              { path: 'contents', lazy: () => import('./pages/draft/ContentsPage.tsx') },
              { path: 'weight', lazy: () => import('./pages/draft/WeightPage.tsx') },
              { path: 'sale', lazy: () => import('./pages/draft/SalePage.tsx') },
              { path: 'check', lazy: () => import('./pages/draft/CheckPage.tsx') },
            ],
          },
          { path: '/payouts', lazy: () => import('./pages/PayoutsPage.tsx') },
        ],
      },
      ...dealRoutes('seller'),
    ],
  },
];

function Loading() {
  return (
    <main id="main" className="page">
      <Skeleton height={480} />
    </main>
  );
}
