import { join } from 'node:path';
import { fromRoot } from '../lib/root.mjs';

const onLoopback = (port) => `http://127.0.0.1:${port}`;

/** Where a person or a test reaches each part of the stack. */
export const addressesOf = (ports) => ({
  web: `http://localhost:${ports.web}`,
  payments: `http://localhost:${ports.payments}`,
  mail: `http://localhost:${ports.mail}`,
});

/** Where the processor delivers its events. */
export const webhookTarget = (ports) => `${onLoopback(ports.api)}/api/webhooks/payments`;

/** The environment of the local stand-ins. */
export const standInEnvironment = ({ ports, dir }) => ({
  PAYMENTS_PORT: String(ports.payments),
  MAIL_SMTP_PORT: String(ports.smtp),
  MAIL_HTTP_PORT: String(ports.mail),
  PRICES_PORT: String(ports.prices),
  FAKES_DIR: join(dir, 'fakes'),
  FAKES_PUBLIC_URL: addressesOf(ports).payments,
});

/**
 * The environment of the API and its worker: the variables of apps/api/src/settings.ts.
 * The owner's connection is not among them: only commands get it.
 */
export function apiEnvironment({ ports, dir, urls, secrets, webhookSecrets, watch, settings }) {
  return {
    NODE_ENV: watch ? 'development' : 'production',
    LOG_LEVEL: process.env.LOG_LEVEL ?? 'info',
    PORT: String(ports.api),
    PUBLIC_URL: addressesOf(ports).web,
    DATABASE_URL: urls.DATABASE_URL,
    JOBS_DATABASE_URL: urls.JOBS_DATABASE_URL,
    JWT_SECRETS: secrets.jwt,
    PASSWORD_PEPPER: secrets.pepper,
    FILES_DIR: join(dir, 'files'),
    // Unset while Vite serves the clients.
    ...(watch ? {} : { CLIENTS_DIR: fromRoot('apps') }),
    SMTP_URL: `smtp://127.0.0.1:${ports.smtp}`,
    MAIL_FROM: 'Lydite <notices@lydite.example>',
    PAYMENTS_API_URL: onLoopback(ports.payments),
    PAYMENTS_SECRET_KEY: secrets.paymentsKey,
    PAYMENTS_WEBHOOK_SECRETS: webhookSecrets.join(','),
    PRICES_URL: onLoopback(ports.prices),
    MARKET_ZONE: 'Europe/Vienna',
    MARKET_CURRENCY: 'USD',
    DEMO_MAIL_URL: addressesOf(ports).mail,
    ...settings,
  };
}
