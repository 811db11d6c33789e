import type { RouteObject } from 'react-router-dom';

/** Pages every client has: signing in and out of the market, the own account, the notices. Each is a chunk of its own. */
export const accountRoutes: RouteObject[] = [{ path: '/sign-in', lazy: () => import('./SignInPage.tsx') }];
