import { createHash, randomBytes, randomUUID } from 'node:crypto';
import type { Role } from '@lydite/contracts';
import jwt from 'jsonwebtoken';
import type { DataSource, EntityManager } from 'typeorm';
import { z } from 'zod';
import type { Settings } from '../settings.ts';
import { AppError } from './app-error.ts';
import type { SessionGate } from './routes.ts';
import { cookieNames } from './session-cookies.ts';
import { sessionLimits } from './session-limits.ts';
import { inTransaction } from './transaction.ts';

const token = { issuer: 'lydite', audience: 'lydite-market', algorithm: 'HS256' } as const;
const claims = z.object({
  sub: z.uuid(),
  sid: z.uuid(),
  typ: z.literal('access'),
  roles: z.array(z.enum(['seller', 'buyer', 'assayer', 'operator'])),
});

export interface Tokens {
  access: string;
  refresh: string;
  sessionId: string;
  memberId: string;
}

const hashOf = (secret: string): string => createHash('sha256').update(secret).digest('base64url');
const kindOf = (roles: readonly Role[]): 'operator' | 'others' => (roles.includes('operator') ? 'operator' : 'others');

/** With these come the desk and other members' affairs. */
const guardedRoles: readonly Role[] = ['operator', 'assayer'];

interface Options {
  db: DataSource;
  settings: Pick<Settings, 'JWT_SECRETS' | 'TOTP_REQUIRED'>;
}

