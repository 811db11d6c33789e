import type { KeepsChanges } from './store.ts';

/** The body of the processor's own error object. */
export interface ErrorBody {
  type: 'card_error' | 'invalid_request_error' | 'idempotency_error' | 'api_error';
  message: string;
  code?: string;
  decline_code?: string;
  param?: string;
  charge?: string;
  payment_intent?: unknown;
}

interface Options {
  /** What was written before the error stays: declines do, refusals do not. */
  keepsChanges?: boolean;
  /** The request never began to execute, so its idempotency key stays free. */
  notExecuted?: boolean;
}

/** An answer of the processor other than success, with its HTTP status. */
export class ProcessorError extends Error implements KeepsChanges {
  readonly status: number;
  readonly body: ErrorBody;
  readonly keepsChanges: boolean;
  readonly notExecuted: boolean;

  constructor(status: number, body: ErrorBody, options: Options = {}) {
    super(body.message);
    this.status = status;
    this.body = body;
    this.keepsChanges = options.keepsChanges ?? false;
    this.notExecuted = options.notExecuted ?? false;
  }
}

/** 400 for a parameter that is missing, unknown or malformed. */
export function badParameter(code: string, message: string, param?: string): ProcessorError {
  const body: ErrorBody = { type: 'invalid_request_error', code, message, ...(param && { param }) };
  return new ProcessorError(400, body, { notExecuted: true });
}

/** 400 for a request that is well formed but not possible in the object's present state. */
export function refused(code: string, message: string, more: Partial<ErrorBody> = {}): ProcessorError {
  return new ProcessorError(400, { type: 'invalid_request_error', code, message, ...more });
}

/** 404 for an unknown id in the path, 400 where a parameter names it. */
export function missing(what: string, id: string, param = 'id'): ProcessorError {
  const body: ErrorBody = {
    type: 'invalid_request_error',
    code: 'resource_missing',
    message: `No such ${what}: '${id}'`,
    param,
  };
  return new ProcessorError(param === 'id' ? 404 : 400, body, { notExecuted: true });
}
