import type { ErrorCode, FieldError, ProblemBody } from '@lydite/contracts';

/** A refusal of the API. `message` may be shown; programs branch on `code`. */
export class ApiError extends Error {
  readonly code: ErrorCode | 'network';
  readonly status: number;
  readonly fields: FieldError[];
  readonly context: Record<string, unknown>;
  readonly requestId: string;

  constructor(
    problem: Pick<ProblemBody, 'code' | 'status' | 'detail' | 'fields' | 'requestId'> & {
      context?: Record<string, unknown>;
    },
  ) {
    super(problem.detail);
    this.name = 'ApiError';
    this.code = problem.code as ErrorCode;
    this.status = problem.status;
    this.fields = problem.fields;
    this.context = problem.context ?? {};
    this.requestId = problem.requestId;
  }
}

/** The market could not be reached at all. */
export const networkError = (): ApiError =>
  new ApiError({
    code: 'network',
    status: 0,
    detail: 'The market cannot be reached. Check the connection; nothing you entered is lost.',
    fields: [],
    requestId: '',
  });

export const isApiError = (error: unknown, ...codes: (ErrorCode | 'network')[]): error is ApiError =>
  error instanceof ApiError && (codes.length === 0 || codes.includes(error.code as ErrorCode));
