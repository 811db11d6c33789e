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

const close = (box: HTMLDetailsElement | null): void => box?.removeAttribute('open');

/** Notices, and under the member's name: the other clients, the account, and the way out. */
export function MemberMenu({ member, unread, others }: MemberMenuProps) {
  const box = useRef<HTMLDetailsElement>(null);
  const { pathname } = useLocation();
  const signOut = useSignOut();
  const navigate = useNavigate();
  useEffect(() => close(box.current), [pathname]);
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => event.key === 'Escape' && close(box.current);
    const onPress = (event: PointerEvent) => {
      if (!box.current?.contains(event.target as Node)) close(box.current);
    };
    document.addEventListener('keydown', onKey);
    document.addEventListener('pointerdown', onPress);
    return () => {
      document.removeEventListener('keydown', onKey);
      document.removeEventListener('pointerdown', onPress);
    };
  }, []);
  return (
    <>
      <Link to="/notices">{unread > 0 ? `Notices (${unread})` : 'Notices'}</Link>
      <details className="menu" ref={box}>
        <summary>
          <span className="wide-only">{member.name}</span>
          <span className="phone-only">Menu</span>
        </summary>
        <ul className="menu-list">
          <li className="phone-only small mute px-4 py-3">{member.name}</li>
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
