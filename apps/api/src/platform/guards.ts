import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import helmet from 'helmet';
import { AppError } from './app-error.ts';

/** The clients send it with every unsafe call; a form or link of another site cannot. */
export const clientHeader = 'x-lydite-client';
const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

export const requestId: RequestHandler = (req, res, next) => {
  req.id = randomUUID();
  res.set('X-Request-Id', String(req.id));
  next();
};

export const securityHeaders: RequestHandler = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: {
      defaultSrc: ["'none'"],
      scriptSrc: ["'self'"],
      styleSrc: ["'self'"],
      imgSrc: ["'self'", 'blob:'],
      fontSrc: ["'self'"],
      connectSrc: ["'self'"],
      manifestSrc: ["'self'"],
      workerSrc: ["'self'"],
      baseUri: ["'none'"],
      objectSrc: ["'none'"],
      formAction: ["'self'"],
      frameAncestors: ["'none'"],
    },
  },
  crossOriginResourcePolicy: { policy: 'same-origin' },
  referrerPolicy: { policy: 'no-referrer' },
  strictTransportSecurity: { maxAge: 31_536_000, includeSubDomains: true },
});

/** Answers of the API are private: nothing keeps them. Files set their own rule. */
export const noStore: RequestHandler = (_req, res, next) => {
  res.set('Cache-Control', 'no-store');
  next();
};

export const refuseTrace: RequestHandler = (req, _res, next) => {
  if (req.method === 'TRACE' || req.method === 'TRACK')
    throw new AppError('route.not_found', 'There is nothing at this address.');
  next();
};

/** Repeated query parameters are refused instead of the first or last one winning. */
export const refuseRepeatedQuery: RequestHandler = (req, _res, next) => {
  for (const [name, value] of Object.entries(req.query))
    if (Array.isArray(value))
      throw new AppError('request.invalid', `The parameter ${name} is given twice.`, {
        fields: [{ path: name, message: 'Give it once.' }],
      });
  next();
};

/**
 * Refuses unsafe calls that did not come from our own pages: wants the clients' header, a same-origin `Sec-Fetch-Site`
 * (or, from a browser too old to send it, our own `Origin`), and JSON or multipart. Signed webhooks are mounted before it.
 */
export const refuseCrossSite =
  (publicUrl: string): RequestHandler =>
  (req, _res, next) => {
    if (safeMethods.has(req.method)) return next();
    const site = req.get('sec-fetch-site');
    const origin = req.get('origin');
    const sameOrigin = site ? site === 'same-origin' : !origin || origin === new URL(publicUrl).origin;
    if (!sameOrigin || !req.get(clientHeader))
      throw new AppError('request.cross_site', 'This call must come from the market’s own pages.');
    const hasBody = Number(req.get('content-length') ?? 0) > 0 || req.get('transfer-encoding') !== undefined;
    if (hasBody && !req.is(['application/json', 'multipart/form-data']))
      throw new AppError('request.unsupported', 'Send JSON, or multipart form data for uploads.');
    next();
  };

/** A general brake per address; sign-in and bids have closer ones of their own. The processor's signed events are let through. */
export const brake = ({ perMinute, on }: { perMinute: number; on: boolean }): RequestHandler =>
  rateLimit({
    windowMs: 60_000,
    limit: perMinute,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    skip: (req) => !on || req.path.startsWith('/webhooks/'),
    handler: () => {
      throw new AppError('request.too_many', 'Too many requests from this address. Wait a minute.', {
        context: { retryAfterS: 60 },
      });
    },
  });
