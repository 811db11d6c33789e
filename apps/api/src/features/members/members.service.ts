import type { RegisterRequest, SessionView, SignInRequest } from '@lydite/contracts';
import type { Actor } from '../../platform/actor.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { askForReset, changePassword, completeReset } from './change-password.ts';
import { Member } from './member.entity.ts';
import { sessionView, visitorSession } from './members.reads.ts';
import { changeProfile, endSession, ownSessions, type ProfileChange } from './own-profile.ts';
import { createPasswords } from './passwords.ts';
import { confirmAddress, register } from './register.ts';
import { checkPassword, signIn } from './sign-in.ts';
import { createSeal } from './totp-secret.ts';
import { beginTotp, confirmTotp, removeTotp, totpView } from './totp.ts';

export function createMembersService(world: Pick<World, 'db' | 'settings' | 'sessions'>) {
  const { db, sessions } = world;
  const pepper = world.settings.PASSWORD_PEPPER;
  const parts = { ...world, passwords: createPasswords({ pepper }), seal: createSeal(pepper) };

  return {
    register: (request: RegisterRequest) => register(parts, request),
    confirm: (token: string) => confirmAddress(parts, token),
    signIn: (request: SignInRequest & { ip: string; device: string }) => signIn(parts, request),
    renew: (refresh: string | undefined) => (refresh ? sessions.renew(refresh) : Promise.resolve(null)),
    signOut: (actor: Actor) => inTransaction(db, (tx) => sessions.end(tx, actor.sessionId, 'signed out')),
    session: (who: { memberId: string; sessionId: string } | null): Promise<SessionView> =>
      who ? sessionView(db.manager, who) : Promise.resolve(visitorSession),

    /** The password again: money may move for ten minutes. */
    async freshen(actor: Actor, password: string): Promise<SessionView> {
      const { email } = await db.manager.findOneByOrFail(Member, { id: actor.id });
      await checkPassword(parts, { email, password, ip: actor.ip });
      await sessions.freshen(actor.sessionId);
      return sessionView(db.manager, { memberId: actor.id, sessionId: actor.sessionId });
    },

    askForReset: (email: string) => askForReset(parts, email),
    completeReset: (request: { token: string; password: string }) => completeReset(parts, request),
    changePassword: (actor: Actor, request: { currentPassword: string; newPassword: string }) =>
      changePassword(parts, actor, request),
    changeProfile: (actor: Actor, change: ProfileChange) => changeProfile(world, actor, change),
    totp: (actor: Actor) => totpView(db.manager, actor),
    beginTotp: (actor: Actor) => beginTotp(parts, actor),
    confirmTotp: async (actor: Actor, code: string) => ({ recoveryCodes: await confirmTotp(parts, actor, code) }),
    removeTotp: (actor: Actor, code: string) => removeTotp(parts, actor, code),
    sessions: (actor: Actor) => ownSessions(db.manager, actor),
    endSession: (actor: Actor, sessionId: string) => endSession(world, actor, sessionId),
  };
}
export type MembersService = ReturnType<typeof createMembersService>;
