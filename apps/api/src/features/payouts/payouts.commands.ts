import type { EntityManager } from 'typeorm';
import { marketNow } from '../../platform/clock.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import type { ProcessorAccount, ProcessorPayout } from '../../platform/payments.ts';
import { createWords } from '../../platform/words.ts';
import { postTransfer } from '../ledger/ledger.commands.ts';
import { accountCode } from '../ledger/ledger.reads.ts';
import { notify } from '../notices/notices.commands.ts';
import { releaseWaitingTransfers } from '../payments/payments.commands.ts';
import { Payout, PayoutAccount } from './payout-account.entity.ts';
import { isNews } from './payouts.rules.ts';

/** Keeps what the processor says of a seller's account, and sends what waited for it. An account that is none of ours is passed over. */
export async function recordAccount(tx: EntityManager, account: ProcessorAccount): Promise<void> {
  const { accountId, transfersActive, payoutsEnabled, requirements } = account;
  const known = await tx.findOne(PayoutAccount, { where: { accountId }, lock: { mode: 'pessimistic_write' } });
  if (!known) return;
  const updatedAt = await marketNow(tx);
  await tx.update(PayoutAccount, { accountId }, { transfersActive, payoutsEnabled, requirements, updatedAt });
  await releaseWaitingTransfers(tx, known.memberId);
}

/** Keeps a payout to a seller's bank and tells the seller when it is paid or has failed. States move only forward. */
export async function recordPayout(tx: EntityManager, accountId: string, heard: ProcessorPayout): Promise<void> {
  const account = await tx.findOne(PayoutAccount, { where: { accountId }, lock: { mode: 'pessimistic_write' } });
  if (!account) return;
  const { payoutId: id, state, amountMinor, at } = heard;
  const known = await tx.findOneBy(Payout, { id });
  if (!isNews(known?.state ?? null, state)) return;
  await tx.upsert(Payout, { id, accountId, amountMinor, state, at }, ['id']);
  if (state !== 'paid' && state !== 'failed') return;
  const amount = createWords(await marketTerms(tx)).money(amountMinor);
  await notify(tx, {
    memberId: account.memberId,
    kind: 'payout',
    key: `payout:${id}:${state}`,
    ...(state === 'paid'
      ? {
          subject: `${amount} is paid out to your bank`,
          text: 'The payment processor has paid it out. It is on your bank’s next statement.',
        }
      : {
          subject: `The payout of ${amount} has failed`,
          text: 'Your bank sent it back. Check the bank account with the payment processor; it pays out again then.',
        }),
    link: '/sell/payouts',
  });
}

/** Books a payout of the market's own earnings to its bank, and back if the bank returns it. */
export async function bookOwnPayout(tx: EntityManager, heard: ProcessorPayout): Promise<void> {
  const move = (kind: string, transactionId: string, amountMinor: number): Promise<boolean> =>
    postTransfer(tx, {
      kind,
      dealId: null,
      key: `txn:${transactionId}`,
      eventAt: heard.at,
      entries: [
        { account: accountCode.bank, amountMinor },
        { account: accountCode.processor, amountMinor: -amountMinor },
      ],
    });
  if (heard.transactionId) await move('own payout', heard.transactionId, heard.amountMinor);
  if (heard.failureTransactionId) await move('own payout returned', heard.failureTransactionId, -heard.amountMinor);
}
