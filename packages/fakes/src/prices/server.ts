import express, { type NextFunction, type Request, type Response } from 'express';
import { z } from 'zod';
import { listen, type Listening, type Running } from '../listen.ts';
import { latestPrice, referencePrices } from './series.ts';

export interface PricesOptions extends Listening {
  now?: () => Date;
}

const YEAR_MS = 366 * 86_400_000;

/** A day means its beginning in `from` and its end in `to`; a full time is taken as it is. */
const moment = (endOfDay: string) =>
  z.union([
    z.iso.date().transform((day) => new Date(`${day}T${endOfDay}Z`)),
    z.iso.datetime({ offset: true }).transform((at) => new Date(at)),
  ]);

const span = z.object({ from: moment('00:00:00').optional(), to: moment('23:59:59.999').optional() });

/** Starts the price service: `/v1/gold?from&to` (the year up to now, or a part of it) and `/v1/gold/latest`. */
export async function startPrices({ now = () => new Date(), ...where }: PricesOptions): Promise<Running> {
  const app = express().disable('x-powered-by');
  app.get('/v1/gold/latest', (_req, res) => void res.json(latestPrice(now())));
  app.get('/v1/gold', (req, res) => {
    const { from, to } = span.parse(req.query);
    // Nobody is told a price that has not been set yet, nor one older than the series.
    const end = to && to < now() ? to : now();
    const beginning = new Date(now().getTime() - YEAR_MS);
    res.json({ prices: referencePrices(from && from > beginning ? from : beginning, end) });
  });
  app.use((req, res) => void res.status(404).json({ error: { message: `Nothing at ${req.path}.` } }));
  app.use((error: unknown, _req: Request, res: Response, _next: NextFunction) => {
    const isBad = error instanceof z.ZodError;
    const message =
      error instanceof z.ZodError ? z.prettifyError(error) : error instanceof Error ? error.message : 'Unknown';
    res.status(isBad ? 400 : 500).json({ error: { message } });
  });
  return listen(app, where);
}
