import { dealRoutes, RequireRole } from '@lydite/client';
import { Skeleton } from '@lydite/ui';
import { Suspense } from 'react';
import { Outlet, type RouteObject } from 'react-router-dom';

/** Each page is a chunk of its own, and waits here for the market and for what it shows. */
export const routes: RouteObject[] = [
  {
    element: (
      <Suspense fallback={<Loading />}>
        <Outlet />
      </Suspense>
    ),
    children: [
      { path: '/', lazy: () => import('./pages/LotsPage.tsx') },
      { path: '/lots/:lotCode', lazy: () => import('./pages/LotPage.tsx') },
      {
        element: <RequireRole roles={['buyer']} />,
        children: [
          { path: '/lots/:lotCode/bid', lazy: () => import('./pages/CheckBidPage.tsx') },
          { path: '/lots/:lotCode/take', lazy: () => import('./pages/TakeLotPage.tsx') },
          { path: '/lots/:lotCode/offer', lazy: () => import('./pages/AnswerOfferPage.tsx') },
          { path: '/bids', lazy: () => import('./pages/MyBidsPage.tsx') },
          { path: '/terms', lazy: () => import('./pages/TermsPage.tsx') },
        ],
      },
      ...dealRoutes('buyer'),
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
