import { transactionNow } from './balances.ts';
import type { Row } from './kinds.ts';

/** An object as the API shows it now: what depends on the clock is worked out, hidden fields stay away. */
export function presentRow(row: Row, nowS: number): object {
  return present(row.value, nowS);
}

/** The same for a bare object or a list of objects. */
export function present(answer: object, nowS: number): object {
  if ('object' in answer && answer.object === 'list' && 'data' in answer) {
    return { ...answer, data: (answer.data as object[]).map((item) => present(item, nowS)) };
  }
  if ('object' in answer && answer.object === 'balance_transaction') return transactionNow(answer as never, nowS);
  return answer;
}
