const renewAfterMs = 8 * 60_000;
const flag = 'lydite.signed-in';
let renewedAt = 0;
let running: Promise<boolean> | undefined;

/** Whether this browser signed in and has not signed out: only then is there a session to renew. */
export const wasSignedIn = (): boolean => localStorage.getItem(flag) !== null;

export function noteSignedIn(): void {
  localStorage.setItem(flag, '1');
  renewedAt = Date.now();
}

/** Forgets everything this browser kept of the member. */
export function noteSignedOut(): void {
  localStorage.removeItem(flag);
  sessionStorage.clear();
}

/** Renews the session by its refresh cookie; one renewal at a time serves all callers. True when somebody is signed in after it. */
export function renewSession(): Promise<boolean> {
  running ??= exchange().finally(() => (running = undefined));
  return running;
}

async function exchange(): Promise<boolean> {
  if (!wasSignedIn()) return false;
  const response = await fetch('/api/session/refresh', { method: 'POST', headers: { 'x-lydite-client': 'web' } }).catch(
    () => null,
  );
  if (!response?.ok) return false;
  const { member } = (await response.json()) as { member: unknown };
  if (member) renewedAt = Date.now();
  else noteSignedOut();
  return Boolean(member);
}

/** Before a call: a page that has been open for long must not be answered as a visitor. */
export async function renewIfDue(route: string): Promise<void> {
  if (route === 'POST /session' || route === 'POST /session/refresh') return;
  if (wasSignedIn() && Date.now() - renewedAt > renewAfterMs) await renewSession();
}
