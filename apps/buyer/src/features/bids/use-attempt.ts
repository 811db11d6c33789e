import { isApiError } from '@lydite/client';
import { useRef } from 'react';

/**
 * The id of one press of a binding button. After a lost answer the next press carries the same id, so that the market takes both
 * as one; after a definite answer a new press is a new act.
 */
export function useAttempt() {
  const attempt = useRef<string | null>(null);
  return {
    id: () => (attempt.current ??= crypto.randomUUID()),
    settle: (error?: unknown) => {
      const isUnsure = isApiError(error) && (error.code === 'network' || error.status >= 500);
      if (!isUnsure) attempt.current = null;
    },
  };
}
