import { randomUUID } from 'node:crypto';
import type { NextFunction, Response } from 'express';
import type { PersonRequest } from './person';

/** One line a request as it ends: when, what, how it went, how long, for whom. Bodies and query strings are never written. */
export function requestLog(write: ((line: string) => void) | null) {
  return (request: PersonRequest & { id?: string }, response: Response, next: NextFunction): void => {
    const id = randomUUID();
    request.id = id;
    response.setHeader('X-Request-Id', id);
    if (write) {
      const { method, path } = request;
      const start = process.hrtime.bigint();
      response.once('close', () => {
        const ms = Number(process.hrtime.bigint() - start) / 1e6;
        const status = response.writableFinished ? response.statusCode : 'aborted';
        write(
          `${new Date().toISOString()} ${method} ${path} ${status} ${ms.toFixed(1)}ms ${request.person?.id ?? '-'} ${id}\n`,
        );
      });
    }
    next();
  };
}
