import { existsSync } from 'node:fs';
import path from 'node:path';
import express, { type NextFunction, type Request, type Response } from 'express';

const YEAR_S = 365 * 24 * 3600;

/** The built front end: hashed assets are kept for a year, pages are asked for again; deep links get index.html. */
export function staticPages(folder: string) {
  const index = path.join(folder, 'index.html');
  const files = express.static(folder, {
    index: false,
    setHeaders(response, file) {
      const hashed = path.relative(folder, file).startsWith(`assets${path.sep}`);
      response.setHeader('Cache-Control', hashed ? `public, max-age=${YEAR_S}, immutable` : 'no-cache');
    },
  });
  return (request: Request, response: Response, next: NextFunction): void => {
    const isApi = request.path === '/api' || request.path.startsWith('/api/');
    if (isApi || (request.method !== 'GET' && request.method !== 'HEAD')) return next();
    files(request, response, (error?: unknown) => {
      if (error) return next(error);
      const isPage = !request.path.startsWith('/assets/') && request.accepts(['html', 'json']) === 'html';
      if (!isPage || !existsSync(index)) return next();
      response.setHeader('Cache-Control', 'no-cache');
      response.sendFile(index, { dotfiles: 'allow' });
    });
  };
}
