import { expect } from '@playwright/test';
import { addresses } from './stack.ts';

export interface Mail {
  subject: string;
  text: string;
  /** Every address in the mail, in order. */
  links: string[];
}

/** All mails to an address, newest first. */
export async function mailsTo(email: string): Promise<Mail[]> {
  const answer = await fetch(`${addresses.mail}/api/mails?to=${encodeURIComponent(email)}`);
  return (await answer.json()) as Mail[];
}

/** Waits until a mail with such a subject has come to the address. */
export async function mailTo(email: string, subject: RegExp | string, { timeoutMs = 30_000 } = {}): Promise<Mail> {
  const isWanted = (mail: Mail) =>
    typeof subject === 'string' ? mail.subject.includes(subject) : subject.test(mail.subject);
  const found = async () => (await mailsTo(email)).find(isWanted);
  await expect.poll(found, { message: `mail to ${email}: ${subject}`, timeout: timeoutMs }).toBeTruthy();
  return (await found())!;
}

/** The link of a mail into the market. */
export function linkOf(mail: Mail): string {
  const link = mail.links.find((one) => one.startsWith(addresses.web));
  if (!link) throw new Error(`The mail "${mail.subject}" has no link into the market.`);
  return link;
}
