import type { SignInRequest } from '@lydite/contracts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { rolesOf, type Tokens } from '../../platform/session.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { orderLink } from './mail-tokens.ts';
import { Member } from './member.entity.ts';
import type { Passwords } from './passwords.ts';
import { beginTry, clearFailures, noteFailure } from './throttle.ts';
import { checkSecondStep } from './totp-check.ts';
import type { Seal } from './totp-secret.ts';

type Parts = Pick<World, 'db' | 'settings' | 'sessions'> & { passwords: Passwords };

const wrong = (): AppError => new AppError('session.wrong_credentials', 'The address or the password is not right.');

interface Credentials {
  email: string;
  password: string;
  ip: string;
}

/** The member whose password it is, and the records of this try, which stands as failed until they are cleared. */
async function tryPassword(
  { db, passwords }: Pick<Parts, 'db' | 'passwords'>,
  { email, password, ip }: Credentials,
): Promise<{ member: Member; tries: string[] }> {
  const tries = await beginTry(db, { email, ip });
  const member = await db.manager.findOneBy(Member, { email: email.toLowerCase() });
  if (!(await passwords.verify(member?.passwordHash ?? null, password))) {
    await noteFailure(db, tries);
    await inTransaction(db, (tx) =>
      audit(tx, null, { action: 'session.refused', objectKind: 'member', objectId: member?.id ?? 'unknown' }),
    );
    throw wrong();
  }
  if (passwords.needsRehash(member!.passwordHash))
    await db.manager.update(Member, { id: member!.id }, { passwordHash: await passwords.hash(password) });
  return { member: member!, tries };
}

/** Checks a member's password, slowly for whoever guesses. @throws AppError session.wrong_credentials, request.too_many */
export async function checkPassword(parts: Pick<Parts, 'db' | 'passwords'>, credentials: Credentials): Promise<Member> {
  const { member, tries } = await tryPassword(parts, credentials);
  await clearFailures(parts.db, { email: credentials.email, tries });
  return member;
}

/** Signs in: a new session each time. An unconfirmed address gets its link once more instead. */
export async function signIn(
  parts: Parts & { seal: Seal },
  request: SignInRequest & { ip: string; device: string },
): Promise<Tokens> {
  const { db, sessions, settings } = parts;
  const { member, tries } = await tryPassword(parts, request);
  await checkSecondStep(parts, { memberId: member.id, code: request.code, tries });
  await clearFailures(db, { email: member.email, tries });
  if (member.suspendedAt) throw new AppError('member.suspended', 'This account is suspended. Write to the desk.');
  if (!member.emailConfirmedAt) {
    await inTransaction(db, (tx) => orderLink(tx, settings, { memberId: member.id, purpose: 'confirm' }));
    throw new AppError(
      'session.email_unconfirmed',
      'Confirm your e-mail address first: we have sent you the link again.',
    );
  }
  return inTransaction(db, async (tx) => {
    const roles = await rolesOf(tx, member.id);
    const tokens = await sessions.begin(tx, { memberId: member.id, roles, device: request.device, ip: request.ip });
    await audit(tx, null, { action: 'session.begin', objectKind: 'member', objectId: member.id });
    return tokens;
  });
}
