import { RequireRole } from '@lydite/client';
import type { RouteObject } from 'react-router-dom';

/** Operators' pages; assayers only have the page of their requests. */
export const routes: RouteObject[] = [
  {
    element: <RequireRole roles={['operator', 'assayer']} />,
    children: [{ path: '/', lazy: () => import('./pages/HomePage.tsx') }],
  },
  {
    element: <RequireRole roles={['operator']} />,
    children: [
      { path: '/lots', lazy: () => import('./pages/LotsPage.tsx') },
      { path: '/members', lazy: () => import('./pages/MembersPage.tsx') },
      { path: '/members/:memberId/verify', lazy: () => import('./pages/VerifyMemberPage.tsx') },
      { path: '/effects', lazy: () => import('./pages/EffectsPage.tsx') },
      { path: '/ledger', lazy: () => import('./pages/LedgerPage.tsx') },
    ],
  },
];
