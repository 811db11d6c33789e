import { AppBar } from '@lydite/ui';
import { usePrefetchQuery, useQuery } from '@tanstack/react-query';
import { Suspense, useEffect, useRef, useState } from 'react';
import { Link, NavLink, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { marketQuery } from '../market/market.queries.ts';
import { hasRole, sessionQuery } from '../session/session.queries.ts';
import { onAnnouncement } from './announce.ts';
import { clientsOf, type ClientApp } from './client-app.ts';
import { MemberMenu } from './MemberMenu.tsx';
import { PasswordDialog } from './PasswordDialog.tsx';

/** The frame of every page: bar, content, the one status node, the password dialog. */
export function Shell({ app, roleWord, nav }: Pick<ClientApp, 'app' | 'roleWord' | 'nav'>) {
  usePrefetchQuery(marketQuery);
  const { data: session } = useQuery(sessionQuery);
  const member = session?.member ?? null;
  const signedIn = member && nav.length > 0;
  useFocusOnNavigation();
  useSectionInView(member !== null);
  return (
    <>
      <AppBar
        app={app}
        role={roleWord}
        home={(mark) => (
          <Link to="/" className="mark">
            {mark}
          </Link>
        )}
        nav={
          signedIn || app === 'buyer'
            ? nav
                .filter(({ to, role }) => (member ? !role || hasRole(member, role) : to === '/'))
                .map(({ to, label, end }) => (
                  <NavLink key={label} to={to} end={end ?? false}>
                    {label}
                  </NavLink>
                ))
            : undefined
        }
        end={
          member ? (
            <MemberMenu
              member={member}
              unread={session?.unreadNotices ?? 0}
              others={clientsOf.filter(
                (one) => one.app !== app && one.roles.some((role) => member.roles.includes(role)),
              )}
            />
          ) : (
            session && <VisitorLinks />
          )
        }
      />
      <Suspense>
        <Outlet />
      </Suspense>
      <Status />
      <PasswordDialog />
      <ScrollRestoration />
    </>
  );
}

function VisitorLinks() {
  const { pathname, search } = useLocation();
  const next =
    pathname.startsWith('/sign-in') || pathname.startsWith('/register')
      ? ''
      : `?next=${encodeURIComponent(pathname + search)}`;
  return (
    <>
      <Link to={`/sign-in${next}`}>Sign in</Link>
      <Link to="/register">Register</Link>
    </>
  );
}

function Status() {
  const [text, setText] = useState('');
  useEffect(() => onAnnouncement(setText), []);
  return (
    <div role="status" className="sr-only">
      {text}
    </div>
  );
}

/** After a change of page the title gets the focus, so that a keyboard goes on from there and a reader hears where it is. */
function useFocusOnNavigation(): void {
  const { pathname } = useLocation();
  const last = useRef(pathname);
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    const title = document.querySelector<HTMLElement>('main h1');
    title?.setAttribute('tabindex', '-1');
    title?.focus({ preventScroll: true });
  }, [pathname]);
}

/** Space of the bar beside its last section, px. */
const EDGE_PX = 16;

/** On phones the sections scroll sideways: the one the reader is in must not lie outside. */
function useSectionInView(isSignedIn: boolean): void {
  const { pathname } = useLocation();
  useEffect(() => {
    const nav = document.querySelector<HTMLElement>('.bar-nav');
    const current = nav?.querySelector<HTMLElement>('[aria-current]');
    // Only sideways: the page may just have been put back to where the reader left it.
    if (nav && current)
      nav.scrollLeft = current.offsetLeft + current.offsetWidth + EDGE_PX - nav.offsetLeft - nav.clientWidth;
  }, [pathname, isSignedIn]);
}
