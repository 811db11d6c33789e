import express, { type Request, type Response, type Router } from 'express';
import { z } from 'zod';
import { html } from '../../pages/html.ts';
import { idOf, newId } from '../ids.ts';
import { answerAtBank, pay } from '../sessions.ts';
import type { Store } from '../store.ts';
import { workAs } from '../tasks.ts';
import { testMethod } from '../test-methods.ts';
import { clockS, type PaymentsSettings } from '../work.ts';
import { sendOverview } from './overview-page.ts';
import { lastProblem, sendBankPage, sendClosedPage, sendPayPage, successAddress } from './pay-page.ts';
import { finishSetup, sendSetupPage, setupForm } from './setup-page.ts';
import { sendProcessorPage } from './shell.ts';

interface PageParts {
  store: Store;
  settings: PaymentsSettings;
  committed: () => void;
}

const VISIT_LIFE_S = 3_600;
const payForm = z.object({ method: z.string() });

/** The pages people see: paying, the bank's question, a seller's set-up, and the overview. */
export function createHostedPages(parts: PageParts): Router {
  const pages = express.Router();
  pages.use(express.urlencoded({ extended: false }));
  pages.get('/', (_req, res) => sendOverview(res, workAs(parts, null)));
  pages.get('/pay/:id', (req, res) => showPay(parts, req, res));
  pages.post('/pay/:id', (req, res) => takePay(parts, req, res));
  pages.get('/authenticate/:id', (req, res) => showBank(parts, req, res));
  pages.post('/authenticate/:id', (req, res) => takeBank(parts, req, res));
  pages.get('/setup/:id', (req, res) => showSetup(parts, req, res));
  pages.post('/setup/:id', (req, res) => takeSetup(parts, req, res));
  pages.use((_req, res) => sendNotFound(res));
  return pages;
}

function sendNotFound(res: Response): undefined {
  sendProcessorPage(res, { title: 'No such page', status: 404, body: html`<h1>No such page</h1>` });
}

function openSession({ store }: PageParts, req: Request, res: Response) {
  const session = store.find('checkout.session', String(req.params.id));
  if (!session) return sendNotFound(res);
  if (session.status === 'open') return session;
  sendClosedPage(res, session);
  return undefined;
}

function showPay(parts: PageParts, req: Request, res: Response): void {
  const session = openSession(parts, req, res);
  if (session) sendPayPage(res, parts.store, { session, problem: lastProblem(parts.store, session) });
}

function takePay(parts: PageParts, req: Request, res: Response): void {
  const session = openSession(parts, req, res);
  if (!session) return;
  const { store, settings } = parts;
  const method = testMethod(payForm.safeParse(req.body).data?.method ?? '');
  if (!method) return sendPayPage(res, store, { session, problem: 'Choose one of the test cards.' });
  const work = workAs(parts, store.row('checkout.session', session.id)?.owner ?? null);
  const result = store.atomically(() => pay(work, session, method.name));
  parts.committed();
  if (result.step === 'done') return res.redirect(303, successAddress(session));
  if (result.step === 'declined') return res.redirect(303, `${settings.publicUrl}/pay/${session.id}`);
  const intent = idOf(store.find('checkout.session', session.id)?.payment_intent);
  res.redirect(303, `${settings.publicUrl}/authenticate/${intent}`);
}

function askedIntent({ store }: PageParts, req: Request, res: Response) {
  const intent = store.find('payment_intent', String(req.params.id));
  if (!intent || intent.status !== 'requires_action') return sendNotFound(res);
  const session = store.all('checkout.session').find(({ value }) => value.payment_intent === intent.id)?.value;
  return { intent, session, returnUrl: intent.next_action?.redirect_to_url?.return_url ?? null };
}

function showBank(parts: PageParts, req: Request, res: Response): void {
  const asked = askedIntent(parts, req, res);
  if (asked) sendBankPage(res, asked.intent, [asked.session?.success_url, asked.returnUrl]);
}

function takeBank(parts: PageParts, req: Request, res: Response): void {
  const asked = askedIntent(parts, req, res);
  if (!asked) return;
  const { store } = parts;
  const answer = (req.body as { answer?: unknown } | undefined)?.answer === 'approve' ? 'approve' : 'refuse';
  const work = workAs(parts, store.row('payment_intent', asked.intent.id)?.owner ?? null);
  const session = store.atomically(() => answerAtBank(work, asked.intent, answer));
  parts.committed();
  if (session?.status === 'complete') return res.redirect(303, successAddress(session));
  const back = new URL(asked.returnUrl ?? `${parts.settings.publicUrl}/`);
  if (!session) {
    back.searchParams.set('payment_intent', asked.intent.id);
    back.searchParams.set('redirect_status', answer === 'approve' ? 'succeeded' : 'failed');
  }
  res.redirect(303, back.toString());
}

function showSetup(parts: PageParts, req: Request, res: Response): void {
  const { store, settings } = parts;
  const visit = store.find('visit', String(req.params.id));
  const account = store.find('account', visit?.account ?? '');
  if (!visit || !account) return sendNotFound(res);
  if (visit.step === 'used' || visit.expiresAtS < clockS(store)) return res.redirect(303, visit.refreshUrl);
  if (visit.step === 'visit') return sendSetupPage(res, { account, visit });
  const next = { ...visit, id: newId('visit', 32), step: 'visit' as const, expiresAtS: clockS(store) + VISIT_LIFE_S };
  store.atomically(() => {
    store.put('visit', { ...visit, step: 'used' });
    store.put('visit', next);
  });
  res.redirect(303, `${settings.publicUrl}/setup/${next.id}`);
}

function takeSetup(parts: PageParts, req: Request, res: Response): void {
  const { store } = parts;
  const visit = store.find('visit', String(req.params.id));
  const account = store.find('account', visit?.account ?? '');
  if (!visit || !account || visit.step === 'link') return sendNotFound(res);
  if (visit.step === 'used') return res.redirect(303, visit.returnUrl);
  const form = setupForm.safeParse(req.body);
  if (!form.success) return sendSetupPage(res, { account, visit, problem: 'Enter a name and choose a bank account.' });
  store.atomically(() => {
    store.put('visit', { ...visit, step: 'used' });
    finishSetup(workAs(parts, null), account, form.data);
  });
  parts.committed();
  res.redirect(303, visit.returnUrl);
}
