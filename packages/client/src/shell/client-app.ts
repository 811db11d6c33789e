import type { Role } from '@lydite/contracts';
import type { RouteObject } from 'react-router-dom';

/** What makes one of the three clients. */
export interface ClientApp {
  app: 'buyer' | 'seller' | 'desk';
  /** The word beside the mark. */
  roleWord: string;
  /** Where the client lives below the one origin: `/`, `/sell` or `/desk`. */
  basename: string;
  /** The sections; one with a role is for members who have it alone. */
  nav: readonly { to: string; label: string; end?: boolean; role?: Role }[];
  routes: RouteObject[];
}

/** The clients a member may open, by role. */
export const clientsOf: readonly { app: ClientApp['app']; href: string; label: string; roles: readonly Role[] }[] = [
  { app: 'buyer', href: '/', label: 'Buying', roles: ['buyer'] },
  { app: 'seller', href: '/sell/', label: 'Selling', roles: ['seller'] },
  { app: 'desk', href: '/desk/', label: 'Desk', roles: ['operator', 'assayer'] },
];
