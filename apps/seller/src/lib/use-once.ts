import { useRef } from 'react';

/** While one press is under way a second one joins it, so that a double press sends once. */
export function useOnce<Answer>(send: () => Promise<Answer>): () => Promise<Answer> {
  const running = useRef<Promise<Answer> | null>(null);
  return () =>
    (running.current ??= send().finally(() => {
      running.current = null;
    }));
}
