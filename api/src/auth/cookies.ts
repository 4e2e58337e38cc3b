import type { CookieOptions, Request, Response } from 'express';
import type { Environment } from '../config/environment';
import type { SignedIn } from './auth.service';
import { sessionLifeMs } from './auth.rules';

export const ACCESS_COOKIE = 'fr_access';
export const REFRESH_COOKIE = 'fr_refresh';
/** The refresh token travels to these routes only. */
const REFRESH_PATH = '/api/auth';

function options(environment: Environment, path: string): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', secure: environment.PUBLIC_URL.startsWith('https:'), path };
}

/** On a shared tablet both are forgotten when the browser closes; elsewhere they last as long as the session may. */
export function setCookies(response: Response, environment: Environment, signedIn: SignedIn): void {
  const life = signedIn.isSharedDevice ? {} : { maxAge: sessionLifeMs(false) };
  response.cookie(ACCESS_COOKIE, signedIn.accessToken, { ...options(environment, '/api'), ...life });
  response.cookie(REFRESH_COOKIE, signedIn.refreshToken, { ...options(environment, REFRESH_PATH), ...life });
}

export function clearCookies(response: Response, environment: Environment): void {
  response.clearCookie(ACCESS_COOKIE, options(environment, '/api'));
  response.clearCookie(REFRESH_COOKIE, options(environment, REFRESH_PATH));
}

export function cookieOf(request: Request, name: string): string | null {
  const cookies = request.cookies as Record<string, unknown> | undefined;
  const value = cookies?.[name];
  return typeof value === 'string' ? value : null;
}
