import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useApp } from './app-context.ts';
import { withinClient } from './within-client.ts';

/** A link by its path on the whole market, as mails and notices carry it: within this client, or over to another one. */
export function OriginLink({ to, children }: { to: string; children: ReactNode }) {
  const own = withinClient(to, useApp().basename);
  return own === null ? <a href={to}>{children}</a> : <Link to={own}>{children}</Link>;
}
