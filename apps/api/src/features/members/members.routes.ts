import type { Response } from 'express';
import type { Actor } from '../../platform/actor.ts';
import type { On } from '../../platform/routes.ts';
import type { Tokens } from '../../platform/session.ts';
import { clearSessionCookies, refreshCookieOf, setSessionCookies } from '../../platform/session-cookies.ts';
import type { MembersService } from './members.service.ts';

export function memberRoutes(on: On, members: MembersService): void {
  const viewOf = (actor: Actor | null) => members.session(actor && { memberId: actor.id, sessionId: actor.sessionId });
  const begin = (res: Response, tokens: Tokens) => {
    setSessionCookies(res, tokens);
    return members.session(tokens);
  };

  on('POST /members', ({ body }) => members.register(body));
  on('POST /members/confirm', ({ body }) => members.confirm(body.token));
  on('POST /password-resets', ({ body }) => members.askForReset(body.email));
  on('POST /password-resets/complete', ({ body }) => members.completeReset(body));
  on('POST /password', ({ actor, body }) => members.changePassword(actor, body));

  on('GET /session', ({ actor }) => viewOf(actor));
  on('POST /session', async ({ body, ip, req, res }) =>
    begin(res, await members.signIn({ ...body, ip, device: req.get('user-agent') ?? '' })),
  );
  on('POST /session/refresh', async ({ req, res }) => {
    const tokens = await members.renew(refreshCookieOf(req));
    if (tokens) return begin(res, tokens);
    clearSessionCookies(res);
    return members.session(null);
  });
  on('POST /session/password', ({ actor, body }) => members.freshen(actor, body.password));
  on('DELETE /session', async ({ actor, res }) => {
    if (actor) await members.signOut(actor);
    clearSessionCookies(res);
    res.set('Clear-Site-Data', '"cache", "storage"');
  });

  on('PUT /members/me', async ({ actor, body, req, res }) => {
    const member = await members.changeProfile(actor, body);
    // The access token carries the roles: a new one, so that they count at once.
    const tokens = await members.renew(refreshCookieOf(req));
    if (tokens) setSessionCookies(res, tokens);
    return member;
  });
  on('GET /my/totp', ({ actor }) => members.totp(actor));
  on('POST /my/totp', ({ actor }) => members.beginTotp(actor));
  on('POST /my/totp/confirm', ({ actor, body }) => members.confirmTotp(actor, body.code));
  on('POST /my/totp/remove', ({ actor, body }) => members.removeTotp(actor, body.code));
  on('GET /sessions', ({ actor }) => members.sessions(actor));
  on('DELETE /sessions/:sessionId', ({ actor, params }) => members.endSession(actor, params.sessionId));
}
