import type { CookieOptions, Request, Response } from 'express';
import { SESSION_IDLE_MS_MAX } from './device-session.entity.js';

const NAME = 'harkmoor_refresh';
const TOKEN = /^[A-Za-z0-9_-]{43}$/;

/** The refresh token lives in a cookie that no script can read and that goes to the account routes alone. */
function options(isHttps: boolean): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', path: '/api/accounts', secure: isHttps };
}

export function setRefreshCookie(response: Response, token: string, isHttps: boolean): void {
  response.cookie(NAME, token, { ...options(isHttps), maxAge: SESSION_IDLE_MS_MAX });
}

export function clearRefreshCookie(response: Response, isHttps: boolean): void {
  response.clearCookie(NAME, options(isHttps));
}

/** Null where there is no cookie, or one that this server never made. */
export function refreshTokenOf(request: Request): string | null {
  const value = (request.cookies as Record<string, unknown> | undefined)?.[NAME];
  return typeof value === 'string' && TOKEN.test(value) ? value : null;
}
