import { HopelessEffect, type OutboxHandler } from '../../platform/outbox.ts';
import type { World } from '../../platform/world.ts';

/** Mails a notice: one subject, one fact, one link. A link only opens a page; whatever acts is a button there. */
export const mailNotice =
  ({ db, mail, settings }: Pick<World, 'db' | 'mail' | 'settings'>): OutboxHandler =>
  async ({ key, payload }) => {
    const rows: { email: string; subject: string; text: string; link: string; mailedAt: Date | null }[] =
      await db.query(
        `select m.email, n.subject, n.text, n.link, n.mailed_at as "mailedAt" from notices n join members m on m.id = n.member_id where n.id = $1`,
        [payload.noticeId],
      );
    const notice = rows[0];
    if (!notice) throw new HopelessEffect('the notice is gone');
    if (notice.mailedAt) return;
    await mail.send({
      to: notice.email,
      subject: notice.subject,
      text: `${notice.text}\n\n${settings.PUBLIC_URL}${notice.link}\n`,
      key,
    });
    await db.query('update notices set mailed_at = market_now() where id = $1', [payload.noticeId]);
  };
