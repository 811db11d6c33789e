import { createTransport } from 'nodemailer';
import type { Settings } from '../settings.ts';

export interface Mail {
  to: string;
  subject: string;
  text: string;
  /** Decides the Message-ID: a mail sent again after a lost answer is recognised as the same. */
  key: string;
}

export interface Mailer {
  /** @throws when the mail server does not take the mail. */
  send(mail: Mail): Promise<void>;
  close(): void;
}

/** nodemailer encodes header values itself; a line break in a subject cannot add a header. */
export function createMailer({
  SMTP_URL,
  MAIL_FROM,
  PUBLIC_URL,
}: Pick<Settings, 'SMTP_URL' | 'MAIL_FROM' | 'PUBLIC_URL'>): Mailer {
  const transport = createTransport({
    url: SMTP_URL,
    pool: true,
    maxConnections: 2,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  const host = new URL(PUBLIC_URL).hostname;
  return {
    async send({ to, subject, text, key }) {
      await transport.sendMail({
        from: MAIL_FROM,
        to,
        subject,
        text,
        messageId: `<${encodeURIComponent(key)}@${host}>`,
      });
    },
    close: () => transport.close(),
  };
}
