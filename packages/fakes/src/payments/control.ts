import express, { type Request, type Response, type Router } from 'express';
import { z } from 'zod';
import { completeAccount, setBankAccount } from './accounts.ts';
import { ProcessorError, missing } from './errors.ts';
import { queueDelivery } from './events.ts';
import { newId } from './ids.ts';
import { requestFaults, webhookFaults, type Kind } from './kinds.ts';
import { closeDispute, openDispute } from './resources/disputes.ts';
import { failPayout } from './resources/payouts.ts';
import { failRefund } from './resources/refunds.ts';
import { endDebit } from './sessions.ts';
import type { Store } from './store.ts';
import { workAs } from './tasks.ts';
import { clockS, type PaymentsSettings, type Work } from './work.ts';

const faultInput = z.strictObject({
  kind: z.enum([...requestFaults, ...webhookFaults, 'payout_fail']),
  method: z.string().nullable().default(null),
  path: z.string().nullable().default(null),
  event: z.string().nullable().default(null),
  times: z.coerce.number().int().min(1).default(1),
  delayMs: z.coerce.number().int().min(0).default(1_000),
});

const clockInput = z.strictObject({ advanceSeconds: z.coerce.number().int().min(0) });

interface ControlParts {
  store: Store;
  settings: PaymentsSettings;
  /** Does what has come due, after every change. */
  committed: () => void;
}

/** The control API under `/_control`: what a test or a person does to the processor that no client may. */
export function createControl(parts: ControlParts): Router {
  const { store } = parts;
  const control = express.Router();
  control.use(express.json(), express.urlencoded({ extended: false }));
  control.get('/objects/:kind', (req, res) => {
    res.json(store.all(req.params.kind as Kind).map(({ value, owner }) => ({ ...value, owner })));
  });
  control.get('/clock', (_req, res) => void res.json({ nowS: clockS(store) }));
  control.post('/clock', (req, res) => {
    const { advanceSeconds } = clockInput.parse(req.body);
    store.put('clock', { id: 'clock', aheadS: (store.find('clock', 'clock')?.aheadS ?? 0) + advanceSeconds });
    parts.committed();
    res.json({ nowS: clockS(store) });
  });
  control.get('/faults', (_req, res) => void res.json(store.all('fault').map(({ value }) => value)));
  control.post('/faults', (req, res) => {
    res.status(201).json(store.put('fault', { id: newId('fault'), ...faultInput.parse(req.body) }));
  });
  control.delete('/faults', (_req, res) => {
    for (const { id } of store.all('fault')) store.remove('fault', id);
    res.status(204).end();
  });
  for (const [path, kind, run] of actions) {
    control.post(path, (req, res) => act(parts, { kind, run, req, res }));
  }
  return control;
}

type Action = (work: Work, id: string, body: Record<string, unknown>) => unknown;

const resultInput = z.enum(['won', 'lost']);

const actions: [path: string, kind: Kind, run: Action][] = [
  ['/charges/:id/dispute', 'charge', (work, id) => openDispute(work, id)],
  ['/disputes/:id/close', 'dispute', (work, id, { result }) => closeDispute(work, id, resultInput.parse(result))],
  ['/payouts/:id/fail', 'payout', (work, id) => failPayout(work, id)],
  ['/refunds/:id/fail', 'refund', (work, id) => failRefund(work, id)],
  ['/payment_intents/:id/settle', 'payment_intent', (work, id) => endDebit(work, id, 'settled')],
  ['/payment_intents/:id/fail', 'payment_intent', (work, id) => endDebit(work, id, 'failed')],
  ['/events/:id/redeliver', 'event', redeliver],
  ['/accounts/:id/complete', 'account', complete],
];

/** Runs one action in one commit; a form of the overview page is led back to it, others get the object. */
function act(
  parts: ControlParts,
  { kind, run, req, res }: { kind: Kind; run: Action; req: Request; res: Response },
): void {
  const id = String(req.params.id);
  const row = parts.store.row(kind, id);
  if (!row) throw missing(kind, id);
  const body = (req.body ?? {}) as Record<string, unknown>;
  parts.store.atomically(() => run(workAs(parts, row.owner), id, body));
  parts.committed();
  if (req.is('application/x-www-form-urlencoded')) return res.redirect(303, `${parts.settings.publicUrl}/`);
  res.json(parts.store.find(kind, id));
}

function redeliver(work: Work, id: string): void {
  const sent = new Set(work.store.all('delivery').flatMap(({ value }) => (value.event === id ? [value.endpoint] : [])));
  for (const endpoint of sent) queueDelivery(work, id, endpoint);
}

/** Completes an account's set-up without the page; the bank account is the one that works unless named. */
function complete(work: Work, id: string, { accountNumber }: Record<string, unknown>): void {
  const account = work.store.find('account', id)!;
  const holder = account.business_profile?.name ?? null;
  const number = z.string().default('000123456789').parse(accountNumber);
  setBankAccount(work, account, { accountNumber: number, routingNumber: '110000000', holder });
  completeAccount(work, account);
}

/** Turns an error of the control API into its answer. */
export function sendControlError(error: unknown, res: Response): void {
  const isBad = error instanceof z.ZodError;
  const status = error instanceof ProcessorError ? error.status : isBad ? 400 : 500;
  const message = isBad ? z.prettifyError(error) : error instanceof Error ? error.message : String(error);
  res.status(status).json({ error: { message } });
}
