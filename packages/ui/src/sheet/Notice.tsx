import type { ReactNode } from 'react';

interface NoticeProps {
  tone?: 'plain' | 'warn' | 'danger' | 'ok';
  title?: ReactNode;
  children?: ReactNode;
  /** Buttons that answer it: "Use 3.3 kg", "33 kg is right". */
  actions?: ReactNode;
  /** Speaks up when it appears while the page is open. */
  live?: boolean;
}

/** A strip that asks for attention; a check in it can always be overridden. */
export function Notice({ tone = 'plain', title, children, actions, live = false }: NoticeProps) {
  const role = live ? (tone === 'danger' ? 'alert' : 'status') : undefined;
  return (
    <div className={`notice notice-${tone}`} role={role}>
      {title && <b>{title}</b>}
      {title && children ? ' ' : null}
      {children}
      {actions && <div className="notice-actions">{actions}</div>}
    </div>
  );
}

/** The page's one polite voice, at its foot: what was sent, saved or changed. Empty, it takes no room. */
export function StatusStrip({ children }: { children?: ReactNode }) {
  return (
    <div className="status-strip" role="status">
      {children}
    </div>
  );
}

interface EmptyStateProps {
  title: string;
  children?: ReactNode;
  /** The one next step. */
  action?: ReactNode;
}

/** What will be here, and the one thing to do next. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="empty">
      <h2>{title}</h2>
      {children && <p>{children}</p>}
      {action && <div className="actions">{action}</div>}
    </div>
  );
}

/** Keeps the room of what is loading, and shows itself only when that takes longer than 300 ms. */
export function Skeleton({ height, label = 'Loading' }: { height: number; label?: string }) {
  return (
    <div role="status" aria-label={label}>
      <div className="skeleton" style={{ height }} />
    </div>
  );
}
