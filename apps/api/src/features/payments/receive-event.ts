import { AppError } from '../../platform/app-error.ts';
import { addToInbox } from '../../platform/inbox.ts';
import type { World } from '../../platform/world.ts';
import { isHeeded } from './event-effects.ts';

export interface SignedEvent {
  /** The untouched bytes, over which the signature goes. */
  raw: unknown;
  signature: string;
}

/** Keeps a signed event for the worker. @throws AppError request.invalid when nobody we know has signed it; nothing is kept then */
export async function receiveEvent(
  { db, payments }: Pick<World, 'db' | 'payments'>,
  { raw, signature }: SignedEvent,
): Promise<void> {
  if (!Buffer.isBuffer(raw)) throw new AppError('request.invalid', 'The event is empty.');
  const event = payments.verifyEvent(raw, signature);
  if (isHeeded(event.kind)) await addToInbox(db.manager, event);
}

/**
 * The net under the webhooks: fetches the events of the last days, and puts what never arrived into the inbox. It looks further
 * back after an outage, as far as the processor keeps events.
 */
export async function pollEvents({ db, payments }: Pick<World, 'db' | 'payments'>): Promise<void> {
  const [{ since } = { since: new Date(0) }]: { since: Date }[] = await db.query(
    `select greatest(least(max(received_at), clock_timestamp()) - interval '3 days', clock_timestamp() - interval '30 days') as since from inbox`,
  );
  const accounts: { accountId: string }[] = await db.query(
    `select p.account_id as "accountId" from payout_accounts p
      where not (p.transfers_active and p.payouts_enabled)
         or exists (select from transfers t where t.member_id = p.member_id and t.sent_at > market_now() - interval '30 days')`,
  );
  for (const accountId of [null, ...accounts.map((one) => one.accountId)])
    for await (const event of payments.events({ since, accountId }))
      if (isHeeded(event.kind)) await addToInbox(db.manager, event);
}
