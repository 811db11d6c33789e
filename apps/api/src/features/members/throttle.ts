import type { DataSource } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';

/** Failures before the brake: an address may stand for a whole office. */
const freeTries = { account: 5, address: 20 } as const;
const longestWaitS = 15 * 60;
const windowMinutes = 60;

/** Seconds to wait after so many failures within the hour beyond the free ones: 1, 2, 4 … up to 15 minutes. */
export const waitAfter = (failures: number, free: number): number =>
  failures < free ? 0 : Math.min(longestWaitS, 2 ** (failures - free));

/** An IPv4 address, or the /64 an IPv6 address belongs to: one household has many of those. */
const prefixOf = (ip: string): string =>
  ip.includes(':') && !ip.includes('.') ? ip.split(':').slice(0, 4).join(':') : ip;

export interface Attempt {
  email: string;
  ip: string;
}

const keysOf = ({ email, ip }: Attempt): string[] => [`account:${email.toLowerCase()}`, `address:${prefixOf(ip)}`];

/**
 * Slows down guessing per account and per address. Never locks anybody out for good: the way by mail stays open.
 * @throws AppError request.too_many with the seconds to wait
 */
export async function assertMayTry(db: DataSource, attempt: Attempt): Promise<void> {
  const rows: { kind: 'account' | 'address'; n: number; since: number }[] = await db.query(
    `select split_part(key, ':', 1) as kind, count(*)::int as n, extract(epoch from market_now() - max(at))::float8 as since from sign_in_failures
      where key = any($1) and at > market_now() - make_interval(mins => $2) group by key`,
    [keysOf(attempt), windowMinutes],
  );
  const wait = Math.max(0, ...rows.map(({ kind, n, since }) => waitAfter(n, freeTries[kind]) - since));
  if (wait > 0)
    throw new AppError(
      'request.too_many',
      `Too many failed tries. Wait ${Math.ceil(wait)} seconds, or set a new password by mail.`,
      { context: { retryAfterS: wait } },
    );
}

export async function noteFailure(db: DataSource, attempt: Attempt): Promise<void> {
  await db.query('insert into sign_in_failures (key) select unnest($1::text[])', [keysOf(attempt)]);
}

/** A right password clears the account's count; the address keeps its own, or one known account would reset the brake for guessing others. */
export async function clearFailures(db: DataSource, { email }: Pick<Attempt, 'email'>): Promise<void> {
  await db.query('delete from sign_in_failures where key = $1', [`account:${email.toLowerCase()}`]);
}
