import type { Actor } from '../../platform/actor.ts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { hasSecondStep } from '../../platform/session.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { goodLinks, orderLink, spendOthers, spendToken } from './mail-tokens.ts';
import { Member } from './member.entity.ts';
import type { Passwords } from './passwords.ts';
import { assertStrong } from './register.ts';
import { checkPassword } from './sign-in.ts';
import { clearFailures } from './throttle.ts';

type Parts = Pick<World, 'db' | 'settings' | 'sessions'> & { passwords: Passwords };

/** More would only fill a mailbox, perhaps a stranger's. */
const mostGoodLinks = 5;

/** Mails a reset link if the address is known and has not a few good ones already; the answer is the same if not. */
export async function askForReset({ db, settings }: Parts, email: string): Promise<void> {
  await inTransaction(db, async (tx) => {
    const member = await tx.findOneBy(Member, { email: email.toLowerCase() });
    if (member && (await goodLinks(tx, { memberId: member.id, purpose: 'reset' })) < mostGoodLinks)
      await orderLink(tx, settings, { memberId: member.id, purpose: 'reset' });
  });
}

/** Sets a new password by a reset link; every session ends. @throws AppError member.token_spent, member.password_weak */
export async function completeReset(
  { db, passwords, sessions }: Parts,
  { token, password }: { token: string; password: string },
): Promise<void> {
  const passwordHash = await passwords.hash(password);
  const member = await inTransaction(db, async (tx) => {
    const memberId = await spendToken(tx, { token, purpose: 'reset' });
    if (!memberId)
      throw new AppError('member.token_spent', 'This link was used before or is too old. Ask for a new one.');
    const found = await tx.findOneByOrFail(Member, { id: memberId });
    assertStrong(password, found);
    // Whoever opened the link reads the address's mail: that confirms it too.
    await tx.query(
      'update members set password_hash = $2, email_confirmed_at = coalesce(email_confirmed_at, market_now()) where id = $1',
      [memberId, passwordHash],
    );
    await spendOthers(tx, { memberId, purpose: 'reset' });
    await sessions.endAll(tx, memberId, { why: 'password reset' });
    await audit(tx, null, { action: 'member.password_reset', objectKind: 'member', objectId: memberId });
    return found;
  });
  // A link by mail must not reset the brake on guessing codes of a second step.
  if (!(await hasSecondStep(db.manager, member.id))) await clearFailures(db, { email: member.email });
}

/** Changes the own password; it needs the old one and ends every other session. */
export async function changePassword(
  parts: Parts,
  actor: Actor,
  { currentPassword, newPassword }: { currentPassword: string; newPassword: string },
): Promise<void> {
  const { db, passwords, sessions } = parts;
  const member = await db.manager.findOneByOrFail(Member, { id: actor.id });
  await checkPassword(parts, { email: member.email, password: currentPassword, ip: actor.ip });
  assertStrong(newPassword, member, 'newPassword');
  const passwordHash = await passwords.hash(newPassword);
  await inTransaction(db, async (tx) => {
    await tx.update(Member, { id: actor.id }, { passwordHash });
    await sessions.endAll(tx, actor.id, { except: actor.sessionId, why: 'password changed' });
    await audit(tx, actor, { action: 'member.password_change', objectKind: 'member', objectId: actor.id });
  });
}
