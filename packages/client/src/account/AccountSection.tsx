import { useId, type ReactNode } from 'react';

export function AccountSection({ title, children }: { title: string; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="ruled-head mt-10">
      <h2 id={id}>{title}</h2>
      {children}
    </section>
  );
}
