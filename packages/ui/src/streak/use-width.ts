import { useCallback, useState } from 'react';

/** Steps of measured width: redrawing for each pixel of a dragged window edge would be waste. */
const STEP_PX = 4;

/**
 * The measured width of an element in px, with a ref to put on it.
 * @param startPx used until the browser has measured, and where it can't
 */
export function useWidth<T extends HTMLElement>(startPx: number): [(element: T | null) => void, number] {
  const [width, setWidth] = useState(startPx);
  const ref = useCallback((element: T | null) => {
    if (!element || typeof ResizeObserver === 'undefined') return;
    const measure = () => {
      const measured = Math.floor(element.clientWidth / STEP_PX) * STEP_PX;
      if (measured > 0) setWidth(measured);
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
