import { randomUUID } from 'node:crypto';
import type { Role } from '@lydite/contracts';
import type { Market } from './market.ts';

interface MemberOptions {
  name?: string;
  place?: string;
  email?: string;
  roles?: Role[];
  verified?: boolean;
  limitMinor?: number;
  passwordHash?: string;
}

/** A member with confirmed address; verified, with a limit of 50 000.00, unless told otherwise. */
export async function addMember({ db }: Pick<Market, 'db'>, options: MemberOptions = {}): Promise<string> {
  const {
    name = 'Harrowmere Boards',
    place = 'Harrowmere',
    roles = ['buyer'],
    verified = true,
    passwordHash = 'none',
  } = options;
  const id = randomUUID();
  await db.query(
    `insert into members (id, email, password_hash, name, place, email_confirmed_at, verified_at, limit_minor)
     values ($1, $2, $3, $4, $5, market_now(), case when $6 then market_now() end, $7)`,
    [
      id,
      options.email ?? `${id}@members.example`,
      passwordHash,
      name,
      place,
      verified,
      options.limitMinor ?? (verified ? 5_000_000 : 200_000),
    ],
  );
  for (const role of roles) await db.query('insert into member_roles (member_id, role) values ($1, $2)', [id, role]);
  return id;
}
