import { hasRole, useMember } from '@lydite/client';
import { AssayerPage } from './AssayerPage.tsx';
import { DealsPage } from './DealsPage.tsx';

/** The queue of deals for operators; assayers see their requests. */
export function Component() {
  return hasRole(useMember(), 'operator') ? <DealsPage /> : <AssayerPage />;
}
