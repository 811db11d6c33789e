import type { PayoutAccount as PayoutAccountView } from '@lydite/contracts';
import { ProcessorFailure } from '../../platform/payments.ts';
import { inTransaction } from '../../platform/transaction.ts';
import type { World } from '../../platform/world.ts';
import { waitingMinor } from '../payments/payments.reads.ts';
import { Payout, PayoutAccount } from './payout-account.entity.ts';
import { recordAccount } from './payouts.commands.ts';
import { isReady, requirementWords } from './payouts.rules.ts';

type Parts = Pick<World, 'db' | 'payments' | 'settings'>;

/** The seller's account at the processor as last heard, what waits for it, and its latest payouts. */
export async function readPayoutAccount({ db }: Parts, memberId: string): Promise<PayoutAccountView> {
  const account = await db.manager.findOneBy(PayoutAccount, { memberId });
  const payouts = account
    ? await db.manager.find(Payout, { where: { accountId: account.accountId }, order: { at: 'DESC' }, take: 20 })
    : [];
  return {
    state: !account ? 'none' : isReady(account) ? 'ready' : 'requirements',
    requirements: requirementWords(account?.requirements ?? []),
    verified: await isVerified({ db }, memberId),
    waitingMinor: await waitingMinor(db.manager, memberId),
    payouts: payouts.map(({ id, amountMinor, state, at }) => ({ id, amountMinor, state, at: at.toISOString() })),
  };
}

async function isVerified({ db }: Pick<World, 'db'>, memberId: string): Promise<boolean> {
  const rows: { verified: boolean }[] = await db.query(
    'select verified_at is not null as verified from members where id = $1',
    [memberId],
  );
  return rows[0]!.verified;
}

/**
 * Opens the processor's own page on which a seller sets the account up; makes the account first where there is none. The link
 * works once and for minutes, so it is handed over and never kept.
 */
export async function openAccountLink(world: Parts, memberId: string): Promise<{ url: string }> {
  const { db, payments, settings } = world;
  const known = await db.manager.findOneBy(PayoutAccount, { memberId });
  const accountId = known?.accountId ?? (await openAccount(world, memberId));
  // What the seller did on an earlier visit may not have been heard of yet.
  const account = await payments.retrieveAccount(accountId);
  await inTransaction(db, (tx) => recordAccount(tx, account));
  const page = `${settings.PUBLIC_URL}/sell/payouts`;
  return payments.createAccountLink({ accountId, returnUrl: `${page}?from=processor`, refreshUrl: `${page}?again=1` });
}

const mostTries = 3;

async function openAccount({ db, payments }: Parts, memberId: string): Promise<string> {
  const members: { email: string }[] = await db.query('select email from members where id = $1', [memberId]);
  const create = async (attempt: number): Promise<string> => {
    const key = `member:${memberId}:account:${attempt}`;
    try {
      return (await payments.createAccount({ memberId, email: members[0]!.email, key })).accountId;
    } catch (error) {
      // The processor repeats its failure for this key, and nothing hangs on an account that was made and forgotten.
      if (error instanceof ProcessorFailure && attempt < mostTries) return create(attempt + 1);
      throw error;
    }
  };
  const accountId = await create(1);
  await db.query(
    'insert into payout_accounts (member_id, account_id) values ($1, $2) on conflict (member_id) do nothing',
    [memberId, accountId],
  );
  return (await db.manager.findOneByOrFail(PayoutAccount, { memberId })).accountId;
}
