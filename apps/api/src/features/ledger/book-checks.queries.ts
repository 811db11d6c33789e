import type { EntityManager } from 'typeorm';

export interface BookCheck {
  name: string;
  /** Rows that break the rule: what, and by how much in minor units. */
  sql: string;
}

const paidStates = `('held', 'dispatched', 'ready', 'received', 'weighed_in', 'in_dispute', 'settling', 'needs_approval')`;

/** What must always hold between the ledger's own rows and the market's. Each query finds the exceptions. */
export const bookChecks: BookCheck[] = [
  {
    name: 'All entries add up to nought',
    sql: `select currency as what, sum(amount) as "offMinor" from ledger_entries group by currency having sum(amount) <> 0`,
  },
  {
    name: 'Every transfer adds up to nought and has two entries or more',
    sql: `select t.idem_key as what, coalesce(sum(e.amount), 0) as "offMinor" from ledger_transfers t
            left join ledger_entries e on e.transfer_id = t.id
           group by t.id, t.idem_key, e.currency having coalesce(sum(e.amount), 0) <> 0 or count(e.id) < 2`,
  },
  {
    name: 'Every balance is the sum of its entries',
    sql: `select a.code as what, a.balance - coalesce(sum(case a.normal when 'D' then e.amount else -e.amount end), 0) as "offMinor"
            from ledger_accounts a left join ledger_entries e on e.account_id = a.id
           group by a.id having a.balance <> coalesce(sum(case a.normal when 'D' then e.amount else -e.amount end), 0)`,
  },
  {
    name: 'No hold, payable or tax is below nought',
    sql: `select code as what, balance as "offMinor" from ledger_accounts where min_zero and balance < 0`,
  },
  {
    name: 'Every open hold has its deal, with what the buyer paid in',
    sql: `with held as (select substr(code, 11) as code, balance from ledger_accounts where code like 'hold.deal:%'),
               due as (select code, case when state in ${paidStates} then hold_minor else 0 end as minor, frozen_at from deals)
          select coalesce(held.code, due.code) as what, coalesce(held.balance, 0) - coalesce(due.minor, 0) as "offMinor"
            from held full join due using (code)
           where case when due.frozen_at is null then coalesce(held.balance, 0) <> coalesce(due.minor, 0) else held.balance > due.minor end`,
  },
  {
    name: 'What is owed to sellers is on its way to them',
    sql: `with owed as (select substr(code, 16) as member, balance from ledger_accounts where code like 'payable.seller:%'),
               due as (select member_id::text as member, sum(amount_minor) as minor from transfers where state <> 'sent' group by member_id)
          select coalesce(owed.member, due.member) as what, coalesce(owed.balance, 0) - coalesce(due.minor, 0) as "offMinor"
            from owed full join due using (member) where coalesce(owed.balance, 0) <> coalesce(due.minor, 0)`,
  },
  {
    name: 'What is owed to buyers is on its way back to them',
    sql: `with owed as (select substr(code, 17) as code, balance from ledger_accounts where code like 'clearing.refund:%'),
               due as (select d.code, sum(r.amount_minor) as minor from refunds r join deals d on d.id = r.deal_id where r.state <> 'sent' group by d.code)
          select coalesce(owed.code, due.code) as what, coalesce(owed.balance, 0) - coalesce(due.minor, 0) as "offMinor"
            from owed full join due using (code) where coalesce(owed.balance, 0) <> coalesce(due.minor, 0)`,
  },
];

export interface Exception {
  what: string;
  offMinor: number;
}

export async function exceptionsTo(tx: EntityManager, { sql }: BookCheck): Promise<Exception[]> {
  const rows: { what: string; offMinor: string }[] = await tx.query(sql);
  return rows.map(({ what, offMinor }) => ({ what, offMinor: Number(offMinor) }));
}

export interface Books {
  entries: number;
  /** Balance of `asset.processor`. */
  processorMinor: number;
  /** Balance transactions posted, by the processor's id, since the time asked for. */
  posted: { transactionId: string; at: Date }[];
  accounts: { code: string; side: 'debit' | 'credit'; balanceMinor: number }[];
  now: Date;
}

export async function readBooks(tx: EntityManager, days: number): Promise<Books> {
  const [sums]: { entries: number; processorMinor: number; now: Date }[] = await tx.query(
    `select (select count(*)::int from ledger_entries) as entries, clock_timestamp() as now,
            coalesce((select balance from ledger_accounts where code = 'asset.processor'), 0)::float8 as "processorMinor"`,
  );
  const posted: Books['posted'] = await tx.query(
    `select substr(idem_key, 5) as "transactionId", created_at as at from ledger_transfers
      where idem_key like 'txn:%' and created_at > clock_timestamp() - make_interval(days => $1)`,
    [days],
  );
  const accounts: Books['accounts'] = await tx.query(
    `select code, case normal when 'D' then 'debit' else 'credit' end as side, balance::float8 as "balanceMinor"
       from ledger_accounts where balance <> 0 order by code limit 500`,
  );
  return { ...sums!, posted, accounts };
}
