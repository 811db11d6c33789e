import type { EntityManager } from 'typeorm';
import { PayoutAccount } from './payout-account.entity.ts';
import { isReady } from './payouts.rules.ts';

export interface PayoutReadiness {
  accountId: string | null;
  /** Why the seller cannot be paid yet, in words for the seller; empty when nothing stands in the way. */
  reason: string;
}

/**
 * May this member be paid now: an account that takes transfers and pays out, and papers seen by the desk. Locks the member until the
 * end of the transaction: a transfer that is made to wait and the news that ends its waiting come one after the other.
 */
export async function payoutReadiness(tx: EntityManager, memberId: string): Promise<PayoutReadiness> {
  const rows: { verified: boolean }[] = await tx.query(
    'select verified_at is not null as verified from members where id = $1 for no key update',
    [memberId],
  );
  const account = await tx.findOneBy(PayoutAccount, { memberId });
  const accountId = account?.accountId ?? null;
  if (!account) return { accountId, reason: 'Set up your payout account.' };
  if (!isReady(account))
    return { accountId, reason: 'The payment processor still needs details for your payout account.' };
  if (!rows[0]?.verified) return { accountId, reason: 'The desk still has to see your identity and licence papers.' };
  return { accountId, reason: '' };
}
