import { useState } from 'react';

/** Whether prices and bids are asked for again by themselves; the reader may stop that, since what moves is hard to read. */
export function useRefresh() {
  const [paused, setPaused] = useState(false);
  return { paused, toggle: () => setPaused((was) => !was) };
}

/** How often open prices and bids are asked for again. */
export const refreshMs = 15_000;
