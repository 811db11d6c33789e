import { useEffect } from 'react';

/** Calls back when the reader returns from another site and the browser shows this page just as it was left, buttons busy. */
export function usePageReturn(onReturn: () => void): void {
  useEffect(() => {
    const onShow = (event: PageTransitionEvent) => event.persisted && onReturn();
    window.addEventListener('pageshow', onShow);
    return () => window.removeEventListener('pageshow', onShow);
  }, [onReturn]);
}
