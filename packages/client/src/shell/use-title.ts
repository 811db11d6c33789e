import { useEffect } from 'react';

/** Names the page in the window's title; `invalid` puts "Error:" in front, as the error summary does. */
export function useTitle(title: string, { invalid = false } = {}): void {
  useEffect(() => {
    document.title = `${invalid ? 'Error: ' : ''}${title} · Lydite`;
  }, [title, invalid]);
}
