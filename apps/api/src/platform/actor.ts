import type { Role } from '@lydite/contracts';

/** Who makes a call, as the access token says. */
export interface Actor {
  id: string;
  sessionId: string;
  roles: readonly Role[];
  ip: string;
  requestId: string;
}
