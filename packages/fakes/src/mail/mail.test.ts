import { mkdtempSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { once } from 'node:events';
import { afterEach, beforeEach, expect, test } from 'vitest';
import type { Mail } from './mailbox.ts';
import { startMail, type RunningMail } from './server.ts';

const dir = mkdtempSync(join(tmpdir(), 'lydite-mail-'));
let mail: RunningMail;
const start = () => startMail({ smtpPort: 0, httpPort: 0, dir });
beforeEach(async () => void (mail = await start()));
afterEach(() => mail.close());

const address = (path: string) => `http://127.0.0.1:${mail.port}${path}`;
const listed = async (to = '') =>
  (await (await fetch(address(`/api/mails${to && `?to=${encodeURIComponent(to)}`}`))).json()) as Mail[];

/** Speaks SMTP line by line, as any mail client does. */
async function sendMail(to: string, message: string[]): Promise<void> {
  const socket = connect(mail.smtpPort, '127.0.0.1');
  socket.setEncoding('utf8');
  const steps = [
    'EHLO test',
    'MAIL FROM:<notices@lydite.example>',
    `RCPT TO:<${to}>`,
    'DATA',
    [...message, '.'].join('\r\n'),
    'QUIT',
  ];
  for (const line of steps) {
    const [answer] = (await once(socket, 'data')) as [string];
    expect(answer).toMatch(/^[23]/);
    socket.write(`${line}\r\n`);
  }
  await once(socket, 'close');
}

const alternatives = [
  'From: Lydite <notices@lydite.example>',
  'To: Buyer <buyer@vennaby.example>',
  'Subject: =?utf-8?Q?Confirm_your_address_=E2=80=93_one_step?=',
  'MIME-Version: 1.0',
  'Content-Type: multipart/alternative; boundary=b',
  '',
  '--b',
  'Content-Type: text/plain; charset=utf-8',
  '',
  'Open http://localhost:4400/confirm?token=abc&x=1.',
  '<script>alert(1)</script>',
  '--b',
  'Content-Type: text/html; charset=utf-8',
  '',
  '<p>Open <a href="http://localhost:4400/confirm?token=abc&amp;x=1">this</a></p><script>alert(2)</script>',
  '--b--',
];

test('keeps what arrives, finds it by receiver, and shows text, links and HTML safely', async () => {
  await fetch(address('/api/mails'), { method: 'DELETE' });
  await sendMail('buyer@vennaby.example', alternatives);
  await sendMail('seller@sallowby.example', ['Subject: Paid', '', 'Your payout is on its way.']);
  expect((await listed()).map(({ subject }) => subject)).toEqual(['Paid', 'Confirm your address – one step']);
  const [found, ...others] = await listed('BUYER@vennaby.example');
  expect(others).toEqual([]);
  expect(found).toMatchObject({
    to: ['buyer@vennaby.example'],
    from: expect.stringContaining('notices@lydite.example'),
  });
  expect(found?.links).toEqual(['http://localhost:4400/confirm?token=abc&x=1']);

  const page = await (await fetch(address(`/mails/${found?.id}`))).text();
  expect(page).toContain('href="http://localhost:4400/confirm?token=abc&amp;x=1"');
  expect(page).toContain('&lt;script&gt;alert(1)');
  expect(page).not.toContain('<script>');
  const markup = await fetch(address(`/mails/${found?.id}/html`));
  expect(markup.headers.get('content-security-policy')).toMatch(/default-src 'none'.*sandbox/);
  expect(await (await fetch(address('/'))).text()).toMatch(/<a href="mails\/[^"]+">Paid<\/a>/);
});

test('keeps mails over a restart and forgets them when told', async () => {
  await fetch(address('/api/mails'), { method: 'DELETE' });
  await sendMail('buyer@vennaby.example', ['Subject: Outbid', '', 'Somebody bid more.']);
  await mail.close();
  mail = await start();
  expect((await listed()).map(({ subject }) => subject)).toEqual(['Outbid']);
  expect((await fetch(address('/api/mails'), { method: 'DELETE' })).status).toBe(204);
  expect(await listed()).toEqual([]);
  await mail.close();
  mail = await start();
  expect(await listed()).toEqual([]);
});

test('says so when there is no such mail', async () => {
  expect((await fetch(address('/api/mails/none'))).status).toBe(404);
  expect((await fetch(address('/mails/none'))).status).toBe(404);
});
