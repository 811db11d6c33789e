import { createHash, randomBytes } from 'node:crypto';
import { Secret, TOTP } from 'otpauth';
import type { EntityManager } from 'typeorm';
import { marketNow } from '../../platform/clock.ts';
import type { Seal } from './totp-secret.ts';

const recoveryCodeCount = 10;
/** 120 bits: nobody can try them all against a stolen table, so a plain hash is enough. */
const recoveryCodeBytes = 15;

/** RFC 6238 with the parameters every authenticator app knows: SHA-1, six digits, 30 seconds. */
export const totpOf = (secret: Uint8Array, label = ''): TOTP =>
  new TOTP({
    issuer: 'Lydite',
    label,
    algorithm: 'SHA1',
    digits: 6,
    period: 30,
    secret: new Secret({ buffer: Uint8Array.from(secret).buffer }),
  });

const plain = (code: string): string => code.replaceAll(/[\s-]/g, '').toLowerCase();
const hashOf = (code: string): string => createHash('sha256').update(plain(code)).digest('base64url');

interface Use {
  memberId: string;
  code: string;
}

/** Uses up a code of the member's app: true once for each 30-second step, and never for a step older than one used. */
export async function spendAppCode(tx: EntityManager, seal: Seal, { memberId, code }: Use): Promise<boolean> {
  const rows: { secret: Buffer; last_step: string | null }[] = await tx.query(
    'select secret, last_step from member_totp where member_id = $1 for update',
    [memberId],
  );
  if (!rows[0]) return false;
  const totp = totpOf(seal.open(memberId, rows[0].secret));
  const timestamp = (await marketNow(tx)).getTime();
  const offset = totp.validate({ token: plain(code), timestamp, window: 1 });
  if (offset === null) return false;
  const step = totp.counter({ timestamp }) + offset;
  if (step <= Number(rows[0].last_step ?? -1)) return false;
  await tx.query('update member_totp set last_step = $2 where member_id = $1', [memberId, step]);
  return true;
}

/** Uses up a recovery code: true once for each. */
export async function spendRecoveryCode(tx: EntityManager, { memberId, code }: Use): Promise<boolean> {
  const [, count]: [unknown, number] = await tx.query(
    'update recovery_codes set used_at = market_now() where hash = $1 and member_id = $2 and used_at is null',
    [hashOf(code), memberId],
  );
  return count === 1;
}

/** Replaces the member's recovery codes by ten new ones; only their hashes are kept. */
export async function issueRecoveryCodes(tx: EntityManager, memberId: string): Promise<string[]> {
  const codes = Array.from({ length: recoveryCodeCount }, () => {
    const text = new Secret({ buffer: Uint8Array.from(randomBytes(recoveryCodeBytes)).buffer }).base32.toLowerCase();
    return text.match(/.{4}/g)!.join('-');
  });
  await tx.query('delete from recovery_codes where member_id = $1', [memberId]);
  await tx.query('insert into recovery_codes (hash, member_id) select unnest($1::text[]), $2', [
    codes.map(hashOf),
    memberId,
  ]);
  return codes;
}
