import type { NextFunction, Request, Response } from 'express';
import { DomainError, forbidden } from './domain-error';

/** An address whose escapes cannot be read names nothing. */
export function refuseUnreadableAddresses(request: Request, _: Response, next: NextFunction): void {
  try {
    decodeURIComponent(request.path);
    next();
  } catch {
    next(new DomainError('not-found', 'The address cannot be read.'));
  }
}

const READING = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Changing requests must come from the product's own pages: JSON, which no foreign form can send, and an Origin, where
 * sent, whose host is the one asked.
 */
export function refuseForeignRequests(request: Request, _: Response, next: NextFunction): void {
  if (READING.has(request.method)) return next();
  const { origin, host } = request.headers;
  if (origin !== undefined && hostOf(origin) !== host?.toLowerCase()) {
    return next(forbidden('The request comes from another site.'));
  }
  const type = request.headers['content-type'];
  const hasBody =
    request.headers['transfer-encoding'] !== undefined || Number(request.headers['content-length'] ?? 0) > 0;
  if (type !== undefined ? !isJson(type) : hasBody) {
    return next(new DomainError('unsupported-media-type', 'Send the request as application/json.'));
  }
  next();
}

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}

function isJson(type: string): boolean {
  return type.split(';')[0]!.trim().toLowerCase() === 'application/json';
}
