import type { Role } from '@lydite/contracts';

/** Who makes a call, as the access token says. */
export interface Actor {
  id: string;
  sessionId: string;
  roles: readonly Role[];
  /** Roles granted, but asleep until the member sets up a second step at sign-in. */
  withheldRoles: readonly Role[];
  ip: string;
  requestId: string;
}
