import { randomUUID } from 'node:crypto';
import { Catch, HttpException, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { Request, Response } from 'express';
import { STATUS_OF, type ErrorCode, type Problem } from '@bellgap/common/api';
import { domainErrorOfConstraint } from './database-errors';
import { DomainError, invalidAt } from './domain-error';

const TITLES: Record<ErrorCode, string> = {
  'not-signed-in': 'Not signed in',
  forbidden: 'Not allowed',
  'not-found': 'Not found',
  'wrong-state': 'Not possible in this state',
  'newer-version': 'A newer version exists',
  'already-exists': 'Exists already',
  'too-large': 'Too large',
  'unsupported-media-type': 'Media type not supported',
  validation: 'Some fields need another value',
  'version-required': 'Version missing',
  'too-many-requests': 'Too many requests',
  unavailable: 'Not available at the moment',
  unexpected: 'Something went wrong on our side',
};

const logger = new Logger('Problem');

/** Answers every error as RFC 9457 problem details. What nobody foresaw is logged whole and answered with a neutral sentence. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  catch(exception: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<Request & { id?: string }>();
    const response = http.getResponse<Response>();
    const id = request.id ?? randomUUID();
    const error = toDomainError(exception, request);
    if (error.code === 'unexpected') logger.error(`${request.method} ${request.path} ${id}`, stackOf(exception));
    if (response.headersSent) {
      response.destroy();
      return;
    }
    const problem: Problem = {
      type: 'about:blank',
      title: TITLES[error.code],
      status: STATUS_OF[error.code],
      detail: error.message,
      instance: `urn:uuid:${id}`,
      code: error.code,
      errors: error.options.errors ?? [],
      ...error.options.members,
    };
    // An attachment that failed half way must not hand its headers to the problem.
    for (const name of ['Content-Disposition', 'Content-Length', 'ETag']) response.removeHeader(name);
    response
      .status(problem.status)
      .set({ 'Cache-Control': 'no-store', ...error.options.headers })
      .type('application/problem+json')
      .send(JSON.stringify(problem));
  }
}

function toDomainError(exception: unknown, request: Request): DomainError {
  if (exception instanceof DomainError) return exception;
  const constraint = domainErrorOfConstraint(exception);
  if (constraint) return constraint;
  const status = statusOf(exception);
  if (status === 404) return new DomainError('not-found', `There is nothing at ${request.method} ${request.path}.`);
  if (status === 413) return new DomainError('too-large', 'The request is larger than this address takes.');
  if (status === 415) return new DomainError('unsupported-media-type', 'The encoding of the request is not supported.');
  if (status !== null && status >= 400 && status < 500) return invalidAt('', 'The request cannot be read as JSON.');
  if (isConnectionFault(exception))
    return new DomainError('unavailable', 'The database does not answer. Try again shortly.');
  return new DomainError(
    'unexpected',
    'This was not foreseen. It has been written down; try again, and tell us if it comes back.',
  );
}

function statusOf(exception: unknown): number | null {
  if (exception instanceof HttpException) return exception.getStatus();
  const status = (exception as { status?: unknown } | null)?.status;
  return typeof status === 'number' ? status : null;
}

function isConnectionFault(exception: unknown): boolean {
  const { code, name } = (exception ?? {}) as { code?: unknown; name?: unknown };
  return (
    name === 'KnexTimeoutError' ||
    (typeof code === 'string' &&
      (['ECONNREFUSED', 'ECONNRESET', 'EPIPE'].includes(code) || /^(08|28|3D|53|57P)/.test(code)))
  );
}

function stackOf(exception: unknown): string {
  return exception instanceof Error ? (exception.stack ?? exception.message) : String(exception);
}
