import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Refusal } from './main.mjs';
import { writeSecrets } from './secrets.mjs';

/**
 * Makes sure the processor knows this stack's two webhook endpoints (own account, connected accounts) and returns their
 * signing secrets. A pair registered earlier is kept, as its secrets are told only once; it moves with the address.
 */
export async function ensureWebhooks({ paymentsUrl, secretKey, target, dir }) {
  const file = join(dir, 'webhooks.json');
  const kept = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : [];
  const call = createCall({ paymentsUrl, secretKey });
  const known = await Promise.all(kept.map(({ id }) => call('GET', `/v1/webhook_endpoints/${id}`)));
  if (kept.length === 2 && known.every(({ status }) => status === 200)) {
    const moved = known.filter(({ body }) => body.url !== target);
    // Moved rather than made anew, so that what waits for delivery comes to the new address.
    for (const { body } of moved) await call('POST', `/v1/webhook_endpoints/${body.id}`, { url: target });
    return kept.map(({ secret }) => secret);
  }
  const endpoints = [];
  for (const connect of ['false', 'true']) endpoints.push(await register({ call, target, connect }));
  writeSecrets({ file, secrets: endpoints });
  return endpoints.map(({ secret }) => secret);
}

async function register({ call, target, connect }) {
  const form = { url: target, 'enabled_events[]': '*', connect };
  const { status, body } = await call('POST', '/v1/webhook_endpoints', form);
  if (status !== 200)
    throw new Refusal(`The payment processor refused the webhook endpoint (${status}): ${JSON.stringify(body)}`);
  return { id: body.id, secret: body.secret };
}

const createCall =
  ({ paymentsUrl, secretKey }) =>
  async (method, path, form) => {
    const headers = { authorization: `Bearer ${secretKey}` };
    const body = form && new URLSearchParams(form);
    const response = await fetch(`${paymentsUrl}${path}`, {
      method,
      headers,
      body,
      signal: AbortSignal.timeout(10_000),
    });
    return { status: response.status, body: await response.json().catch(() => ({})) };
  };
