/** Only a path of this client is followed: `?next=https://elsewhere` goes home. */
export const safeNext = (next: string | null): string => (next && /^\/(?![/\\])/.test(next) ? next : '/');
