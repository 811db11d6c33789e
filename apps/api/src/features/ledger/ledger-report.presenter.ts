import type { LedgerReport } from '@lydite/contracts';
import type { Words } from '../../platform/words.ts';

/** The report as a terminal shows it: each check with its finding, then the accounts in two columns. */
export function toReportText({ checks, accounts, balanced }: LedgerReport, { money }: Pick<Words, 'money'>): string {
  const found = checks.map(({ ok, name, detail }) => `${ok ? 'ok  ' : 'OFF '} ${name}${detail ? `: ${detail}` : ''}`);
  const width = Math.max(0, ...accounts.map(({ code }) => code.length));
  const balances = accounts.map(({ code, side, balanceMinor }) => {
    const amount = money(balanceMinor).padStart(16);
    return `${code.padEnd(width)} ${side === 'debit' ? amount : `${' '.repeat(16)} ${amount}`}`;
  });
  const head = `${'account'.padEnd(width)} ${'debit'.padStart(16)} ${'credit'.padStart(16)}`;
  return [...found, '', head, ...balances, '', balanced ? 'The ledger balances.' : 'The ledger is off.'].join('\n');
}
