import type { KeyboardEvent } from 'react';

const moves: Record<string, (at: number, last: number) => number> = {
  ArrowDown: (at, last) => Math.min(at + 1, last),
  ArrowUp: (at) => Math.max(at - 1, 0),
  Home: () => 0,
  End: (_, last) => last,
};

/** Arrow keys, Home and End go from lot to lot; Enter opens one, as any link does. */
export function moveBetweenRows(event: KeyboardEvent<HTMLElement>): void {
  const move = moves[event.key];
  if (!move || event.altKey || event.ctrlKey || event.metaKey) return;
  const links = [...(event.currentTarget.closest('table')?.querySelectorAll<HTMLElement>('[data-lot-link]') ?? [])];
  const at = links.indexOf(event.currentTarget);
  event.preventDefault();
  links[move(at, links.length - 1)]?.focus();
}
