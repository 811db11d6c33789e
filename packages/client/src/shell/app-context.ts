import type { Role } from '@lydite/contracts';
import { createContext, useContext } from 'react';
import { clientsOf, type ClientApp } from './client-app.ts';

interface AppContext {
  app: ClientApp['app'];
  basename: string;
}

const Context = createContext<AppContext>({ app: 'buyer', basename: '/' });

export const AppProvider = Context.Provider;

/** Which of the three clients this is, for pages that all of them have. */
export const useApp = (): AppContext => useContext(Context);

/** Where a member with these roles works, when this client is not one of theirs; null when it is, or when there is none. */
export function otherHome(app: ClientApp['app'], roles: readonly Role[]): string | null {
  const own = clientsOf.filter((one) => one.roles.some((role) => roles.includes(role)));
  return own.some((one) => one.app === app) ? null : (own[0]?.href ?? null);
}
