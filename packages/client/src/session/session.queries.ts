import type { OwnMember, Role, SessionView, SignInRequest } from '@lydite/contracts';
import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { call } from '../call/call.ts';
import { noteSignedIn, noteSignedOut, renewSession, wasSignedIn } from '../call/renew.ts';

export const sessionKey = ['session'] as const;

async function readSession(): Promise<SessionView> {
  const session = await call('GET /session');
  if (session.member || !wasSignedIn()) return session;
  return (await renewSession()) ? call('GET /session') : session;
}

export const sessionQuery = queryOptions({ queryKey: sessionKey, queryFn: readSession, staleTime: 60_000 });

/** The member who is signed in; null for a visitor, undefined while that is not known yet. */
export const useMember = (): OwnMember | null | undefined => useQuery(sessionQuery).data?.member;

export const hasRole = (member: OwnMember | null | undefined, role: Role): boolean =>
  member?.roles.includes(role) ?? false;

/** Signs in. What was cached for a visitor is asked for again. */
export function useSignIn() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (body: SignInRequest) => call('POST /session', { body }),
    onSuccess: (session) => {
      noteSignedIn();
      cache.setQueryData(sessionKey, session);
      return cache.invalidateQueries({ predicate: (query) => query.queryKey[0] !== 'session' });
    },
  });
}

/** Signs out here, and leaves nothing of the member in this browser. */
export function useSignOut() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: () => call('DELETE /session'),
    onSuccess: () => {
      noteSignedOut();
      cache.clear();
    },
  });
}
