import type { ErrorCode, FieldError } from '@bellgap/common/api';

export interface DomainErrorOptions {
  errors?: FieldError[];
  /** Members that the problem details of this error carry in addition. */
  members?: Record<string, unknown>;
  headers?: Record<string, string>;
}

/** What the rules of the product refuse; the filter gives it its status. */
export class DomainError extends Error {
  constructor(
    readonly code: ErrorCode,
    detail: string,
    readonly options: DomainErrorOptions = {},
  ) {
    super(detail);
    this.name = 'DomainError';
  }
}

export const notSignedIn = () => new DomainError('not-signed-in', 'Sign in to go on.');

export const forbidden = (detail = 'Your roles do not allow this.') => new DomainError('forbidden', detail);

/** Also for what the asker may not know of. */
export const notFound = (what: string) => new DomainError('not-found', `There is no such ${what}.`);

export const wrongState = (detail: string) => new DomainError('wrong-state', detail);

export const alreadyExists = (path: string, message: string) =>
  new DomainError('already-exists', message, { errors: [{ path, message }] });

export function invalid(errors: FieldError[]): DomainError {
  const detail = errors.length === 1 ? errors[0]!.message : `${errors.length} fields need another value.`;
  return new DomainError('validation', detail, { errors });
}

export const invalidAt = (path: string, message: string) => invalid([{ path, message }]);

export const versionRequired = () =>
  new DomainError(
    'version-required',
    'The request must carry If-Match with the version it was made from, such as "3".',
  );

/** Somebody saved in between: the answer carries what stands now, by whom and since when. */
export function newerVersion(standing: { current: unknown; changedBy: string | null; changedAt: string }): DomainError {
  const who = standing.changedBy ?? 'Somebody';
  return new DomainError('newer-version', `${who} has saved a newer version in the meantime.`, {
    members: { ...standing },
  });
}

export function tooManyRequests(retryAfterS: number): DomainError {
  const seconds = Math.max(1, Math.ceil(retryAfterS));
  const wait = seconds > 90 ? `${Math.ceil(seconds / 60)} minutes` : `${seconds} seconds`;
  return new DomainError('too-many-requests', `Too many attempts. Try again in ${wait}.`, {
    headers: { 'Retry-After': String(seconds) },
  });
}
