/** Error codes of the domain and the one table that gives each its HTTP status. */
export const ERROR_CODES = [
  'not-signed-in',
  'forbidden',
  'not-found',
  'wrong-state',
  'newer-version',
  'already-exists',
  'too-large',
  'unsupported-media-type',
  'validation',
  'version-required',
  'too-many-requests',
  'unavailable',
  'unexpected',
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];

export const STATUS_OF = {
  'not-signed-in': 401,
  forbidden: 403,
  'not-found': 404,
  'wrong-state': 409,
  'newer-version': 409,
  'already-exists': 409,
  'too-large': 413,
  'unsupported-media-type': 415,
  validation: 422,
  'version-required': 428,
  'too-many-requests': 429,
  unavailable: 503,
  unexpected: 500,
} as const satisfies Record<ErrorCode, number>;

/** One fault of one field, in the user's terms. */
export interface FieldError {
  path: string;
  message: string;
}

/** RFC 9457 problem details as every error answer carries them. */
export interface Problem {
  type: string;
  title: string;
  status: number;
  detail: string;
  instance: string;
  code: ErrorCode;
  errors: FieldError[];
}
