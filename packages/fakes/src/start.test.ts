import { spawn, type ChildProcessWithoutNullStreams } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { afterEach, expect, test } from 'vitest';
import { clientFor } from './payments/test-market.ts';

const dir = mkdtempSync(join(tmpdir(), 'lydite-fakes-'));
let child: ChildProcessWithoutNullStreams | undefined;
afterEach(() => void child?.kill('SIGKILL'));

async function start() {
  const ports = { PAYMENTS_PORT: '0', MAIL_SMTP_PORT: '0', MAIL_HTTP_PORT: '0', PRICES_PORT: '0' };
  child = spawn(process.execPath, ['--import', 'tsx', join(import.meta.dirname, 'start.ts')], {
    env: { ...process.env, ...ports, FAKES_DIR: dir, FAKES_PUBLIC_URL: 'http://localhost:4401/' },
  });
  child.stderr.pipe(process.stderr);
  const [line] = (await once(createInterface(child.stdout), 'line')) as [string];
  return JSON.parse(line) as Record<'payments' | 'mailSmtp' | 'mailHttp' | 'prices', number>;
}

test('starts all three, keeps what it promised when killed, and stops when asked', async () => {
  const ports = await start();
  const stripe = clientFor(ports.payments);
  const account = await stripe.accounts.create({});
  const link = await stripe.accountLinks.create({
    account: account.id,
    type: 'account_onboarding',
    return_url: 'http://localhost:9/a',
    refresh_url: 'http://localhost:9/b',
  });
  expect(link.url).toMatch(/^http:\/\/localhost:4401\/setup\//);
  expect((await fetch(`http://127.0.0.1:${ports.mailHttp}/`)).status).toBe(200);
  expect((await fetch(`http://127.0.0.1:${ports.prices}/v1/gold/latest`)).status).toBe(200);
  child!.kill('SIGKILL');
  await once(child!, 'exit');

  const again = await start();
  expect((await clientFor(again.payments).accounts.retrieve(account.id)).id).toBe(account.id);
  child!.kill('SIGTERM');
  const [code] = (await once(child!, 'exit')) as [number];
  expect(code).toBe(0);
}, 30_000);
