import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { addToOutbox } from '../../platform/outbox.ts';

export interface NoticeOrder {
  memberId: string;
  kind: string;
  /** Names the fact: the same key twice is one notice. */
  key: string;
  /** One fact, and what it is about: it is the mail's subject too. */
  subject: string;
  text: string;
  /** Path of the page where the member acts or reads on, such as `/deals/D-1001`. */
  link: string;
}

/** Tells a member something, in the list of notices and by mail, if the caller's transaction commits. */
export async function notify(
  tx: EntityManager,
  { memberId, kind, key, subject, text, link }: NoticeOrder,
): Promise<void> {
  const id = randomUUID();
  const rows: unknown[] = await tx.query(
    `insert into notices (id, member_id, kind, key, subject, text, link) values ($1, $2, $3, $4, $5, $6, $7) on conflict (key) do nothing returning id`,
    [id, memberId, kind, key, subject, text, link],
  );
  if (rows.length > 0) await addToOutbox(tx, { kind: 'notice.mail', key: `notice:${id}`, payload: { noticeId: id } });
}
