import type { AddressInfo } from 'node:net';
import express from 'express';
import { SMTPServer } from 'smtp-server';
import { listen, type Running } from '../listen.ts';
import { createMailPages } from './mail-pages.ts';
import { openMailbox, type Mailbox } from './mailbox.ts';

export interface MailOptions {
  /** 0 takes a free port. */
  smtpPort: number;
  httpPort: number;
  host?: string | undefined;
  /** Folder the mails are kept in; made when missing. */
  dir: string;
}

/** `port` is that of the pages and the JSON API. */
export interface RunningMail extends Running {
  smtpPort: number;
}

/** Starts the mail catcher: takes every mail by SMTP without a password and shows it. */
export async function startMail({ smtpPort, httpPort, host = '127.0.0.1', dir }: MailOptions): Promise<RunningMail> {
  const mailbox = openMailbox(dir);
  const smtp = createSmtp(mailbox);
  await new Promise<void>((resolve, reject) => {
    smtp.once('error', reject);
    smtp.listen(smtpPort, host, () => resolve());
  });
  smtp.on('error', (error) => process.stderr.write(`Mail: ${error.message}\n`));
  const app = express().disable('x-powered-by').use(createMailPages(mailbox));
  const pages = await listen(app, { port: httpPort, host });
  return {
    port: pages.port,
    smtpPort: (smtp.server.address() as AddressInfo).port,
    async close() {
      await pages.close();
      await new Promise<void>((resolve) => smtp.close(() => resolve()));
    },
  };
}

function createSmtp(mailbox: Mailbox): SMTPServer {
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    disableReverseLookup: true,
    logger: false,
    closeTimeout: 500,
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const to = session.envelope.rcptTo.map(({ address }) => address);
        mailbox.keep(Buffer.concat(chunks), to).then(() => done(), done);
      });
    },
  });
}
