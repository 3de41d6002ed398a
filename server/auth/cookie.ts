import cookieSession from 'cookie-session';
import type { Request, RequestHandler } from 'express';
import Keygrip from 'keygrip';
import type { Config } from '../config.ts';

export const SESSION_DAYS = 30;
const MS_A_DAY = 24 * 60 * 60 * 1000;
export const SESSION_MS = SESSION_DAYS * MS_A_DAY;

/** A signed cookie that holds nothing but an opaque token. Several keys, so that they can rotate. */
export function sessionCookie(
  config: Pick<Config, 'sessionKeys' | 'secureCookies'>,
): RequestHandler {
  return cookieSession({
    name: 'barmkin',
    keys: new Keygrip([...config.sessionKeys], 'sha256'),
    maxAge: SESSION_MS,
    httpOnly: true,
    sameSite: 'lax',
    secure: config.secureCookies,
    path: '/',
  });
}

export function tokenIn(req: Request): string | null {
  const token: unknown = req.session?.token;
  return typeof token === 'string' && token.length < 100 ? token : null;
}

/** Gives the cookie, or gives it anew so that its 30 days start again. */
export function giveCookie(req: Request, token: string): void {
  req.session = { token };
}

export function takeCookie(req: Request): void {
  req.session = null;
}
