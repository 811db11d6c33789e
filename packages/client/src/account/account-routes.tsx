import type { RouteObject } from 'react-router-dom';
import { RequireRole } from '../shell/RequireRole.tsx';

/**
 * Pages every client has: signing in and out of the market, the own account, the notices. Each is a chunk of its own.
 * Mails link to `/confirm` and `/reset` of the client at the root, whatever the member's roles.
 */
export const accountRoutes: RouteObject[] = [
  { path: '/sign-in', lazy: () => import('./SignInPage.tsx') },
  { path: '/register', lazy: () => import('./RegisterPage.tsx') },
  { path: '/register/sent', lazy: () => import('./RegisterSentPage.tsx') },
  { path: '/confirm', lazy: () => import('./ConfirmPage.tsx') },
  { path: '/forgot', lazy: () => import('./ForgotPage.tsx') },
  { path: '/reset', lazy: () => import('./ResetPage.tsx') },
  {
    element: <RequireRole />,
    children: [
      { path: '/account', lazy: () => import('./AccountPage.tsx') },
      { path: '/notices', lazy: () => import('../notices/NoticesPage.tsx') },
    ],
  },
];
