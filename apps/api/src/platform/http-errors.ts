import { errorStatus, type ErrorCode, type ProblemBody } from '@lydite/contracts';
import type { ErrorRequestHandler, RequestHandler } from 'express';
import { MulterError } from 'multer';
import { AppError } from './app-error.ts';
import type { Log } from './log.ts';

const titles: Record<number, string> = {
  400: 'The request is not right',
  401: 'Sign in first',
  403: 'Not allowed',
  404: 'Not found',
  409: 'Things have changed',
  410: 'No longer good',
  413: 'Too large',
  415: 'Not a kind we take',
  422: 'Cannot be done with this',
  429: 'Too many at once',
  503: 'Not available right now',
};

export const notFound: RequestHandler = () => {
  throw new AppError('route.not_found', 'There is nothing at this address.');
};

/** Errors of the parsers and of multer, said in our own words. */
function asAppError(error: unknown): AppError | undefined {
  if (error instanceof AppError) return error;
  if (error instanceof MulterError) {
    if (error.code === 'LIMIT_FILE_SIZE')
      return new AppError(
        'photo.too_large',
        'This file is larger than 25 MB. Take the photo at a lower resolution or choose another.',
      );
    return new AppError('request.invalid', 'Send one photo per request, in the field named photo.');
  }
  const { type, status } = error as { type?: string; status?: number };
  if (type === 'entity.too.large') return new AppError('request.too_large', 'This request is larger than 256 kB.');
  if (type === 'entity.parse.failed') return new AppError('request.invalid', 'The body is not valid JSON.');
  if (status === 400) return new AppError('request.invalid', 'The request cannot be read.');
  if (status === 415) return new AppError('request.unsupported', 'This encoding is not supported.');
  return undefined;
}

/** The one place that turns an error into an answer: expected ones as they are, unknown ones masked and logged with the request id. */
export const sendError =
  (log: Log): ErrorRequestHandler =>
  (error: unknown, req, res, next) => {
    const known = asAppError(error);
    const requestId = String(req.id);
    if (known)
      log.info(
        { requestId, code: known.code, actorId: res.locals.actor?.id, method: req.method, path: req.path, ip: req.ip },
        'refused',
      );
    else log.error({ requestId, err: error, method: req.method, path: req.path }, 'failed');
    if (res.headersSent) return next(error);
    const code: ErrorCode = known?.code ?? 'internal';
    const status = errorStatus[code];
    const body: ProblemBody = {
      type: `/problems/${code}`,
      title: titles[status] ?? 'Something went wrong',
      status,
      code,
      detail:
        known?.message ??
        `Something went wrong on our side. Nothing was changed. If it stays, write to us with the number ${requestId}.`,
      requestId,
      fields: known?.fields ?? [],
      ...(known?.context ? { context: known.context } : {}),
    };
    const wait = known?.context?.retryAfterS;
    if (typeof wait === 'number') res.set('Retry-After', String(Math.ceil(wait)));
    res.status(status).set('Cache-Control', 'no-store').type('application/problem+json').send(JSON.stringify(body));
  };
