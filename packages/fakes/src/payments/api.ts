import express, { type NextFunction, type Request, type Response, type Router } from 'express';
import { expand } from './expand.ts';
import { ProcessorError } from './errors.ts';
import { API_VERSION } from './events.ts';
import { takeFault } from './faults.ts';
import { fingerprintOf, type KeyedAnswers } from './idempotency.ts';
import { newId } from './ids.ts';
import { readParameters } from './parameters.ts';
import { present } from './present.ts';
import { allRoutes } from './resources/all-routes.ts';
import type { Route } from './route.ts';
import type { Store } from './store.ts';
import { clockS, type PaymentsSettings, type Work } from './work.ts';

export interface ApiParts {
  store: Store;
  settings: PaymentsSettings;
  answers: KeyedAnswers;
  /** Called after each commit, so that deliveries and tasks that are due start at once. */
  committed: () => void;
}

interface Answer {
  status: number;
  body: string;
  notExecuted: boolean;
}

/** The `/v1` API: form bodies in, the processor's JSON out, everything else its 404. */
export function createApi(parts: ApiParts): Router {
  const api = express.Router();
  api.use(express.urlencoded({ extended: true, limit: '1mb' }));
  api.use(stampHeaders, requireKey);
  for (const route of allRoutes) {
    api[route.method.toLowerCase() as 'get'](route.path, (req, res) => answer(parts, route, { req, res }));
  }
  api.use((req: Request) => {
    const message = `Unrecognized request URL (${req.method}: ${req.originalUrl.split('?')[0]}).`;
    throw new ProcessorError(404, { type: 'invalid_request_error', message });
  });
  api.use((error: unknown, _req: Request, res: Response, _next: NextFunction) => send(res, toAnswer(error)));
  return api;
}

function stampHeaders(req: Request, res: Response, next: NextFunction): void {
  const key = req.get('idempotency-key');
  res.set({ 'Request-Id': newId('req', 14), 'Stripe-Version': req.get('stripe-version') ?? API_VERSION });
  if (key && req.method === 'POST') res.set('Idempotency-Key', key);
  const account = req.get('stripe-account');
  if (account) res.set('Stripe-Account', account);
  next();
}

/** Any key will do here, as long as there is one. */
function requireKey(req: Request, _res: Response, next: NextFunction): void {
  const header = req.get('authorization') ?? '';
  const basic = header.startsWith('Basic ') ? Buffer.from(header.slice(6), 'base64').toString().split(':')[0] : '';
  const key = header.startsWith('Bearer ') ? header.slice(7) : basic;
  if (!key) {
    throw new ProcessorError(401, { type: 'invalid_request_error', message: 'You did not provide an API key.' });
  }
  next();
}

async function answer(parts: ApiParts, route: Route, { req, res }: { req: Request; res: Response }): Promise<void> {
  const work = toWork(parts, req, res);
  const fault = takeFault(parts.store, { method: req.method, path: req.originalUrl.split('?')[0] ?? '' });
  if (fault?.kind === 'unavailable') return send(res, plainError(503, 'The processor is not available.'));
  if (fault?.kind === 'rate_limit') return send(res, plainError(429, 'Too many requests.', 'rate_limit'));
  const input: unknown = req.method === 'POST' ? req.body : req.query;
  const run = () => {
    if (fault?.kind === 'fail_before_commit') return plainError(500, 'An unknown error occurred.');
    return execute(work, route, { input, at: req.params as Record<string, string> });
  };
  const key = req.method === 'POST' ? work.request.idempotency_key : null;
  const delayMs = fault?.kind === 'slow' ? fault.delayMs : 0;
  const first = key
    ? await parts.answers.answerOnce({ key, fingerprint: fingerprintOf(req, input), work, delayMs, run })
    : { ...(await delayed(delayMs, run)), replayed: false };
  parts.committed();
  if (fault?.kind === 'lose_answer') return void req.socket.destroy();
  if (first.replayed) res.set('Idempotent-Replayed', 'true');
  send(res, first);
}

async function delayed<T>(delayMs: number, run: () => T): Promise<T> {
  if (delayMs > 0) await new Promise((resolve) => setTimeout(resolve, delayMs));
  return run();
}

function toWork({ store, settings }: ApiParts, req: Request, res: Response): Work {
  const owner = req.get('stripe-account') ?? null;
  if (owner && !store.find('account', owner)) {
    const message = `The provided key does not have access to account '${owner}' (or that account does not exist).`;
    throw new ProcessorError(403, { type: 'invalid_request_error', code: 'account_invalid', message });
  }
  const request = { id: String(res.get('Request-Id')), idempotency_key: req.get('idempotency-key') ?? null };
  return { store, settings, nowS: clockS(store), owner, request };
}

function execute(work: Work, route: Route, { input, at }: { input: unknown; at: Record<string, string> }): Answer {
  try {
    return work.store.atomically(() => {
      const params = readParameters(route.schema, input) as { expand?: string[] };
      const result = present(route.run(work, params as never, at), work.nowS);
      const body = JSON.stringify(expand(work, result, params.expand ?? []), null, 2);
      return { status: 200, body, notExecuted: false };
    });
  } catch (error) {
    return toAnswer(error);
  }
}

function toAnswer(error: unknown): Answer {
  if (error instanceof ProcessorError) {
    const { status, notExecuted } = error;
    return { status, body: JSON.stringify({ error: error.body }, null, 2), notExecuted };
  }
  process.stderr.write(`${error instanceof Error ? error.stack : String(error)}\n`);
  return plainError(500, 'The stand-in failed; its own log says why.');
}

function plainError(status: number, message: string, code?: string): Answer {
  const type = status === 429 ? 'invalid_request_error' : 'api_error';
  return { status, body: JSON.stringify({ error: { type, message, ...(code && { code }) } }), notExecuted: false };
}

function send(res: Response, { status, body }: { status: number; body: string }): void {
  res.status(status).type('application/json').send(body);
}
