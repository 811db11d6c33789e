import { Notice } from '@lydite/ui';

/** What was refused as a whole, above the button that sent it. */
export function Refusal({ children }: { children: string | null | undefined }) {
  if (!children) return null;
  return (
    <Notice tone="danger" live>
      {children}
    </Notice>
  );
}
