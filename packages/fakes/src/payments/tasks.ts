import type { Row, TaskName } from './kinds.ts';
import { openDispute } from './resources/disputes.ts';
import { landPayout, payOut } from './resources/payouts.ts';
import { failRefund, settleRefund } from './resources/refunds.ts';
import { endDebit, expireSession } from './sessions.ts';
import type { Store } from './store.ts';
import { clockS, type PaymentsSettings, type Work } from './work.ts';

/** The work of something nobody asked for by request: a task, a button of the control page. */
export function workAs(parts: { store: Store; settings: PaymentsSettings }, owner: string | null): Work {
  return { ...parts, nowS: clockS(parts.store), owner, request: { id: null, idempotency_key: null } };
}

/** Does every task that is due, each in one commit with its own removal, until none is due. */
export function runDueTasks(parts: { store: Store; settings: PaymentsSettings }): void {
  for (;;) {
    const nowS = clockS(parts.store);
    const due = parts.store.all('task').filter(({ value }) => value.dueAtS <= nowS);
    if (due.length === 0) return;
    for (const task of due.toSorted((a, b) => a.value.dueAtS - b.value.dueAtS)) {
      parts.store.atomically(() => {
        parts.store.remove('task', task.id);
        runSafely(() => parts.store.atomically(() => runTask(parts, task)));
      });
    }
  }
}

/** A task that is no longer possible, such as a dispute of a refunded charge, is reported and gone. */
function runSafely(run: () => void): void {
  try {
    run();
  } catch (error) {
    process.stderr.write(`A planned task was not possible: ${String(error)}\n`);
  }
}

const ownerOf: Record<TaskName, (store: Store, subject: string) => string | null> = {
  'open-dispute': (store, id) => store.row('charge', id)?.owner ?? null,
  'expire-session': (store, id) => store.row('checkout.session', id)?.owner ?? null,
  'fail-refund': (store, id) => store.row('refund', id)?.owner ?? null,
  'settle-refund': (store, id) => store.row('refund', id)?.owner ?? null,
  'pay-out': (_, account) => account,
  'land-payout': (store, id) => store.row('payout', id)?.owner ?? null,
  'settle-debit': (store, id) => store.row('payment_intent', id)?.owner ?? null,
  'fail-debit': (store, id) => store.row('payment_intent', id)?.owner ?? null,
};

function runTask(parts: { store: Store; settings: PaymentsSettings }, { value }: Row<'task'>): void {
  const { name, subject } = value;
  const work = workAs(parts, ownerOf[name](parts.store, subject));
  const run: Record<TaskName, () => unknown> = {
    'open-dispute': () => openDispute(work, subject),
    'expire-session': () => {
      const session = parts.store.find('checkout.session', subject);
      return session?.status === 'open' && expireSession(work, session);
    },
    'fail-refund': () => failRefund(work, subject),
    'settle-refund': () => settleRefund(work, subject),
    'pay-out': () => payOut(work),
    'land-payout': () => landPayout(work, subject),
    'settle-debit': () => endDebit(work, subject, 'settled'),
    'fail-debit': () => endDebit(work, subject, 'failed'),
  };
  run[name]();
}
