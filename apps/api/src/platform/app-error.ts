import { errorStatus, type ErrorCode, type FieldError } from '@lydite/contracts';

interface Extra {
  /** Each bad field by its path in the request, with the fix in words. */
  fields?: FieldError[];
  /** What the caller needs to go on; leaves the server. */
  context?: Record<string, unknown>;
  /** For the log only. */
  cause?: unknown;
}

/** An expected refusal: `code` decides the status, `message` is shown to people. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly status: number;
  readonly fields: FieldError[];
  readonly context: Record<string, unknown> | undefined;

  constructor(code: ErrorCode, message: string, { fields = [], context, cause }: Extra = {}) {
    super(message, { cause });
    this.name = 'AppError';
    this.code = code;
    this.status = errorStatus[code];
    this.fields = fields;
    this.context = context;
  }
}
