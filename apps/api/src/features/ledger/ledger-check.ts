import type { LedgerReport } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import type { BalanceTransaction } from '../../platform/payments.ts';
import { createWords, type Words } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { bookChecks, exceptionsTo, readBooks, type Books } from './book-checks.queries.ts';
import { compareMovements, marginDays, matchedDays } from './processor-checks.rules.ts';

type Parts = Pick<World, 'db' | 'payments'>;
type Check = LedgerReport['checks'][number];

const dayMs = 86_400_000;

/**
 * Proves that the books balance in themselves, with the deals, and with the processor. Changes nothing. What moved at the
 * processor within `patienceMs` and is not posted yet counts as on its way.
 */
export async function checkLedger({ db, payments }: Parts, { patienceMs = 120_000 } = {}): Promise<LedgerReport> {
  const { books, checks, words } = await db.transaction('REPEATABLE READ', async (tx) => ({
    books: await readBooks(tx, matchedDays + 2 * marginDays),
    checks: await checkBooks(tx),
    words: createWords(await marketTerms(tx)),
  }));
  const processor = await askProcessor(payments, books.now);
  if (processor) checks.push(...checkProcessor({ books, words, patienceMs, ...processor }));
  else checks.push({ name: 'The payment processor answers', ok: false, detail: 'It does not answer.' });
  return {
    checkedAt: books.now.toISOString(),
    balanced: checks.every(({ ok }) => ok),
    checks,
    accounts: books.accounts,
    processor: processor?.balance ?? null,
  };
}

async function checkBooks(tx: EntityManager): Promise<Check[]> {
  const words = createWords(await marketTerms(tx));
  const checks: Check[] = [];
  for (const check of bookChecks) {
    const exceptions = await exceptionsTo(tx, check);
    const lines = exceptions.map(({ what, offMinor }) => `${what} is off by ${words.money(offMinor)}`);
    checks.push({ name: check.name, ok: lines.length === 0, detail: inShort(lines) });
  }
  return checks;
}

/** The first few, and how many more. */
const inShort = (lines: string[], most = 3): string =>
  [...lines.slice(0, most), ...(lines.length > most ? [`and ${lines.length - most} more`] : [])].join('; ');

interface ProcessorSide {
  balance: NonNullable<LedgerReport['processor']>;
  seen: BalanceTransaction[];
}

/** The processor is asked after the books are read: what it has more can then only be younger. */
async function askProcessor(payments: World['payments'], now: Date): Promise<ProcessorSide | null> {
  try {
    const since = new Date(now.getTime() - (matchedDays + marginDays) * dayMs);
    const seen: BalanceTransaction[] = [];
    for await (const one of payments.balanceTransactions(since)) seen.push(one);
    return { balance: await payments.balance(), seen };
  } catch (error) {
    if (error instanceof AppError) return null;
    throw error;
  }
}

interface BothSides extends ProcessorSide {
  books: Books;
  words: Words;
  patienceMs: number;
}

function checkProcessor({ books, balance, seen, words, patienceMs }: BothSides): Check[] {
  const { missing, unknown, onItsWayMinor } = compareMovements({ seen, patienceMs, ...books });
  const theirsMinor = balance.availableMinor + balance.pendingMinor;
  const offMinor = books.processorMinor + onItsWayMinor - theirsMinor;
  const onItsWay = onItsWayMinor === 0 ? '' : `, ${words.money(onItsWayMinor)} on its way into the books`;
  return [
    {
      name: 'The processor holds what the books say',
      ok: offMinor === 0,
      detail:
        offMinor === 0
          ? `${words.money(theirsMinor)}${onItsWay}`
          : `Books ${words.money(books.processorMinor)}, processor ${words.money(theirsMinor)}${onItsWay}`,
    },
    {
      name: 'Every movement at the processor is posted once',
      ok: missing.length === 0,
      detail:
        missing.length === 0
          ? `${seen.length} movements`
          : inShort(
              missing.map(({ id, kind, netMinor }) => `${kind} ${id} over ${words.money(netMinor)} is not posted`),
            ),
    },
    {
      name: 'Every posting on the processor’s account is known there',
      ok: unknown.length === 0,
      detail: unknown.length === 0 ? `${books.posted.length} postings` : inShort(unknown),
    },
  ];
}

/** The nightly proof: a difference is an alarm. */
export async function alarmOnDifference(world: Parts & Pick<World, 'log'>): Promise<void> {
  const { balanced, checks } = await checkLedger(world);
  if (balanced) world.log.info('the ledger check found no difference');
  else world.log.error({ checks: checks.filter(({ ok }) => !ok) }, 'the ledger check found a difference');
}
