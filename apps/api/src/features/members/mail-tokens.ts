import { createHmac, createHash, randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { addToOutbox, HopelessEffect, type OutboxHandler } from '../../platform/outbox.ts';
import type { World } from '../../platform/world.ts';

export type Purpose = 'confirm' | 'reset';
const lifetimeHours: Record<Purpose, number> = { confirm: 24, reset: 1 };

const hashOf = (token: string): string => createHash('sha256').update(token).digest('base64url');

/**
 * The secret of a link is derived from its row's id with a key of the settings, so that the mail can be made (and made again
 * after a lost answer) by the worker, and neither the outbox nor the table holds anything that opens an account.
 */
const tokenOf = (id: string, secret: string): string =>
  `${id}.${createHmac('sha256', secret).update(`mail-token:${id}`).digest('base64url')}`;

/** Orders a mail with a link that works once. */
export async function orderLink(
  tx: EntityManager,
  { PASSWORD_PEPPER }: { PASSWORD_PEPPER: string },
  { memberId, purpose }: { memberId: string; purpose: Purpose },
): Promise<void> {
  const id = randomUUID();
  await tx.query(
    `insert into mail_tokens (id, member_id, purpose, token_hash, expires_at) values ($1, $2, $3, $4, market_now() + make_interval(hours => $5))`,
    [id, memberId, purpose, hashOf(tokenOf(id, PASSWORD_PEPPER)), lifetimeHours[purpose]],
  );
  await addToOutbox(tx, { kind: 'link.mail', key: `link:${id}`, payload: { tokenId: id } });
}

/** Spends a token: the member it belongs to, or null when it is unknown, used or too old. */
export async function spendToken(
  tx: EntityManager,
  { token, purpose }: { token: string; purpose: Purpose },
): Promise<string | null> {
  const [rows]: [{ member_id: string }[], number] = await tx.query(
    `update mail_tokens set used_at = market_now() where token_hash = $1 and purpose = $2 and used_at is null and expires_at > market_now() returning member_id`,
    [hashOf(token), purpose],
  );
  return rows[0]?.member_id ?? null;
}

interface Links {
  memberId: string;
  purpose: Purpose;
}

/** How many unused links of this kind still work for the member. */
export async function goodLinks(tx: EntityManager, { memberId, purpose }: Links): Promise<number> {
  const rows: { n: number }[] = await tx.query(
    `select count(*)::int as n from mail_tokens where member_id = $1 and purpose = $2 and used_at is null and expires_at > market_now()`,
    [memberId, purpose],
  );
  return rows[0]!.n;
}

/** Makes every unused link of this kind worthless: one of them has done its work. */
export async function spendOthers(tx: EntityManager, { memberId, purpose }: Links): Promise<void> {
  await tx.query(
    'update mail_tokens set used_at = market_now() where member_id = $1 and purpose = $2 and used_at is null',
    [memberId, purpose],
  );
}

const words: Record<Purpose, { subject: string; path: string; text: string }> = {
  confirm: {
    subject: 'Confirm your e-mail address',
    path: '/confirm',
    text: 'Open this page and press the button to confirm your address. The link works for a day. If you did not register, ignore this mail.',
  },
  reset: {
    subject: 'Set a new password',
    path: '/reset',
    text: 'Open this page to set a new password. The link works for an hour. If you did not ask for it, ignore this mail; your password stays as it is.',
  },
};

export const mailLink =
  ({ db, mail, settings }: Pick<World, 'db' | 'mail' | 'settings'>): OutboxHandler =>
  async ({ key, payload }) => {
    const rows: { email: string; purpose: Purpose }[] = await db.query(
      'select m.email, t.purpose from mail_tokens t join members m on m.id = t.member_id where t.id = $1',
      [payload.tokenId],
    );
    if (!rows[0]) throw new HopelessEffect('the token is gone');
    const { subject, path, text } = words[rows[0].purpose];
    const link = `${settings.PUBLIC_URL}${path}?token=${tokenOf(String(payload.tokenId), settings.PASSWORD_PEPPER)}`;
    await mail.send({ to: rows[0].email, subject, text: `${text}\n\n${link}\n`, key });
  };