export function createSessions({ db, settings }: Options) {
  const sign = (memberId: string, sessionId: string, roles: readonly Role[]): string =>
    jwt.sign({ sid: sessionId, typ: 'access', roles }, settings.JWT_SECRETS[0]!, {
      subject: memberId,
      issuer: token.issuer,
      audience: token.audience,
      algorithm: token.algorithm,
      expiresIn: sessionLimits.access,
    });

  function verify(text: string): z.infer<typeof claims> | null {
    for (const secret of settings.JWT_SECRETS) {
      try {
        const { issuer, audience } = token;
        return claims.parse(jwt.verify(text, secret, { issuer, audience, algorithms: [token.algorithm] }));
      } catch {
        // signed by another key, expired or forged: try the next, then treat the caller as a visitor
      }
    }
    return null;
  }

  async function issue(
    tx: EntityManager,
    sessionId: string,
    memberId: string,
    roles: readonly Role[],
    parent: string | null,
  ): Promise<Tokens> {
    const refresh = randomBytes(32).toString('base64url');
    await tx.query('insert into refresh_tokens (hash, session_id, parent_hash) values ($1, $2, $3)', [
      hashOf(refresh),
      sessionId,
      parent,
    ]);
    return { access: sign(memberId, sessionId, roles), refresh, sessionId, memberId };
  }

  /** Asked of the row at each call, so that a second step set up or removed counts at once. */
  async function withheldOf(memberId: string, roles: readonly Role[]): Promise<readonly Role[]> {
    const guarded = roles.filter((role) => guardedRoles.includes(role));
    if (!settings.TOTP_REQUIRED || guarded.length === 0) return [];
    return (await hasSecondStep(db.manager, memberId)) ? [] : guarded;
  }

  const gate: SessionGate = {
    async actorOf(req) {
      const text: unknown = req.cookies?.[cookieNames.access];
      const claim = typeof text === 'string' ? verify(text) : null;
      if (!claim) return null;
      const withheldRoles = await withheldOf(claim.sub, claim.roles);
      return {
        id: claim.sub,
        sessionId: claim.sid,
        roles: claim.roles.filter((role) => !withheldRoles.includes(role)),
        withheldRoles,
        ip: req.ip ?? '',
        requestId: String(req.id),
      };
    },
    async assertLive(actor, { fresh }) {
      const rows: { fresh: boolean }[] = await db.query(
        `select s.fresh_until > market_now() as fresh from sessions s join members m on m.id = s.member_id
          where s.id = $1 and s.member_id = $2 and s.revoked_at is null and m.suspended_at is null
            and s.idle_until > market_now() and s.abs_until > market_now()`,
        [actor.sessionId, actor.id],
      );
      if (!rows[0])
        throw new AppError('session.expired', 'This session has ended. Sign in again; what you entered is kept.');
      if (fresh && !rows[0].fresh) throw new AppError('session.stale', 'Enter your password again before money moves.');
    },
  };

  return {
    ...gate,

    /** Begins a session for a member whose password was just checked. */
    async begin(
      tx: EntityManager,
      { memberId, roles, device, ip }: { memberId: string; roles: readonly Role[]; device: string; ip: string },
    ): Promise<Tokens> {
      const id = randomUUID();
      const kind = kindOf(roles);
      await tx.query(
        `insert into sessions (id, member_id, device, ip, idle_until, abs_until, fresh_until)
         select $1, $2, $3, $4, now + make_interval(secs => $5), now + make_interval(secs => $6), now + make_interval(secs => $7) from market_now() as now`,
        [
          id,
          memberId,
          device.slice(0, 200),
          ip,
          sessionLimits.idle[kind],
          sessionLimits.absolute[kind],
          sessionLimits.fresh,
        ],
      );
      return issue(tx, id, memberId, roles, null);
    },

    /**
     * Exchanges a refresh token for its successor. The predecessor stays good until a successor is used, so that a lost
     * answer or three open tabs sign nobody out; reuse after that ends the session, for it means a stolen token.
     */
    renew: (refresh: string): Promise<Tokens | null> =>
      inTransaction(db, async (tx) => {
        const hash = hashOf(refresh);
        const rows: { session_id: string; member_id: string; parent_hash: string | null; spent: boolean }[] =
          await tx.query(
            `select t.session_id, s.member_id, t.parent_hash, t.spent_at is not null as spent
             from refresh_tokens t join sessions s on s.id = t.session_id join members m on m.id = s.member_id
            where t.hash = $1 and s.revoked_at is null and m.suspended_at is null and s.idle_until > market_now() and s.abs_until > market_now()
              for update of s`,
            [hash],
          );
        const found = rows[0];
        if (!found) return null;
        if (found.spent) {
          await tx.query(
            `update sessions set revoked_at = market_now(), revoked_why = 'refresh token reused' where id = $1`,
            [found.session_id],
          );
          return null;
        }
        await tx.query('update refresh_tokens set used_at = coalesce(used_at, market_now()) where hash = $1', [hash]);
        if (found.parent_hash)
          await tx.query('update refresh_tokens set spent_at = coalesce(spent_at, market_now()) where hash = $1', [
            found.parent_hash,
          ]);
        const roles = await rolesOf(tx, found.member_id);
        await tx.query(
          `update sessions set last_seen_at = market_now(), idle_until = least(abs_until, market_now() + make_interval(secs => $2)) where id = $1`,
          [found.session_id, sessionLimits.idle[kindOf(roles)]],
        );
        return issue(tx, found.session_id, found.member_id, roles, hash);
      }),

    /** The password was entered again: money may move for the next ten minutes. */
    async freshen(sessionId: string): Promise<void> {
      await db.query(`update sessions set fresh_until = market_now() + make_interval(secs => $2) where id = $1`, [
        sessionId,
        sessionLimits.fresh,
      ]);
    },

    async end(tx: EntityManager, sessionId: string, why: string): Promise<void> {
      await tx.query(
        `update sessions set revoked_at = market_now(), revoked_why = $2 where id = $1 and revoked_at is null`,
        [sessionId, why],
      );
    },

    async endAll(
      tx: EntityManager,
      memberId: string,
      { except, why }: { except?: string; why: string },
    ): Promise<void> {
      await tx.query(
        `update sessions set revoked_at = market_now(), revoked_why = $3 where member_id = $1 and id is distinct from $2 and revoked_at is null`,
        [memberId, except ?? null, why],
      );
    },
  };
}
export type Sessions = ReturnType<typeof createSessions>;

/** Roles as they stand in the database now. */
export async function rolesOf(tx: EntityManager, memberId: string): Promise<Role[]> {
  const rows: { role: Role }[] = await tx.query('select role from member_roles where member_id = $1 order by role', [
    memberId,
  ]);
  return rows.map((row) => row.role);
}

/** Whether the member has confirmed a second step at sign-in. */
export async function hasSecondStep(tx: EntityManager, memberId: string): Promise<boolean> {
  const rows: unknown[] = await tx.query(
    'select 1 from member_totp where member_id = $1 and confirmed_at is not null',
    [memberId],
  );
  return rows.length > 0;
}
