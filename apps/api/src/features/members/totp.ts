import type { TotpSetup, TotpView } from '@lydite/contracts';
import { randomBytes } from 'node:crypto';
import QRCode from 'qrcode';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../../platform/actor.ts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { hasSecondStep } from '../../platform/session.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { Member } from './member.entity.ts';
import { beginTry, clearFailures } from './throttle.ts';
import { checkSecondStep } from './totp-check.ts';
import { issueRecoveryCodes, totpOf, spendAppCode } from './totp-codes.ts';
import type { Seal } from './totp-secret.ts';

type Parts = Pick<World, 'db' | 'sessions'> & { seal: Seal };

/** RFC 4226 recommends as many as the hash has. */
const secretBytes = 20;

export async function totpView(tx: EntityManager, actor: Actor): Promise<TotpView> {
  const rows: { n: number }[] = await tx.query(
    'select count(*)::int as n from recovery_codes where member_id = $1 and used_at is null',
    [actor.id],
  );
  return { isOn: await hasSecondStep(tx, actor.id), recoveryCodesLeft: rows[0]!.n };
}

/** Makes a secret that counts once a code made with it has come back. @throws AppError member.totp_state */
export async function beginTotp({ db, seal }: Parts, actor: Actor): Promise<TotpSetup> {
  const secret = randomBytes(secretBytes);
  const { email } = await db.manager.findOneByOrFail(Member, { id: actor.id });
  const rows: unknown[] = await db.query(
    `insert into member_totp (member_id, secret) values ($1, $2) on conflict (member_id)
     do update set secret = excluded.secret, begun_at = market_now(), last_step = null where member_totp.confirmed_at is null returning 1`,
    [actor.id, seal.close(actor.id, secret)],
  );
  if (rows.length === 0)
    throw new AppError('member.totp_state', 'A second step is set up already. Remove it before you set up another.');
  const totp = totpOf(secret, email);
  const uri = totp.toString();
  return { secret: totp.secret.base32, uri, qrSvg: await QRCode.toString(uri, { type: 'svg', margin: 2 }) };
}

/** Turns the second step on; every other session ends. @throws AppError member.totp_state, session.code_wrong */
export const confirmTotp = ({ db, seal, sessions }: Parts, actor: Actor, code: string): Promise<string[]> =>
  inTransaction(db, async (tx) => {
    const rows: unknown[] = await tx.query(
      'select 1 from member_totp where member_id = $1 and confirmed_at is null for update',
      [actor.id],
    );
    if (rows.length === 0) throw new AppError('member.totp_state', 'There is nothing to confirm. Begin again.');
    if (!(await spendAppCode(tx, seal, { memberId: actor.id, code }))) {
      const message = 'This is not the code the app shows now. Check the device’s clock and enter the next one.';
      throw new AppError('session.code_wrong', message, { fields: [{ path: 'code', message }] });
    }
    await tx.query('update member_totp set confirmed_at = market_now() where member_id = $1', [actor.id]);
    await sessions.endAll(tx, actor.id, { except: actor.sessionId, why: 'second step set up' });
    await audit(tx, actor, { action: 'member.totp_on', objectKind: 'member', objectId: actor.id });
    return issueRecoveryCodes(tx, actor.id);
  });

/** Turns the second step off, by a code of it. @throws AppError member.totp_state, session.code_wrong, request.too_many */
export async function removeTotp(parts: Parts, actor: Actor, code: string): Promise<void> {
  const { db, sessions } = parts;
  if (!(await hasSecondStep(db.manager, actor.id)))
    throw new AppError('member.totp_state', 'No second step is set up.');
  const { email } = await db.manager.findOneByOrFail(Member, { id: actor.id });
  const tries = await beginTry(db, { email, ip: actor.ip });
  await checkSecondStep(parts, { memberId: actor.id, code, tries });
  await clearFailures(db, { email, tries });
  await inTransaction(db, async (tx) => {
    await tx.query('delete from member_totp where member_id = $1', [actor.id]);
    await tx.query('delete from recovery_codes where member_id = $1', [actor.id]);
    await sessions.endAll(tx, actor.id, { except: actor.sessionId, why: 'second step removed' });
    await audit(tx, actor, { action: 'member.totp_off', objectKind: 'member', objectId: actor.id });
  });
}
