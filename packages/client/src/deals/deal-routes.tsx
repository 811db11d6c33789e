import type { RouteObject } from 'react-router-dom';
import { RequireRole } from '../shell/RequireRole.tsx';
import type { Side } from './deals.queries.ts';

/**
 * The pages of a deal, the same for both sides: `deals`, `deals/:dealCode` with its steps, `deals/:dealCode/statement`.
 * Each is a chunk of its own.
 */
export function dealRoutes(side: Side): RouteObject[] {
  return [
    {
      element: <RequireRole roles={[side]} />,
      children: [
        {
          path: '/deals',
          lazy: async () => {
            const { DealsPage } = await import('./pages/DealsPage.tsx');
            return { element: <DealsPage side={side} /> };
          },
        },
        { path: '/deals/:dealCode', lazy: () => import('./pages/DealPage.tsx') },
        { path: '/deals/:dealCode/statement', lazy: () => import('./pages/StatementPage.tsx') },
        { path: '/deals/:dealCode/dispatch', lazy: () => import('./pages/DispatchPage.tsx') },
        { path: '/deals/:dealCode/weigh-in', lazy: () => import('../weigh-in/WeighInPage.tsx') },
        { path: '/deals/:dealCode/:step', lazy: () => import('./pages/CheckStepPage.tsx') },
      ],
    },
  ];
}
