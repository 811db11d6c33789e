import { useEffect } from 'react';
import { useLocation } from 'react-router-dom';

/** Brings the field a link named (`…/contents#lines.0.massG`) into view and gives it the focus, once `isReady`. */
export function useHashFocus(isReady = true): void {
  const { hash, key } = useLocation();
  useEffect(() => {
    if (!isReady || !hash) return;
    const field = document.getElementById(decodeURIComponent(hash.slice(1)));
    field?.scrollIntoView({ block: 'center' });
    field?.focus({ preventScroll: true });
  }, [hash, key, isReady]);
}
