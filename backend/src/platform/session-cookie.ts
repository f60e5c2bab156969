import type { CookieOptions, Response } from 'express';
import type { Config } from './config';

export const SESSION_COOKIE = 'bellgap_session';

function options({ secureCookie }: Config): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', path: '/', secure: secureCookie };
}

export function setSessionCookie(response: Response, config: Config, token: string, expires: Date): void {
  response.cookie(SESSION_COOKIE, token, { ...options(config), expires });
}

export function clearSessionCookie(response: Response, config: Config): void {
  response.clearCookie(SESSION_COOKIE, options(config));
}
