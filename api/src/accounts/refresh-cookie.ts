import type { CookieOptions, Request, Response } from 'express';
import type { Configuration } from '../platform/configuration/configuration.js';
import { SESSION_IDLE_MS_MAX } from './device-session.entity.js';

type Served = Pick<Configuration, 'isHttps' | 'publicPort'>;

const TOKEN = /^[A-Za-z0-9_-]{43}$/;

/**
 * A browser keeps cookies by host and leaves the port out (RFC 6265, 8.5): without the port in its name, two
 * servers on one machine would overwrite each other's cookie and sign their people out.
 */
function nameOf({ publicPort }: Served): string {
  return `harkmoor_refresh_${publicPort}`;
}

/** The refresh token lives in a cookie that no script can read and that goes to the account routes alone. */
function options({ isHttps }: Served): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', path: '/api/accounts', secure: isHttps };
}

export function setRefreshCookie(response: Response, token: string, served: Served): void {
  response.cookie(nameOf(served), token, { ...options(served), maxAge: SESSION_IDLE_MS_MAX });
}

export function clearRefreshCookie(response: Response, served: Served): void {
  response.clearCookie(nameOf(served), options(served));
}

/** Null where there is no cookie, or one that this server never made. */
export function refreshTokenOf(request: Request, served: Served): string | null {
  const value = (request.cookies as Record<string, unknown> | undefined)?.[nameOf(served)];
  return typeof value === 'string' && TOKEN.test(value) ? value : null;
}
