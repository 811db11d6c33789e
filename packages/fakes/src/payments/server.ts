import express, { type NextFunction, type Request, type Response } from 'express';
import { createApi } from './api.ts';
import { createControl, sendControlError } from './control.ts';
import { createDeliveries } from './deliveries.ts';
import { createHostedPages } from './hosted/hosted-pages.ts';
import { createKeyedAnswers } from './idempotency.ts';
import { listen, type Listening, type Running } from '../listen.ts';
import { Store } from './store.ts';
import { runDueTasks } from './tasks.ts';
import type { PaymentsSettings } from './work.ts';

export interface PaymentsOptions extends Listening, Partial<PaymentsSettings> {
  /** Folder of the journal; made when missing. */
  dir: string;
}

const TICK_MS = 250;

/**
 * Starts the payment processor's local stand-in: API, hosted pages, overview, control API, webhooks.
 * Its days are short: unless told otherwise, funds turn available after 15 s and payouts land after 3 s.
 */
export async function startPayments(options: PaymentsOptions): Promise<Running> {
  const store = new Store(options.dir);
  const app = express();
  const running = await listen(app, options);
  const settings: PaymentsSettings = {
    publicUrl: (options.publicUrl ?? `http://localhost:${running.port}`).replace(/\/$/, ''),
    fundsDelayS: options.fundsDelayS ?? 15,
    payoutDelayS: options.payoutDelayS ?? 3,
  };
  const deliveries = createDeliveries(store);
  const committed = () => {
    runDueTasks({ store, settings });
    deliveries.sendDue();
  };
  app.disable('x-powered-by').set('query parser', 'extended');
  app.use('/v1', createApi({ store, settings, answers: createKeyedAnswers(store), committed }));
  app.use('/_control', createControl({ store, settings, committed }));
  app.use(createHostedPages({ store, settings, committed }));
  app.use((error: unknown, _req: Request, res: Response, _next: NextFunction) => sendControlError(error, res));
  const ticking = setInterval(committed, TICK_MS);
  return {
    port: running.port,
    async close() {
      clearInterval(ticking);
      await running.close();
      await deliveries.stop();
      store.close();
    },
  };
}
