import type { OwnMember } from '@lydite/contracts';
import { useEffect, useRef } from 'react';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import { useSignOut } from '../session/session.queries.ts';

interface MemberMenuProps {
  member: OwnMember;
  unread: number;
  /** The other clients this member may open. */
  others: readonly { href: string; label: string }[];
}

/** Notices, and under the member's name: the other clients, the account, and the way out. */
export function MemberMenu({ member, unread, others }: MemberMenuProps) {
  const box = useRef<HTMLDetailsElement>(null);
  const { pathname } = useLocation();
  const signOut = useSignOut();
  const navigate = useNavigate();
  useEffect(() => {
    box.current?.removeAttribute('open');
  }, [pathname]);
  return (
    <>
      <Link to="/notices">{unread > 0 ? `Notices (${unread})` : 'Notices'}</Link>
      <details
        className="menu"
        ref={box}
        onKeyDown={(event) => event.key === 'Escape' && box.current?.removeAttribute('open')}
      >
        <summary>{member.name}</summary>
        <ul className="menu-list">
          {others.map(({ href, label }) => (
            <li key={href}>
              <a href={href}>{label}</a>
            </li>
          ))}
          <li>
            <Link to="/account">Account</Link>
          </li>
          <li>
            <button
              type="button"
              disabled={signOut.isPending}
              onClick={() => signOut.mutate(undefined, { onSuccess: () => void navigate('/sign-in') })}
            >
              Sign out
            </button>
          </li>
        </ul>
      </details>
    </>
  );
}
