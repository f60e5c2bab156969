import type { ErrorCode, FieldError, Problem } from '@bellgap/common/api';

/** What went wrong with a request: the server's problem details, or a server that could not be reached. */
export class ApiError extends Error {
  readonly code: ErrorCode | 'unreachable';
  /** HTTP status, 0 where there was no answer. */
  readonly status: number;
  readonly fields: FieldError[];
  /** The problem as it came, with what a 409 adds (`current`, `changedBy`, `changedAt`). */
  readonly problem: (Problem & Record<string, unknown>) | null;
  readonly retryAfterS: number | null;

  constructor(given: {
    code: ErrorCode | 'unreachable';
    status: number;
    message: string;
    fields?: FieldError[];
    problem?: (Problem & Record<string, unknown>) | null;
    retryAfterS?: number | null;
  }) {
    super(given.message);
    this.name = 'ApiError';
    this.code = given.code;
    this.status = given.status;
    this.fields = given.fields ?? [];
    this.problem = given.problem ?? null;
    this.retryAfterS = given.retryAfterS ?? null;
  }
}

export function unreachable(): ApiError {
  return new ApiError({
    code: 'unreachable',
    status: 0,
    message: 'The server cannot be reached. Check the connection, then try again; what you typed is still here.',
  });
}

function isProblem(value: unknown): value is Problem & Record<string, unknown> {
  return typeof value === 'object' && value !== null && 'code' in value && 'detail' in value;
}

export function errorFromAnswer(status: number, body: unknown, retryAfter: string | null): ApiError {
  const retryAfterS = retryAfter && /^\d+$/.test(retryAfter) ? Number(retryAfter) : null;
  if (isProblem(body)) {
    return new ApiError({
      code: body.code,
      status,
      message: body.detail || body.title,
      fields: body.errors ?? [],
      problem: body,
      retryAfterS,
    });
  }
  // An answer that is no problem comes from something between here and the server.
  return status >= 502 && status <= 504
    ? unreachable()
    : new ApiError({
        code: 'unexpected',
        status,
        message: `The server answered in an unexpected way (${status}). Try again; if it stays so, tell the administrator.`,
        retryAfterS,
      });
}

/** Words for any failure that is shown where it happened. */
export function failureText(error: unknown): string {
  if (error instanceof ApiError) {
    return error.code === 'too-many-requests' && error.retryAfterS
      ? `${error.message} Try again in ${waitWords(error.retryAfterS)}.`
      : error.message;
  }
  return 'Something went wrong on this page. Try again; if it stays so, reload the page.';
}

function waitWords(seconds: number): string {
  if (seconds < 90) return `${seconds} seconds`;
  return `${Math.ceil(seconds / 60)} minutes`;
}
