type Listener = (text: string) => void;
const leastGapMs = 10_000;
let listener: Listener | undefined;
let waiting: string | undefined;
let lastAt = 0;
let timer: ReturnType<typeof setTimeout> | undefined;

/**
 * Says something to assistive technology through the page's one status node: at most one message in ten seconds, the
 * newest wins. What the reader did themselves is said at once.
 */
export function announce(text: string, { own = false } = {}): void {
  waiting = text;
  const wait = own ? 0 : Math.max(0, lastAt + leastGapMs - Date.now());
  clearTimeout(timer);
  timer = setTimeout(() => {
    lastAt = Date.now();
    listener?.(waiting ?? '');
  }, wait);
}

export function onAnnouncement(next: Listener): () => void {
  listener = next;
  return () => {
    listener = undefined;
  };
}
