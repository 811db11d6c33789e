import type { CookieOptions, Request, Response } from 'express';
import type { Tokens } from './session.ts';
import { sessionLimits } from './session-limits.ts';

export const cookieNames = { access: '__Host-lydite-access', refresh: '__Host-lydite-refresh' } as const;

const cookie: CookieOptions = { httpOnly: true, secure: true, path: '/' };

/** `Lax` lets links to PDFs and pictures work; the refresh token never leaves with a request from elsewhere. */
export function setSessionCookies(res: Response, tokens: Tokens): void {
  res.cookie(cookieNames.access, tokens.access, { ...cookie, sameSite: 'lax', maxAge: sessionLimits.access * 1000 });
  res.cookie(cookieNames.refresh, tokens.refresh, {
    ...cookie,
    sameSite: 'strict',
    maxAge: sessionLimits.absolute.others * 1000,
  });
}

export function clearSessionCookies(res: Response): void {
  res.clearCookie(cookieNames.access, { ...cookie, sameSite: 'lax' });
  res.clearCookie(cookieNames.refresh, { ...cookie, sameSite: 'strict' });
}

export const refreshCookieOf = (req: Request): string | undefined => {
  const value: unknown = req.cookies?.[cookieNames.refresh];
  return typeof value === 'string' ? value : undefined;
};
