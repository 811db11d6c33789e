import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { startMail } from './mail/server.ts';
import { startPayments } from './payments/server.ts';
import { startPrices } from './prices/server.ts';

const port = (usual: number) => z.coerce.number().int().min(0).max(65_535).default(usual);

const environment = z.object({
  PAYMENTS_PORT: port(4401),
  MAIL_SMTP_PORT: port(4402),
  MAIL_HTTP_PORT: port(4403),
  PRICES_PORT: port(4404),
  /** The address to listen on: this machine only by default. */
  FAKES_HOST: z.string().default('127.0.0.1'),
  /** Folder of everything that outlives a restart. */
  FAKES_DIR: z.string().min(1),
  /** Where a browser reaches the processor's pages; by default localhost and the port. */
  FAKES_PUBLIC_URL: z.url().optional(),
  /** Seconds until a payment's funds turn available, and until a payout lands. */
  FAKES_FUNDS_DELAY_S: z.coerce.number().int().min(0).default(15),
  FAKES_PAYOUT_DELAY_S: z.coerce.number().int().min(0).default(3),
});

const settings = environment.parse(process.env);
const host = settings.FAKES_HOST;
mkdirSync(settings.FAKES_DIR, { recursive: true });

const payments = await startPayments({
  host,
  port: settings.PAYMENTS_PORT,
  dir: join(settings.FAKES_DIR, 'payments'),
  publicUrl: settings.FAKES_PUBLIC_URL,
  fundsDelayS: settings.FAKES_FUNDS_DELAY_S,
  payoutDelayS: settings.FAKES_PAYOUT_DELAY_S,
});
const mail = await startMail({
  host,
  smtpPort: settings.MAIL_SMTP_PORT,
  httpPort: settings.MAIL_HTTP_PORT,
  dir: join(settings.FAKES_DIR, 'mail'),
});
const prices = await startPrices({ host, port: settings.PRICES_PORT });

const ports = { payments: payments.port, mailSmtp: mail.smtpPort, mailHttp: mail.port, prices: prices.port };
process.stdout.write(`${JSON.stringify({ ready: true, ...ports })}\n`);

let isStopping = false;

async function stop(): Promise<void> {
  if (isStopping) return;
  isStopping = true;
  await Promise.all([payments.close(), mail.close(), prices.close()]);
  process.exit(0);
}

for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => void stop());
