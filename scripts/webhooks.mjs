#!/usr/bin/env node
import { Refusal, runScript } from './lib/main.mjs';
import { ensureWebhooks } from './lib/webhooks.mjs';

const usage = `Registers the market's two webhook endpoints (own account, connected accounts) at the payment processor and
prints the line for the environment. PAYMENTS_SECRET_KEY must be set.

usage: node scripts/webhooks.mjs --payments URL --target URL --state FOLDER

  --payments URL    the processor's API
  --target URL      where it shall deliver: https://<market>/api/webhooks/payments
  --state FOLDER    keeps the secrets, which the processor tells only once (webhooks.json, 0600)`;

await runScript({
  usage,
  options: { payments: { type: 'string' }, target: { type: 'string' }, state: { type: 'string' } },
  async run({ values: { payments, target, state } }) {
    const secretKey = process.env.PAYMENTS_SECRET_KEY;
    if (!payments || !target || !state || !secretKey) throw new Refusal(usage, { exitCode: 2 });
    const secrets = await ensureWebhooks({ paymentsUrl: payments, secretKey, target, dir: state });
    console.log(`PAYMENTS_WEBHOOK_SECRETS=${secrets.join(',')}`);
  },
});
