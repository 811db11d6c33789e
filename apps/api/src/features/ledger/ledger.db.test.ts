import { randomUUID } from 'node:crypto';
import fc from 'fast-check';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { openMarket, type Market } from '../../../test/market.ts';
import { sqlState } from '../../platform/transaction.ts';
import { readBooks } from './book-checks.queries.ts';
import { postTransfer, type LedgerEntry } from './ledger.commands.ts';
import { balanceOf } from './ledger.reads.ts';

let market: Market;
beforeAll(async () => {
  market = await openMarket();
});
afterAll(() => market.close());

const entry = (account: string, amountMinor: number): LedgerEntry => ({ account, amountMinor });

const post = (entries: LedgerEntry[], key: string = randomUUID()) =>
  market.db.transaction((tx) => postTransfer(tx, { kind: 'test', dealId: null, key, eventAt: new Date(), entries }));

/** PostgreSQL's code of the refusal; undefined when nothing was refused. */
const refusal = (work: Promise<unknown>): Promise<string | undefined> =>
  work.then(
    () => undefined,
    (error: unknown) => sqlState(error),
  );

const sums = async () => {
  const rows: { entries: number; off: number; drift: number; transfers: number }[] = await market.db.query(
    `select count(*)::int as entries, coalesce(sum(amount), 0)::int as off, (select count(*)::int from ledger_transfers) as transfers,
            (select coalesce(sum(abs(a.balance - coalesce((select sum(case a.normal when 'D' then e.amount else -e.amount end)
               from ledger_entries e where e.account_id = a.id), 0))), 0)::int from ledger_accounts a) as drift from ledger_entries`,
  );
  return rows[0]!;
};

test('posts a fact once: the same key again changes nothing, with other amounts it is an error', async () => {
  const entries = [entry('asset.processor', 970), entry('expense.processor_fee', 30), entry('hold.deal:D-1', -1000)];
  expect(await post(entries, 'once')).toBe(true);
  expect(await post(entries, 'once')).toBe(false);
  expect(await balanceOf(market.db.manager, 'hold.deal:D-1')).toBe(1000);
  await expect(post([entry('asset.processor', 1), entry('hold.deal:D-1', -1)], 'once')).rejects.toThrow(
    'posted already',
  );
});

test('balances grow past what one amount may be', async () => {
  const before = await balanceOf(market.db.manager, 'asset.bank');
  const key = randomUUID();
  const large = [entry('asset.bank', 5_000_000_000), entry('asset.processor', -5_000_000_000)];
  await post(large, key);
  expect(await post(large, key)).toBe(false);
  expect((await balanceOf(market.db.manager, 'asset.bank')) - before).toBe(5_000_000_000);
  const { accounts } = await readBooks(market.db.manager, 1);
  expect(accounts.find(({ code }) => code === 'asset.bank')?.balanceMinor).toBe(before + 5_000_000_000);
});

test('twenty at once with the same key are one', async () => {
  const entries = [entry('asset.processor', 500), entry('hold.deal:D-2', -500)];
  const done = await Promise.all(Array.from({ length: 20 }, () => post(entries, 'race')));
  expect(done.filter(Boolean)).toHaveLength(1);
  expect(await balanceOf(market.db.manager, 'hold.deal:D-2')).toBe(500);
});

test('opposite transfers at once do not lock each other up', async () => {
  await post([entry('asset.processor', 100_000), entry('hold.deal:D-3', -100_000)]);
  const there = [entry('hold.deal:D-3', 7), entry('income.fee', -7)];
  const back = [entry('income.fee', 7), entry('hold.deal:D-3', -7)];
  await Promise.all(Array.from({ length: 30 }, (_, at) => post(at % 2 ? there : back)));
  expect(await balanceOf(market.db.manager, 'hold.deal:D-3')).toBe(100_000);
});

test('the database refuses what does not balance, at commit', async () => {
  expect(await refusal(post([entry('asset.processor', 10), entry('income.fee', -9)]))).toBe('23514');
  expect(await refusal(post([entry('asset.processor', 10)]))).toBe('23514');
  expect(await refusal(post([]))).toBe('23514');
});

