import type { ReactNode } from 'react';
import { Mark } from './Mark.tsx';

interface AppBarProps {
  /** Colours the band along the top. */
  app: 'buyer' | 'seller' | 'desk';
  /** The role's name as the reader knows it: "Buyer". */
  role: string;
  /** Wraps the mark in the app's own link home: `(mark) => <Link to="/" className="mark">{mark}</Link>`. */
  home: (mark: ReactNode) => ReactNode;
  /** Links; the current one carries `aria-current="page"`. */
  nav?: ReactNode;
  end?: ReactNode;
}

/** The bar all three apps share. The router stays with the apps: links come in as children. */
export function AppBar({ app, role, home, nav, end }: AppBarProps) {
  return (
    <header className="bar" data-app={app}>
      <a className="skip-link" href="#main">
        Skip to content
      </a>
      <div className="bar-in">
        {home(
          <>
            <Mark />
            <span>Lydite</span>
          </>,
        )}
        <span className="bar-role">{role}</span>
        {nav && (
          <nav className="bar-nav" aria-label="Main">
            {nav}
          </nav>
        )}
        {end && <div className="bar-end">{end}</div>}
      </div>
    </header>
  );
}
