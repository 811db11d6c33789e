import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { assertMinorUnits } from '../../platform/columns.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import { inLockOrder, kindOfAccount } from './ledger.rules.ts';

export interface LedgerEntry {
  account: string;
  /** Debit positive, credit negative, in minor units; nought is left out. */
  amountMinor: number;
}

export interface LedgerTransfer {
  /** The business fact, such as `pay in` or `settlement`. */
  kind: string;
  dealId: string | null;
  /** Names the fact: the same key twice is once. What moves the processor's balance is keyed `txn:<balance transaction>`. */
  key: string;
  eventAt: Date;
  entries: LedgerEntry[];
}

/**
 * Posts one business fact in double entry, in the market's currency. The database refuses, at the latest at commit, what is out of
 * balance and what would take a hold or a payable below nought.
 * @returns false when the fact has been posted before
 * @throws Error when it has been posted before with other amounts
 */
export async function postTransfer(tx: EntityManager, transfer: LedgerTransfer): Promise<boolean> {
  const entries = inLockOrder(transfer.entries.filter(({ amountMinor }) => assertMinorUnits(amountMinor) !== 0));
  const id = await insertTransfer(tx, transfer);
  if (!id) {
    await assertSameAsBefore(tx, transfer.key, entries);
    return false;
  }
  const { currency } = await marketTerms(tx);
  for (const { account, amountMinor } of entries) {
    const accountId = await accountIdOf(tx, account, currency);
    await tx.query('insert into ledger_entries (transfer_id, account_id, currency, amount) values ($1, $2, $3, $4)', [
      id,
      accountId,
      currency,
      amountMinor,
    ]);
  }
  return true;
}

async function insertTransfer(
  tx: EntityManager,
  { kind, dealId, key, eventAt }: LedgerTransfer,
): Promise<string | null> {
  const rows: { id: string }[] = await tx.query(
    `insert into ledger_transfers (id, kind, deal_id, idem_key, event_at) values ($1, $2, $3, $4, $5)
     on conflict (idem_key) do nothing returning id`,
    [randomUUID(), kind, dealId, key, eventAt],
  );
  return rows[0]?.id ?? null;
}

/** The account's id; opens it at its first use. Only the row of a new account is locked here: posting an entry locks the others. */
async function accountIdOf(tx: EntityManager, code: string, currency: string): Promise<string> {
  const { normal, minZero } = kindOfAccount(code);
  const find = (): Promise<{ id: string }[]> => tx.query('select id from ledger_accounts where code = $1', [code]);
  const [known] = await find();
  if (known) return known.id;
  await tx.query(
    'insert into ledger_accounts (code, currency, normal, min_zero) values ($1, $2, $3, $4) on conflict (code) do nothing',
    [code, currency, normal, minZero],
  );
  return (await find())[0]!.id;
}

async function assertSameAsBefore(tx: EntityManager, key: string, entries: LedgerEntry[]): Promise<void> {
  const before: LedgerEntry[] = await tx.query(
    `select a.code as account, e.amount::float8 as "amountMinor" from ledger_entries e
       join ledger_accounts a on a.id = e.account_id join ledger_transfers t on t.id = e.transfer_id
      where t.idem_key = $1 order by e.id`,
    [key],
  );
  const text = (all: LedgerEntry[]): string =>
    inLockOrder(all)
      .map(({ account, amountMinor }) => `${account} ${amountMinor}`)
      .join(', ');
  if (text(before) !== text(entries))
    throw new Error(`${key} is posted already as ${text(before)}, and not as ${text(entries)}`);
}
