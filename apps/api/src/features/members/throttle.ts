import type { DataSource, EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { inTransaction } from '../../platform/transaction.ts';

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
 * Slows down guessing per account and per address. Never locks anybody out for good: the way by mail stays open. Each try counts as
 * failed until `clearFailures` says otherwise, so that many sent at once do not all slip past the brake.
 * @returns the records of this try
 * @throws AppError request.too_many with the seconds to wait
 */
export const beginTry = (db: DataSource, attempt: Attempt): Promise<string[]> =>
  inTransaction(db, async (tx) => {
    const keys = keysOf(attempt);
    for (const key of keys) await tx.query('select pg_advisory_xact_lock(hashtextextended($1, 0))', [key]);
    await assertMayTry(tx, keys);
    const rows: { id: string }[] = await tx.query(
      'insert into sign_in_failures (key) select unnest($1::text[]) returning id',
      [keys],
    );
    return rows.map(({ id }) => id);
  });

async function assertMayTry(tx: EntityManager, keys: string[]): Promise<void> {
  const rows: { kind: 'account' | 'address'; n: number; since: number }[] = await tx.query(
    `select split_part(key, ':', 1) as kind, count(*)::int as n, extract(epoch from market_now() - max(at))::float8 as since from sign_in_failures
      where key = any($1) and at > market_now() - make_interval(mins => $2) group by key`,
    [keys, windowMinutes],
  );
  const wait = Math.max(0, ...rows.map(({ kind, n, since }) => waitAfter(n, freeTries[kind]) - since));
  if (wait > 0)
    throw new AppError(
      'request.too_many',
      `Too many failed tries. Wait ${Math.ceil(wait)} seconds, or set a new password by mail.`,
      { context: { retryAfterS: wait } },
    );
}

/** The try has failed: the wait begins now, not when the password began to be checked. */
export async function noteFailure(db: DataSource, tries: readonly string[]): Promise<void> {
  await db.query('update sign_in_failures set at = market_now() where id = any($1)', [tries]);
}

/** Nothing was guessed in this try: it does not count, and the others stay as they are. */
export async function takeBack(db: DataSource, tries: readonly string[]): Promise<void> {
  await db.query('delete from sign_in_failures where id = any($1)', [tries]);
}

/**
 * A right password clears the account's count and takes its own try back; the address keeps its others, or one known account would
 * reset the brake for guessing others.
 */
export async function clearFailures(
  db: DataSource,
  { email, tries = [] }: Pick<Attempt, 'email'> & { tries?: readonly string[] },
): Promise<void> {
  await db.query('delete from sign_in_failures where key = $1 or id = any($2)', [
    `account:${email.toLowerCase()}`,
    tries,
  ]);
}
