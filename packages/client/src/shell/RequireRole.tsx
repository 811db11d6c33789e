import type { Role } from '@lydite/contracts';
import { Page } from '@lydite/ui';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link, Navigate, Outlet, useLocation } from 'react-router-dom';
import { sessionQuery } from '../session/session.queries.ts';
import { useTitle } from './use-title.ts';

interface RequireRoleProps {
  /** Any of these will do; none: whoever is signed in. */
  roles?: readonly Role[];
  children?: ReactNode;
}

const wordOf: Record<Role, string> = { seller: 'selling', buyer: 'buying', assayer: 'assaying', operator: 'the desk' };

/** Sends visitors to sign in and back; tells members which role a page needs. The API decides all the same. */
export function RequireRole({ roles = [], children = <Outlet /> }: RequireRoleProps) {
  const { data: session, error } = useQuery(sessionQuery);
  const { pathname, search } = useLocation();
  if (!session && error) throw error;
  if (!session) return null;
  const { member } = session;
  if (member === null) return <Navigate to={`/sign-in?next=${encodeURIComponent(pathname + search)}`} replace />;
  if (roles.length > 0 && !roles.some((role) => member.roles.includes(role))) return <RoleMissing roles={roles} />;
  return children;
}

function RoleMissing({ roles }: { roles: readonly Role[] }) {
  useTitle('Another role is needed');
  const own = roles.includes('seller') || roles.includes('buyer');
  return (
    <Page shape="narrow">
      <h1>This page is for {roles.map((role) => wordOf[role]).join(' and ')}</h1>
      <p className="mt-4">
        {own ? (
          <>
            Your account does not have that role yet. You can <Link to="/account">add it in your account</Link>.
          </>
        ) : (
          'This role is granted by two operators.'
        )}
      </p>
    </Page>
  );
}