test('the database refuses two currencies in one account, and a transfer that balances only across them', async () => {
  await post([entry('asset.bank', 5), entry('asset.processor', -5)]);
  const mixed = (account: string, currency: string) =>
    market.db.transaction(async (tx) => {
      const id = randomUUID();
      await tx.query(`insert into ledger_transfers (id, kind, idem_key, event_at) values ($1, 'test', $2, now())`, [
        id,
        id,
      ]);
      await tx.query(
        `insert into ledger_accounts (code, currency, normal, min_zero) values ('income.other', 'EUR', 'C', false) on conflict do nothing`,
      );
      const insert = `insert into ledger_entries (transfer_id, account_id, currency, amount) select $1, id, $2, $3 from ledger_accounts where code = $4`;
      await tx.query(insert, [id, 'USD', 5, 'asset.bank']);
      await tx.query(insert, [id, currency, -5, account]);
    });
  expect(await refusal(mixed('asset.processor', 'EUR'))).toBe('23514');
  expect(await refusal(mixed('income.other', 'EUR'))).toBe('23514');
});

test('a hold never pays out more than was paid in', async () => {
  await post([entry('asset.processor', 100), entry('hold.deal:D-4', -100)]);
  expect(await refusal(post([entry('hold.deal:D-4', 101), entry('payable.seller:x', -101)]))).toBe('23514');
  expect(await balanceOf(market.db.manager, 'hold.deal:D-4')).toBe(100);
});

test.each([
  'update ledger_entries set amount = 1',
  'delete from ledger_entries',
  'update ledger_transfers set kind = $$x$$',
  'delete from ledger_transfers',
  'truncate ledger_entries, ledger_transfers, ledger_accounts',
  'delete from ledger_accounts',
])('nobody rewrites the books: %s', async (sql) => {
  expect(await refusal(market.db.query(sql))).toBe('42501');
  // The owner of the tables meets the triggers; truncation of the accounts is refused there too.
  expect(await refusal(market.owner.query(sql))).toBe('42501');
});

test('the application cannot write a balance, open an account with one, or make tables', async () => {
  const account = `insert into ledger_accounts (code, currency, normal, min_zero, balance) values ('hold.deal:x', 'USD', 'C', true, 1)`;
  expect(await refusal(market.db.query('update ledger_accounts set balance = 0'))).toBe('42501');
  expect(await refusal(market.db.query(account))).toBe('42501');
  expect(await refusal(market.db.query('create table mine (id int)'))).toBe('42501');
});

test('whatever is tried in whatever order, the books balance and no hold is overdrawn', async () => {
  const account = fc.constantFrom(
    'asset.processor',
    'hold.deal:P-1',
    'hold.deal:P-2',
    'payable.seller:p',
    'income.fee',
  );
  const move = fc.record({
    from: account,
    to: account,
    amountMinor: fc.integer({ min: 1, max: 1000 }),
    key: fc.integer({ min: 0, max: 1_000_000 }),
    skewMinor: fc.constantFrom(0, 0, 0, 1),
  });
  await fc.assert(
    fc.asyncProperty(fc.array(move, { maxLength: 12 }), async (moves) => {
      const before = await sums();
      let posted = 0;
      for (const { from, to, amountMinor, key, skewMinor } of moves) {
        const entries = [entry(from, amountMinor + skewMinor), entry(to, -amountMinor)];
        if (await post(entries, `move:${from}:${to}:${amountMinor}:${skewMinor}:${key}`).catch(() => false))
          posted += 1;
      }
      expect(await sums()).toEqual({
        entries: before.entries + 2 * posted,
        transfers: before.transfers + posted,
        off: 0,
        drift: 0,
      });
      const [below]: { n: number }[] = await market.db.query(
        'select count(*)::int as n from ledger_accounts where min_zero and balance < 0',
      );
      expect(below!.n).toBe(0);
    }),
    { numRuns: 25 },
  );
});
