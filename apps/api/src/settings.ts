import { z } from 'zod';

const list = z.string().transform((text) =>
  text
    .split(',')
    .map((part) => part.trim())
    .filter(Boolean),
);
const secrets = list.refine(
  (all) => all.length > 0 && all.every((one) => one.length >= 32),
  'each secret needs 32 characters or more',
);
const flag = z.enum(['on', 'off']).transform((text) => text === 'on');

/** The environment, parsed once at start. Everything else receives values from here. */
const schema = z.object({
  NODE_ENV: z.enum(['development', 'test', 'production']).default('production'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(4400),
  HOST: z.string().default('127.0.0.1'),
  /** The one origin under which members reach the market, without a slash at the end. */
  PUBLIC_URL: z.url().transform((url) => url.replace(/\/$/, '')),
  DATABASE_URL: z.url(),
  JOBS_DATABASE_URL: z.url(),
  DATABASE_POOL: z.coerce.number().int().min(2).max(100).default(12),
  /** The first secret signs, all of them are accepted: rotate by putting a new one in front. */
  JWT_SECRETS: secrets,
  PASSWORD_PEPPER: z.string().min(32),
  FILES_DIR: z.string().min(1),
  /** Folder that holds buyer/dist, seller/dist and desk/dist; unset while Vite serves the clients. */
  CLIENTS_DIR: z.string().optional(),
  SMTP_URL: z.url(),
  MAIL_FROM: z.string().default('Lydite <no-reply@lydite.example>'),
  PAYMENTS_SECRET_KEY: z.string().min(8),
  /** Set only where a stand-in takes the processor's place; unset, the SDK calls the processor itself. */
  PAYMENTS_API_URL: z.url().optional(),
  PAYMENTS_WEBHOOK_SECRETS: list,
  PRICES_URL: z.url(),
  /** Age at which a reference price counts as stale, not counting days without a price. */
  PRICE_STALE_HOURS: z.coerce.number().positive().default(36),
  MARKET_ZONE: z.string().default('Europe/Vienna'),
  MARKET_CURRENCY: z
    .string()
    .regex(/^[A-Z]{3}$/)
    .default('USD'),
  /** Where the demo's mail catcher shows mails; shown on the sign-in page when set. */
  DEMO_MAIL_URL: z.url().optional(),
  DEMO_SIGN_INS: z.string().optional(),
  LIMITS: flag.default(true),
  /** Whether operators and assayers have their rights only with a second step at sign-in. */
  TOTP_REQUIRED: flag.default(false),
  /** Number of proxies in front whose X-Forwarded-For is believed. */
  TRUSTED_PROXIES: z.coerce.number().int().min(0).max(5).default(0),
  LOG_LEVEL: z.enum(['trace', 'debug', 'info', 'warn', 'error', 'silent']).default('info'),
});

export type Settings = z.infer<typeof schema>;

/** @throws Error that names every setting which is missing or wrong. */
export function readSettings(env: NodeJS.ProcessEnv): Settings {
  const parsed = schema.safeParse(env);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`These settings are missing or wrong:\n${lines.join('\n')}`);
}
