import { createHash, randomUUID } from 'node:crypto';
import type { RegisterRequest } from '@lydite/contracts';
import { AppError } from '../../platform/app-error.ts';
import { audit } from '../../platform/audit.ts';
import { marketNow } from '../../platform/clock.ts';
import { addToOutbox, type OutboxHandler } from '../../platform/outbox.ts';
import { inTransaction, sqlState } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { orderLink, spendToken } from './mail-tokens.ts';
import { Member } from './member.entity.ts';
import { weaknessOf, type Passwords } from './passwords.ts';

type Parts = Pick<World, 'db' | 'settings'> & { passwords: Passwords };

/** @throws AppError member.password_weak */
export function assertStrong(password: string, context: { email: string; name: string }, path = 'password'): void {
  const message = weaknessOf(password, context);
  if (message) throw new AppError('member.password_weak', message, { fields: [{ path, message }] });
}

/** Registers a member and mails the link that confirms the address. Whether the address was known shows only in its own mailbox. */
export async function register({ db, settings, passwords }: Parts, request: RegisterRequest): Promise<void> {
  const email = request.email.toLowerCase();
  assertStrong(request.password, request);
  const passwordHash = await passwords.hash(request.password);
  const id = randomUUID();
  try {
    await inTransaction(db, async (tx) => {
      await tx.insert(Member, { id, email, passwordHash, name: request.name, place: request.place });
      for (const role of new Set(request.roles))
        await tx.query('insert into member_roles (member_id, role) values ($1, $2)', [id, role]);
      await orderLink(tx, settings, { memberId: id, purpose: 'confirm' });
      await audit(tx, null, { action: 'member.register', objectKind: 'member', objectId: id });
    });
  } catch (error) {
    if (sqlState(error) !== '23505') throw error;
    await inTransaction(db, async (tx) => {
      // Once an hour at most: nobody's mailbox is filled from here.
      const hour = (await marketNow(tx)).toISOString().slice(0, 13);
      const address = createHash('sha256').update(email).digest('base64url');
      await addToOutbox(tx, {
        kind: 'known-address.mail',
        key: `known-address:${address}:${hour}`,
        payload: { email },
      });
    });
  }
}

/** Tells the owner of an address that somebody registered it again. */
export const mailKnownAddress =
  ({ mail, settings }: Pick<World, 'mail' | 'settings'>): OutboxHandler =>
  ({ key, payload }) =>
    mail.send({
      to: String(payload.email),
      subject: 'You already have an account',
      text: `Somebody, perhaps you, tried to register this address again. You can sign in, or set a new password:\n\n${settings.PUBLIC_URL}/forgot\n`,
      key,
    });

/** @throws AppError member.token_spent */
export const confirmAddress = ({ db }: Pick<Parts, 'db'>, token: string): Promise<void> =>
  inTransaction(db, async (tx) => {
    const memberId = await spendToken(tx, { token, purpose: 'confirm' });
    if (!memberId)
      throw new AppError('member.token_spent', 'This link was used before or is too old. Sign in to get a new one.');
    await tx.query('update members set email_confirmed_at = coalesce(email_confirmed_at, market_now()) where id = $1', [
      memberId,
    ]);
    await audit(tx, null, { action: 'member.confirm', objectKind: 'member', objectId: memberId });
  });
