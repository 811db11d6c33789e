import type { EntityManager } from 'typeorm';

/** The ledger's accounts by what they stand for; money.md names them. */
export const accountCode = {
  processor: 'asset.processor',
  bank: 'asset.bank',
  fees: 'income.fee',
  tax: 'liability.tax',
  processorFees: 'expense.processor_fee',
  disputeCosts: 'expense.dispute',
  hold: (dealCode: string) => `hold.deal:${dealCode}`,
  refund: (dealCode: string) => `clearing.refund:${dealCode}`,
  payable: (memberId: string) => `payable.seller:${memberId}`,
  debt: (memberId: string) => `receivable.seller:${memberId}`,
  disputed: (disputeId: string) => `suspense.dispute:${disputeId}`,
};

/** An account's balance in minor units, in its own sense (debit accounts grow by debits); 0 for one not used yet. */
export async function balanceOf(tx: EntityManager, code: string): Promise<number> {
  const rows: { balance: number }[] = await tx.query(
    'select balance::float8 as balance from ledger_accounts where code = $1',
    [code],
  );
  return rows[0]?.balance ?? 0;
}
