import { randomUUID } from 'node:crypto';
import { signInByCall, type Call } from './calls.ts';
import { linkOf, mailTo } from './mails.ts';

export interface EnrolOptions {
  roles: ('seller' | 'buyer')[];
  name?: string;
  place?: string;
}

/** Twelve characters and more, as the market wants it. */
export const testPassword = 'copper nickel gold';

/** An address nobody else in this run has. */
export const freshEmail = (word: string): string => `${word}-${randomUUID().slice(0, 8)}@wendlesea.example`;

/** Registers and confirms a member by calls, and signs the caller in. */
export async function enrol(call: Call, { roles, name = 'Ossenmere Bench', place = 'Ossenmere' }: EnrolOptions) {
  const email = freshEmail(roles.join('-'));
  await call('POST /members', { body: { email, password: testPassword, name, place, roles } });
  const token = new URL(linkOf(await mailTo(email, 'Confirm your e-mail address'))).searchParams.get('token');
  await call('POST /members/confirm', { body: { token } });
  await signInByCall(call, { email, password: testPassword });
  return { email, password: testPassword, name };
}
